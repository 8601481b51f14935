/** The page asked for by an address; the first where it asks for nonsense. */
export function pageNumber(search: URLSearchParams): number {
  const page = Number(search.get('page') ?? '1');
  return Number.isInteger(page) && page > 0 && page <= 10_000 ? page : 1;
}

/** A query string with some parts changed; `null` takes a part out. Empty when nothing is left. */
export function withSearch(search: string, changes: Readonly<Record<string, string | null>>): string {
  const parts = new URLSearchParams(search);
  for (const [name, value] of Object.entries(changes)) {
    if (value === null) parts.delete(name);
    else parts.set(name, value);
  }
  const text = parts.toString();
  return text === '' ? '' : `?${text}`;
}
