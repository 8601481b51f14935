import type { MaterialFacts } from './block.ts';

function plain(text: string): string {
  return text.normalize('NFD').replaceAll(/\p{M}/gu, '').toLowerCase();
}

/** How well a name answers what was typed: whole, from its start, from a word's start, anywhere; nothing where a word is missing. */
function rank(name: string, typed: string): number | null {
  const words = plain(name).split(/[^\p{L}\p{N}]+/u);
  if (plain(name) === typed) return 0;
  if (plain(name).startsWith(typed)) return 1;
  const asked = typed.split(/\s+/);
  if (asked.every((part) => words.some((word) => word.startsWith(part)))) return 2;
  return asked.every((part) => plain(name).includes(part)) ? 3 : null;
}

/** Materials that answer what was typed, best first; those that answer alike stay in the order given. */
export function matchingMaterials(materials: readonly MaterialFacts[], typed: string): MaterialFacts[] {
  const asked = plain(typed).trim();
  if (asked === '') return [...materials];
  return materials
    .map((material) => ({ material, at: rank(material.name, asked) }))
    .filter((one): one is { material: MaterialFacts; at: number } => one.at !== null)
    .toSorted((a, b) => a.at - b.at)
    .map(({ material }) => material);
}
