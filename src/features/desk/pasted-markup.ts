// What word processors and web pages put on the clipboard, brought to the few elements of our prose while its meaning still shows in styles and classes.
// This is tidying only: what it gives is cleaned after it, never trusted.

const renames: Readonly<Record<string, string>> = { B: 'strong', I: 'em', STRIKE: 's', DEL: 's', H1: 'h2', H4: 'h3', H5: 'h3', H6: 'h3', TT: 'code', KBD: 'code', SAMP: 'code', PRE: 'p', DT: 'p', DD: 'p', FIGCAPTION: 'p' };
const boxes = 'div, section:not([data-block]), article, header, footer, main, aside, address, figure, center';
// Where a style attribute waits to be read.
const styleName = 'data-style';
const standsAlone = 'p, h1, h2, h3, h4, h5, h6, ul, ol, table, blockquote, pre, div, section, article, dl, figure';

function renamed(element: Element, tag: string): Element {
  const other = element.ownerDocument.createElement(tag);
  for (const name of [styleName, 'class', 'href', 'start', 'colspan', 'rowspan']) {
    const value = element.getAttribute(name);
    if (value !== null) other.setAttribute(name, value);
  }
  other.append(...element.childNodes);
  element.replaceWith(other);
  return other;
}

function unwrapped(element: Element): void {
  element.replaceWith(...element.childNodes);
}

function styleOf(element: Element): string {
  return (element.getAttribute(styleName) ?? '').toLowerCase().replaceAll(/\s/g, '');
}

/** Bold and italic said by a style; and a bold element that says it is not. */
function emphasise(body: Element): void {
  for (const element of body.querySelectorAll('b[data-style], strong[data-style]')) if (/font-weight:(normal|400)/.test(styleOf(element))) unwrapped(element);
  for (const element of body.querySelectorAll('span[data-style]')) {
    const style = styleOf(element);
    const tag = [/font-weight:(bold|[6-9]00)/.test(style) ? 'strong' : '', /font-style:italic/.test(style) ? 'em' : '', /text-decoration[^;]*line-through/.test(style) ? 's' : ''].filter(Boolean);
    let inside = element;
    for (const name of tag) {
      const wrapper = body.ownerDocument.createElement(name);
      wrapper.append(...inside.childNodes);
      inside.append(wrapper);
      inside = wrapper;
    }
  }
}

/** Word processors write a list as paragraphs with the bullet typed in them. */
function gatherLists(body: Element): void {
  for (const paragraph of body.querySelectorAll('p[data-style*="mso-list"], p[class*="MsoList"]')) {
    const bullet = paragraph.querySelector('span[data-style*="mso-list:Ignore" i], span[data-style*="mso-list: Ignore" i]');
    const tag = /^\s*[\da-z]{1,3}[.)]/i.test(bullet?.textContent ?? '') ? 'OL' : 'UL';
    bullet?.remove();
    const item = body.ownerDocument.createElement('li');
    item.append(...paragraph.childNodes);
    const before = paragraph.previousElementSibling;
    if (before?.tagName === tag && before.hasAttribute('data-gathered')) {
      before.append(item);
      paragraph.remove();
    } else {
      const list = body.ownerDocument.createElement(tag);
      list.setAttribute('data-gathered', '');
      list.append(item);
      paragraph.replaceWith(list);
    }
  }
}

/** A box with words in it becomes a paragraph, so that two boxes do not run together; a box of boxes falls away. */
function flattenBoxes(body: Element): void {
  for (const box of [...body.querySelectorAll(boxes)].toReversed()) {
    if (box.querySelector(standsAlone)) unwrapped(box);
    else renamed(box, 'p');
  }
}

const styleSheet = /<style\b[^>]*>[\s\S]*?(?:<\/style\s*>|$)/gi;
// quoted values may hold a >
const anyTag = /<[a-z](?:"[^"]*"|'[^']*'|[^'">])*>/gi;

/** Handlers and styles are set aside before anything is parsed, as even in a document that is never shown the page's own policy refuses and reports them. */
function withoutOrders(html: string): string {
  return html.replaceAll(styleSheet, '').replaceAll(anyTag, (tag) => tag.replaceAll(/([\s/"'])on[a-z]+(?=\s*=)/gi, '$1data-off').replaceAll(/([\s/"'])style(?=\s*=)/gi, `$1${styleName}`));
}

export function tidiedMarkup(html: string): string {
  // Parsed in a document of its own that runs nothing and fetches nothing.
  const { body } = new DOMParser().parseFromString(withoutOrders(html), 'text/html');
  emphasise(body);
  gatherLists(body);
  for (const element of body.querySelectorAll(Object.keys(renames).join(','))) renamed(element, renames[element.tagName] ?? 'p');
  flattenBoxes(body);
  return body.innerHTML;
}
