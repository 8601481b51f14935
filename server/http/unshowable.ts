/** Characters no text here has a use for: controls but tab and line ends, half surrogates, and the two that turn all that follows around. */
function isUnshowable(letter: string): boolean {
  const code = letter.codePointAt(0) ?? 0;
  const control = code < 0x20 && code !== 0x9 && code !== 0xa && code !== 0xd;
  return control || code === 0x7f || (code >= 0xd800 && code <= 0xdfff) || code === 0x202d || code === 0x202e;
}

/** Where in an input such a character stands first, as the path of its field; nothing when there is none. */
export function unshowableIn(value: unknown, path = ''): string | null {
  if (typeof value === 'string') {
    for (const letter of value) if (isUnshowable(letter)) return path;
    return null;
  }
  if (typeof value !== 'object' || value === null) return null;
  for (const [name, inner] of Object.entries(value)) {
    const found = unshowableIn(inner, path === '' ? name : `${path}.${name}`);
    if (found !== null) return found;
  }
  return null;
}
