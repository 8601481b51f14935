import { AppError } from '#contracts/errors.ts';
import { Build, BuildAddress, CrewMember } from '#server/entities/index.ts';
import type { Caller, Em, Viewer } from '#server/http/context.ts';

// The named questions about a build: who may see it, write in it, settle it. What may not be seen answers as if it were not there.

const nothingHere = () => new AppError('not-found', 'There is nothing at this address.');

/** Owner or crew. */
export async function mayWrite(em: Em, viewer: Viewer, build: Build): Promise<boolean> {
  if (!viewer) return false;
  if (build.owner.id === viewer.id) return true;
  return (await em.count(CrewMember, { build: build.id, person: viewer.id })) > 0;
}

async function findBuild(em: Em, slug: string): Promise<Build> {
  const build = await em.findOne(Build, { slug }, { populate: ['owner'] });
  if (!build) throw nothingHere();
  return build;
}

/** A build this viewer may read, with what they may do there. */
export async function requireVisibleBuild(em: Em, viewer: Viewer, slug: string): Promise<{ build: Build; writes: boolean; owns: boolean }> {
  const build = await findBuild(em, slug);
  const writes = await mayWrite(em, viewer, build);
  if (build.visibility === 'private' && !writes) throw nothingHere();
  return { build, writes, owns: viewer !== null && build.owner.id === viewer.id };
}

/** A build this person may look behind: its drafts, desk, stages, settings and private pictures are there for those who write in it, and for nobody else. */
export async function requireCrewBuild(em: Em, viewer: Viewer, slug: string): Promise<Build> {
  const { build, writes } = await requireVisibleBuild(em, viewer, slug);
  if (!writes) throw nothingHere();
  return build;
}

/** A build this person may write entries, receipts and time in: others may read it, so they are told that they may not. */
export async function requireWritableBuild(em: Em, caller: Caller, slug: string): Promise<Build> {
  const { build, writes } = await requireVisibleBuild(em, caller, slug);
  if (!writes) throw new AppError('not-allowed', 'Only the restorer and the crew write in this build.');
  return build;
}

/** A build this person owns: plan, settings, crew. */
export async function requireOwnBuild(em: Em, caller: Caller, slug: string): Promise<Build> {
  const { build, owns } = await requireVisibleBuild(em, caller, slug);
  if (!owns) throw new AppError('not-allowed', 'Only the restorer can do this.');
  return build;
}

/** The address of today for an old one. An unlisted build's cannot be guessed, as its old ones may: like a private one's it is told to the crew only. */
export async function movedBuild(em: Em, viewer: Viewer, slug: string): Promise<string | null> {
  const old = await em.findOne(BuildAddress, { slug }, { populate: ['build.owner'] });
  if (!old || old.build.slug === slug) return null;
  if (old.build.visibility !== 'public' && !(await mayWrite(em, viewer, old.build))) return null;
  return old.build.slug;
}

/** Whether money is shown to this viewer: to everyone where the restorer shows costs, else to crew only. */
export function seesCosts(build: Build, writes: boolean): boolean {
  return build.costsShown || writes;
}
