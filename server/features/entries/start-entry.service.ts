import { randomUUID } from 'node:crypto';
import type { EntryDocument } from '#src/blocks/pure.ts';
import { Build, Entry, Person } from '#server/entities/index.ts';
import { requireWritableBuild } from '#server/features/builds/build-access.service.ts';
import type { Caller, Em } from '#server/http/context.ts';
import { requireStage } from './entry-access.ts';
import { blankDocument } from './stored-document.ts';

// Both are counted up in one statement each, first in their transaction, so that no two get the same.

/** The next number of a restorer's one sequence. Their builds share a shed, and its order is that of all their entries. */
async function nextSequence(em: Em, owner: number): Promise<number> {
  const [row] = await em.execute<{ sequence: number }[]>('update person set sequence = sequence + 1 where id = ? returning sequence', [owner]);
  if (!row) throw new Error(`Person ${owner} has no sequence`);
  return row.sequence;
}

/** The next entry number of a build; that of a discarded entry is not given again. */
async function nextNumber(em: Em, build: number): Promise<number> {
  const [row] = await em.execute<{ number: number }[]>('update build set last_number = last_number + 1 where id = ? returning last_number as number', [build]);
  if (!row) throw new Error(`Build ${build} has no numbers`);
  return row.number;
}

/** Whether nothing was ever written in it but its day and stage. */
function isBlank({ title, lead, dayTo, work, content }: EntryDocument): boolean {
  return title.trim() === '' && lead.trim() === '' && dayTo === null && work === null && content.every((node) => node.type === 'paragraph' && (node.content ?? []).length === 0);
}

/** A write-up of the same day that its writer opened and left as it was. */
async function leftBlank(em: Em, build: Build, caller: Caller, day: string): Promise<Entry | undefined> {
  const drafts = await em.find(Entry, { build: build.id, author: caller.id, day, firstPublishedAt: null, workingAt: { $ne: null } }, { orderBy: { number: 'asc' } });
  return drafts.find(({ working }) => working !== null && working !== undefined && working.day === day && isBlank(working));
}

/** Opens a new write-up of a day of work, with its numbers and an empty working copy; one that was opened before and left as it was is taken up again. */
export async function startDay(em: Em, caller: Caller, slug: string, input: { day: string; stage: number | null }, now: Date): Promise<number> {
  const build = await requireWritableBuild(em, caller, slug);
  const stage = await requireStage(em, build, input.stage);
  return em.transactional(async (inner) => {
    const blank = await leftBlank(inner, build, caller, input.day);
    if (blank) {
      if (blank.working?.stage !== (stage?.id ?? null)) Object.assign(blank, { working: blankDocument(input.day, stage?.id ?? null), workingAt: now });
      return blank.number;
    }
    const sequence = await nextSequence(inner, build.owner.id);
    const number = await nextNumber(inner, build.id);
    inner.persist(inner.create(Entry, {
      guid: randomUUID(), build: inner.getReference(Build, build.id), author: inner.getReference(Person, caller.id), sequence, number,
      day: input.day, working: blankDocument(input.day, stage?.id ?? null), workingAt: now,
    }));
    return number;
  });
}
