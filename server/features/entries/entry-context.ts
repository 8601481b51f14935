import type { deriveEntry, EntryDerivation } from '#src/blocks/pure.ts';
import type { Build } from '#server/entities/index.ts';
import { materialFacts } from '#server/features/shelf/materials.service.ts';
import type { Em } from '#server/http/context.ts';

/** What stands around every entry of a build. */
export type EntryContext = Parameters<typeof deriveEntry>[1];

/** Measures and currency of the build, and its owner's materials: those of crew serve nobody else's build. */
export async function entryContext(em: Em, build: Build): Promise<EntryContext> {
  return { measures: build.measures, currency: build.currency, materials: await materialFacts(em, build.owner.id) };
}

/** The derivation of an entry that is in no ledger. */
export const nothingDerived: EntryDerivation = { faults: {}, remarks: [], uses: [], receipts: [], costs: [], times: [], pictures: [], work: null };
