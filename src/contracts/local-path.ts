// Light: no imports.

const nowhere = 'http://local.invalid';

/**
 * Where to go next, if that is a page of ours; else the start. Reads the text as a browser would, so that `//x`, `/\x`
 * and addresses with a tab or `..` in them lead nowhere else.
 */
export function localPath(text: unknown): string {
  if (typeof text !== 'string' || !text.startsWith('/') || !URL.canParse(text, nowhere)) return '/';
  const read = new URL(text, nowhere);
  if (read.origin !== nowhere || read.pathname.startsWith('//')) return '/';
  return read.pathname + read.search + read.hash;
}

/** `path` with a `next` to go on to, where that is more than the start. */
export function withNext(path: string, next: string): string {
  return next === '/' ? path : `${path}${path.includes('?') ? '&' : '?'}next=${encodeURIComponent(next)}`;
}
