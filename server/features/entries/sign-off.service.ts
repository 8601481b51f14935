import { isDeepStrictEqual } from 'node:util';
import { AppError } from '#contracts/errors.ts';
import { deriveEntry, readEntry, withUniqueIds, type EntryDerivation, type EntryDocument } from '#src/blocks/pure.ts';
import type { Build, Entry, Stage } from '#server/entities/index.ts';
import { workKindNamed } from '#server/features/builds/work-kinds.service.ts';
import { requireMoneyThatFits } from '#server/features/shelf/money-that-fits.service.ts';
import type { Caller, Em } from '#server/http/context.ts';
import { requireEntry, requireStage, requireVersion } from './entry-access.ts';
import { giveAddress } from './entry-address.ts';
import { entryContext } from './entry-context.ts';
import { replaceRows } from './entry-rows.ts';
import { seenDocument } from './seen-document.ts';
import { keptDocuments, newNodeId, storedDocument } from './stored-document.ts';
import { wordsDigest } from './words-digest.ts';

function requireWhole(derived: EntryDerivation): void {
  const count = Object.keys(derived.faults).length;
  if (count === 0) return;
  throw new AppError('bad-input', count === 1 ? 'One thing needs mending before this day can be signed off.' : `${count} things need mending before this day can be signed off.`, derived.faults);
}

// After a take-back the words last published may be gone; of them the digest is kept.
function wordsChanged(entry: Entry, document: EntryDocument): boolean {
  if (!entry.published) return entry.takenBack !== wordsDigest(storedDocument(document));
  return !isDeepStrictEqual(storedDocument(entry.published), storedDocument(document));
}

async function setWork(em: Em, entry: Entry, work: EntryDerivation['work']): Promise<void> {
  entry.workKind = work ? await workKindNamed(em, work.kind) : null;
  entry.workAmount = work?.amount ?? null;
  entry.workUnit = work?.unit ?? null;
}

function setPublished(entry: Entry, document: EntryDocument, stage: Stage | null, now: Date): void {
  if (entry.firstPublishedAt && wordsChanged(entry, document)) entry.editedAt = now;
  entry.firstPublishedAt ??= now;
  Object.assign(entry, { published: document, takenBack: null, working: null, workingAt: null, title: document.title.trim(), day: document.day, dayTo: document.dayTo, stage });
}

interface SignedOff { readonly version: number; readonly href: string }

async function publish(em: Em, build: Build, entry: Entry, document: EntryDocument, derived: EntryDerivation, now: Date): Promise<SignedOff> {
  const stage = await requireStage(em, build, document.stage);
  await setWork(em, entry, derived.work);
  await giveAddress(em, build, entry, document.title);
  await replaceRows(em, { build, entry, stage, derived });
  setPublished(entry, document, stage, now);
  await em.flush();
  await requireMoneyThatFits(em, build);
  return { version: entry.version, href: `/builds/${build.slug}/${entry.slug ?? ''}` };
}

/**
 * Signs off a day: the whole document is validated and derived, takes the place of what was published, and prices what it
 * touches, in one transaction. A return or sale elsewhere that would then fall short refuses all of it.
 */
export async function signOffDay(em: Em, caller: Caller, slug: string, number: number, input: { version: number; document: EntryDocument }, now: Date): Promise<SignedOff> {
  return em.transactional(async (inner) => {
    const { build, entry } = await requireEntry(inner, caller, slug, number);
    requireVersion(entry, input.version);
    const context = await entryContext(inner, build);
    const document = readEntry(withUniqueIds(await seenDocument(inner, caller, build, input.document), newNodeId), keptDocuments(entry), context);
    const derived = deriveEntry(document, context);
    requireWhole(derived);
    return publish(inner, build, entry, document, derived, now);
  });
}
