import { describe, expect, test, vi } from 'vitest';
import { pastedWords } from '#src/features/desk/pasted-words.ts';

describe('pasted HTML is cut down to our own prose', () => {
  test.each([
    ['a script', '<p>Words<script>alert(1)</script></p>', '<p>Words</p>'],
    ['a handler', '<p onclick="alert(1)" onmouseover=alert(2)>Words</p>', '<p>Words</p>'],
    ['a javascript: link', '<p><a href="javascript:alert(1)">Words</a></p>', '<p><a>Words</a></p>'],
    ['a javascript: link in disguise', '<p><a href=" java&#10;script:alert(1)">Words</a></p>', '<p><a>Words</a></p>'],
    ['a data: link', '<p><a href="data:text/html,<script>alert(1)</script>">Words</a></p>', '<p><a>Words</a></p>'],
    ['a link without a scheme', '<p><a href="//elsewhere.example/x">Words</a></p>', '<p><a>Words</a></p>'],
    ['an svg with a script', '<svg><script>alert(1)</script><a href="javascript:alert(1)"><text>x</text></a></svg><p>Words</p>', '<p>Words</p>'],
    ['mathml', '<math><mtext><script>alert(1)</script></mtext></math><p>Words</p>', '<p>Words</p>'],
    ['a frame', '<iframe srcdoc="<script>alert(1)</script>"></iframe><p>Words</p>', '<p>Words</p>'],
    ['a style', '<style>p{color:red}</style><p style="color:red" class="x" id="y">Words</p>', '<p>Words</p>'],
    ['a picture', '<p>Words<img src="https://elsewhere.example/pixel.gif" onerror="alert(1)"></p>', '<p>Words</p>'],
    ['a form', '<form action="https://elsewhere.example"><input name="x"><p>Words</p></form>', '<p>Words</p>'],
    ['a template', '<template><p>hidden</p></template><p>Words</p>', '<p>Words</p>'],
    ['a comment', '<!--[if gte mso 9]><xml></xml><![endif]--><p>Words</p>', '<p>Words</p>'],
  ])('%s does not come along', (_what, html, clean) => {
    expect(pastedWords(html)).toBe(clean);
  });

  // Chromium asks the page's policy about every style it parses, shown or not, and complains on the console.
  test('no style and no handler is ever parsed', () => {
    const parse = vi.spyOn(DOMParser.prototype, 'parseFromString');
    const html = '<html><head><style>p{color:red}</style><STYLE media="all"><!-- p{} --></STYLE></head><body><svg><style>p{}</style></svg><p title="a > b" style="color:red">Words <span STYLE = \'font-weight:700\' onclick="x()">heavy</span></p><style>never closed';
    expect(pastedWords(html)).toBe('<p>Words <strong>heavy</strong></p>');
    expect(parse.mock.calls.length).toBeGreaterThan(0);
    for (const [parsed] of parse.mock.calls) expect(parsed).not.toMatch(/<style|[\s"'](style|on\w+)\s*=/i);
  });

  test('words that only look like a handler stay as they are', () => {
    expect(pastedWords('<p>each one = two, on load = off</p>')).toBe('<p>each one = two, on load = off</p>');
  });

  test('https and mailto links stay', () => {
    expect(pastedWords('<p><a href="https://elsewhere.example/a?b=1" target="_blank" rel="x">one</a> <a href="mailto:a@b.example">two</a></p>'))
      .toBe('<p><a href="https://elsewhere.example/a?b=1">one</a> <a href="mailto:a@b.example">two</a></p>');
  });

  test('old elements and styles keep their meaning', () => {
    expect(pastedWords('<p><b>bold</b> <i>italic</i> <span style="font-weight: 700">heavy</span> <span style="font-style:italic">slanted</span> <strike>gone</strike></p>'))
      .toBe('<p><strong>bold</strong> <em>italic</em> <strong>heavy</strong> <em>slanted</em> <s>gone</s></p>');
    expect(pastedWords('<b style="font-weight:normal"><p>Not bold</p></b>')).toBe('<p>Not bold</p>');
    expect(pastedWords('<h1>Top</h1><h5>Low</h5>')).toBe('<h2>Top</h2><h3>Low</h3>');
  });

  test('two boxes do not run together', () => {
    expect(pastedWords('<div><div>one</div><div>two</div></div>')).toBe('<p>one</p><p>two</p>');
  });

  test('a word processor’s list becomes a list, without its typed bullets', () => {
    const item = (bullet: string, words: string) => `<p class="MsoListParagraph" style="mso-list:l0 level1 lfo1"><span style="mso-list:Ignore">${bullet}<span style="font:7.0pt">&nbsp;</span></span>${words}<o:p></o:p></p>`;
    expect(pastedWords(`<html xmlns:o="urn:x"><body>${item('·', 'one')}${item('·', 'two')}<p>after</p>${item('1.', 'first')}</body></html>`))
      .toBe('<ul><li>one</li><li>two</li></ul><p>after</p><ol><li>first</li></ol>');
  });

  test('a table keeps its spans and nothing else', () => {
    expect(pastedWords('<table border=1><tbody><tr><td colspan="2" style="x" bgcolor="red">a</td></tr></tbody></table>'))
      .toBe('<table><tbody><tr><td colspan="2">a</td></tr></tbody></table>');
  });
});
