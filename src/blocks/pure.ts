// The pure half of every block: schema, steps up, what it says to the ledger and to readers. The server and the desk both read it.
export { pureBlocks, blockTypes, type BlockType } from './pure-list.ts';
export type * from './block.ts';
export * from './entry-document.ts';
export { deriveEntry, readEntry, type EntryDerivation } from './derive-entry.ts';
export { projectEntry, type EntryProjection } from './project-entry.ts';
export { broughtToBuild } from './bought/receipt-sums.ts';
export { plainWords } from './plain-words.ts';
export type { ProseNode } from './prose.ts';
export { cautionFor, type ListedCaution } from './caution/caution-list.ts';
