import type { DeskView } from '#contracts/entries.ts';
import type { EntryDocument, MaterialFacts } from '#src/blocks/pure.ts';
import { blankUsedLine, type UsedLine } from '#src/blocks/used/used.ts';
import { blankBought, blankBoughtLine, type BoughtLine } from '#src/blocks/bought/bought.ts';
import { unitById } from '#domain/units.ts';
import { exactText } from '#domain/quantity.ts';

// A small build's desk, for the tests of the desk.

export const resin: MaterialFacts = { id: 1, name: 'Laminating resin', dimension: 'volume', unit: 'us-gal', packs: [], ratio: null, hazards: [] };
export const brushes: MaterialFacts = { id: 2, name: 'Laminating brushes', dimension: 'count', unit: 'piece', packs: [{ name: 'box', amount: '15/1' }], ratio: null, hazards: [] };
export const oil: MaterialFacts = { id: 3, name: 'Raw linseed oil', dimension: 'volume', unit: 'ml', packs: [{ name: 'tin', amount: '2500/1' }], ratio: null, hazards: [] };
export const materials = [resin, brushes, oil];
export const byId = new Map(materials.map((material) => [material.id, material]));

export const gallon = exactText(unitById('us-gal').factor);

export function documentOf(part: Partial<EntryDocument> = {}): EntryDocument {
  return { title: 'Eight boards', lead: '', day: '2026-11-14', dayTo: null, stage: null, work: null, content: [], ...part };
}

export function usedNode(id: string, lines: readonly (Partial<UsedLine> & { id: string })[]): EntryDocument['content'][number] {
  return { type: 'used', attrs: { id, version: 1, data: { day: null, lines: lines.map((line) => ({ ...blankUsedLine(line.id), ...line })) } } };
}

export function boughtNode(id: string, lines: readonly (Partial<BoughtLine> & { id: string })[]): EntryDocument['content'][number] {
  return { type: 'bought', attrs: { id, version: 1, data: { ...blankBought(), lines: lines.map((line) => ({ ...blankBoughtLine(line.id), ...line })) } } };
}

export function viewOf(part: Partial<DeskView> = {}): DeskView {
  return {
    build: { slug: 'curlew', title: 'Curlew, a dinghy', currency: 'USD', measures: 'us', method: 'fifo', costsShown: true, visibility: 'public' },
    shedMethod: 'fifo',
    entry: { number: 7, guid: '0b8f3a52-6a2f-4a7e-9d0e-0a9b6d3c1f10', version: 3, document: documentOf(), hasWorking: true, savedAt: null, published: false, href: null, sequence: 20 },
    stages: [], workKinds: [], people: [{ handle: 'marlow', name: 'Marlow' }], materials: materials.map((one) => ({ ...one, packs: [...one.packs], ratio: null, hazards: [...one.hazards] })) as DeskView['materials'],
    shelf: [], history: [], buildUsed: 0, ...part,
  };
}

type History = DeskView['history'][number];

export function bought(material: number, amount: string, cost: number, day = '2026-11-01', shelf: History['shelf'] = 'shelf', sequence = 1): History {
  return { material, shelf, rows: [{ key: `receipt${sequence}:a`, kind: 'bought', day, sequence, place: 0, amount, cost, of: null, shortage: null }] };
}
