import { randomUUID } from 'node:crypto';
import { Build, Entry, Person } from '#server/entities/index.ts';
import { requireWritableBuild } from '#server/features/builds/build-access.service.ts';
import type { Caller, Em } from '#server/http/context.ts';
import { requireStage } from './entry-access.ts';
import { blankDocument } from './stored-document.ts';

/** The next number of the build's one sequence. Counted up in one statement, first in its transaction, so that no two get the same. */
async function nextSequence(em: Em, build: number): Promise<number> {
  const [row] = await em.execute<{ sequence: number }[]>('update build set sequence = sequence + 1 where id = ? returning sequence', [build]);
  if (!row) throw new Error(`Build ${build} has no sequence`);
  return row.sequence;
}

async function nextNumber(em: Em, build: number): Promise<number> {
  const [row] = await em.execute<{ number: number }[]>('select ifnull(max(number), 0) + 1 as number from entry where build_id = ?', [build]);
  return row?.number ?? 1;
}

/** Opens a new write-up of a day of work, with its numbers and an empty working copy. */
export async function startDay(em: Em, caller: Caller, slug: string, input: { day: string; stage: number | null }, now: Date): Promise<number> {
  const build = await requireWritableBuild(em, caller, slug);
  const stage = await requireStage(em, build, input.stage);
  return em.transactional(async (inner) => {
    const sequence = await nextSequence(inner, build.id);
    const number = await nextNumber(inner, build.id);
    inner.persist(inner.create(Entry, {
      guid: randomUUID(), build: inner.getReference(Build, build.id), author: inner.getReference(Person, caller.id), sequence, number,
      day: input.day, working: blankDocument(input.day, stage?.id ?? null), workingAt: now,
    }));
    return number;
  });
}
