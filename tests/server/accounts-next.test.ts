import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { localPath, withNext } from '#contracts/local-path.ts';

const site = 'https://log.example';

describe('where to go next', () => {
  test.each([['/', '/'], ['/settings', '/settings'], ['/builds?kind=boat&page=2#x', '/builds?kind=boat&page=2#x'], ['/a/../b', '/b'], ['/builds/ö', '/builds/%C3%B6']])('%s is a page of ours', (text, path) => {
    expect(localPath(text)).toBe(path);
  });

  test.each([
    '//evil.example', '/\\evil.example', '\\/evil.example', '\\\\evil.example', 'https://evil.example', 'https:evil.example', 'http:/evil.example', 'javascript:alert(1)',
    '/\t/evil.example', '\t//evil.example', '/\n/evil.example', ' //evil.example', '/.//evil.example', '/..//evil.example', '/x/..//evil.example', '/./\\evil.example',
    '/%2e//evil.example', '///evil.example', 'evil.example', '', '@evil.example', 'data:text/html,x',
  ])('%j leads to the start', (text) => {
    expect(localPath(text)).toBe('/');
  });

  test.each([undefined, null, 5, ['/settings'], { toString: () => '/settings' }])('%j leads to the start', (text) => {
    expect(localPath(text)).toBe('/');
  });

  test('whatever is asked for, a browser that follows it stays here', () => {
    const parts = fc.constantFrom('/', '//', '\\', '.', '..', '%2f', '%5c', '%2e', '@', ':', '?', '#', '\t', '\n', ' ', 'https:', 'evil.example', 'x', '\u0000', '／');
    fc.assert(fc.property(fc.array(parts, { maxLength: 8 }).map((all) => all.join('')), (text) => {
      const path = localPath(text);
      expect(path.startsWith('/')).toBe(true);
      expect(new URL(path, site).origin).toBe(site);
      // and read once more, as it is when it is handed on
      expect(localPath(path)).toBe(path);
    }), { numRuns: 5000 });
  });

  test('is put after an address only where it is more than the start', () => {
    expect(withNext('/sign-in', '/')).toBe('/sign-in');
    expect(withNext('/sign-in', '/builds?kind=boat')).toBe('/sign-in?next=%2Fbuilds%3Fkind%3Dboat');
    expect(withNext('/sign-in?github=lost', '/x')).toBe('/sign-in?github=lost&next=%2Fx');
  });
});
