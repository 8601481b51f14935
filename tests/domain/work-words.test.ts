import { expect, test } from 'vitest';
import { oneOfWork, workKindName } from '#domain/work-words.ts';
import { deriveEntry } from '#src/blocks/pure.ts';

test('one of a kind of work, by the piece and by measure', () => {
  expect(oneOfWork({ unit: 'piece', kind: 'steamed rib' })).toBe('steamed rib');
  expect(oneOfWork({ unit: 'm2', kind: 'laminate' })).toBe('m² of laminate');
  expect(oneOfWork({ unit: 'toString', kind: 'laminate' })).toBe('laminate');
});

test('a kind of work goes by one name, however it was spaced', () => {
  expect(workKindName('  Steamed \t rib ')).toBe('steamed rib');
  const document = { title: 'A day', lead: '', day: '2026-03-01', dayTo: null, stage: null, work: { amount: '2', unit: 'piece', kind: ' Steamed   rib' }, content: [] } as const;
  expect(deriveEntry({ ...document, content: [] }, { measures: 'imperial', currency: 'GBP', materials: new Map() }).work?.kind).toBe('steamed rib');
});
