import { unitById, units, unitsFor, type Measures } from '#domain/units.ts';
import type { MaterialFacts } from './block.ts';
import type { Option } from './line-fields.tsx';

const unitIds = new Set(units.map(({ id }) => id));

/** The word written after an amount for a material's own unit: a unit's name, or a pack's. */
export function unitWordOf(material: Pick<MaterialFacts, 'unit'>): string {
  return unitIds.has(material.unit) ? unitById(material.unit).one : material.unit;
}

/** The id of a unit by the word of a line's menu; a pack goes by its name. */
export function unitIdOf(word: string): string {
  return units.find(({ one }) => one === word)?.id ?? word;
}

/** What the unit menu of a line offers: the material's packs, the units it is measured in, and those of its ratio. */
export function unitChoices(material: MaterialFacts | undefined, measures: Measures, current: string): Option[] {
  const offered = material
    ? [
      ...material.packs.map(({ name }) => name),
      ...unitsFor(material.dimension, measures).map(({ one }) => one),
      ...(material.ratio ? unitsFor(material.ratio.to, measures).map(({ one }) => one) : []),
    ]
    : [];
  const own = material ? unitWordOf(material) : '';
  const words = [...new Set([own, current, ...offered])].filter((word) => word !== '');
  return words.length === 0 ? [{ value: '', label: 'unit' }] : words.map((word) => ({ value: word, label: word }));
}
