interface Spoken { text?: string | undefined; content?: readonly unknown[] | undefined }
/** The words of a node, for excerpts, search and checks. Light: readers' pages use it. */
export function plainWords(node: unknown): string {
  const { text: words, content } = node as Spoken;
  if (typeof words === 'string') return words;
  return (content ?? []).map(plainWords).filter(Boolean).join(' ');
}
