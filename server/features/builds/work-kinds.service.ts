import { WorkKind } from '#server/entities/index.ts';
import type { Em } from '#server/http/context.ts';

/** English plural of the last word of a kind of work, for "17 steamed ribs"; "panel coated" becomes "panels coated". */
export function pluralOf(one: string): string {
  const words = one.split(' ');
  // a participle at the end says what was done to the thing before it
  const at = words.length > 1 && /(ed|en|made|cut|built|laid|set)$/.test(words.at(-1) ?? '') ? words.length - 2 : words.length - 1;
  const word = words[at] ?? one;
  const many = /(s|x|z|ch|sh)$/.test(word) ? `${word}es` : /[^aeiou]y$/.test(word) ? `${word.slice(0, -1)}ies` : /[²³]$/.test(word) ? word : `${word}s`;
  return words.map((each, index) => (index === at ? many : each)).join(' ');
}

/** The kind of work of that name; the list grows by it when it is new. */
export async function workKindNamed(em: Em, name: string): Promise<WorkKind> {
  const one = name.trim().toLowerCase().replace(/\s+/g, ' ');
  const known = await em.findOne(WorkKind, { one });
  if (known) return known;
  const made = em.create(WorkKind, { one, many: pluralOf(one) });
  em.persist(made);
  await em.flush();
  return made;
}
