import type { LastTime } from '#contracts/entries.ts';
import type { BlockData, EntryDocument } from '#src/blocks/pure.ts';
import { Entry, type Build } from '#server/entities/index.ts';
import type { Caller, Em } from '#server/http/context.ts';
import { requireOpenEntry } from './entry-access.ts';
import { standingDocument } from './stored-document.ts';

// Far enough back to find the last time, without reading a whole log.
const entriesLookedAt = 40;

function lastOf<T extends 'used' | 'time'>(document: EntryDocument, type: T): BlockData<T>['lines'] {
  const node = document.content.findLast((one) => one.type === type && one.attrs.data.lines.length > 0);
  return node?.type === type ? node.attrs.data.lines : [];
}

function usedLines(document: EntryDocument): LastTime['used'] {
  return lastOf(document, 'used').flatMap(({ material, name, amount, unit, fate, counts, from }) => (material === null ? [] : [{ material, name, amount, unit, fate, counts, from }]));
}

function timeLines(document: EntryDocument): LastTime['time'] {
  return lastOf(document, 'time').map(({ handle, name, time, what, kind }) => ({ handle, name, time, what, kind }));
}

/** The entries of this build before one, by day and then by number, latest first. */
function before(em: Em, build: Build, entry: Entry): Promise<Entry[]> {
  const day = standingDocument(entry).day;
  return em.find(Entry, {
    build: build.id, id: { $ne: entry.id }, $or: [{ day: { $lt: day } }, { day, sequence: { $lt: entry.sequence } }],
  }, { orderBy: { day: 'desc', sequence: 'desc' }, limit: entriesLookedAt });
}

/** Lines of the last Used and Time blocks before an entry: of the same stage where there are any, else of the last day that has them. */
export async function readLastLines(em: Em, caller: Caller, slug: string, number: number, stage: number | null): Promise<LastTime> {
  const { build, entry } = await requireOpenEntry(em, caller, slug, number);
  const documents = (await before(em, build, entry)).map(standingDocument);
  const inStage = stage === null ? [] : documents.filter((document) => document.stage === stage);
  const ordered = [...inStage, ...documents];
  const used = ordered.find((document) => usedLines(document).length > 0);
  const time = ordered.find((document) => timeLines(document).length > 0);
  const from = used ?? time;
  return { title: from ? from.title : null, used: used ? usedLines(used) : [], time: time ? timeLines(time) : [] };
}
