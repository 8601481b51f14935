import { randomBytes } from 'node:crypto';
import slugify from '@sindresorhus/slugify';
import type { Visibility } from '#contracts/words.ts';
import { BuildAddress, type Build } from '#server/entities/index.ts';
import type { Em } from '#server/http/context.ts';

/** Words that are pages of ours at the same level. */
const reservedBuilds = new Set(['new']);
const letters = 'abcdefghjkmnpqrstuvwxyz23456789';

function randomSuffix(length: number): string {
  return Array.from(randomBytes(length), (byte) => letters[byte % letters.length] ?? 'a').join('');
}

/** The slug of a title within 60 letters; `fallback` where nothing of it is left. */
export function slugOf(title: string, fallback: string): string {
  const slug = slugify(title, { decamelize: false }).slice(0, 60).replace(/^-+|-+$/g, '');
  return slug === '' ? fallback : slug;
}

/**
 * A slug no build has ever had. An unlisted build's ends in ten random letters, so that it cannot be guessed.
 * The caller writes the `BuildAddress` row in the same flush; its primary key closes the race.
 */
export async function freeBuildSlug(em: Em, title: string, visibility: Visibility): Promise<string> {
  const base = slugOf(title, 'build');
  if (visibility === 'unlisted') return `${base}-${randomSuffix(10)}`;
  for (let count = 1; count < 50; count += 1) {
    const slug = count === 1 ? base : `${base}-${count}`;
    if (!reservedBuilds.has(slug) && (await em.count(BuildAddress, { slug })) === 0) return slug;
  }
  return `${base}-${randomSuffix(6)}`;
}

/** Gives a build a new address and keeps the old one for redirects. */
export async function moveBuild(em: Em, build: Build, title: string, visibility: Visibility): Promise<void> {
  build.slug = await freeBuildSlug(em, title, visibility);
  em.persist(em.create(BuildAddress, { slug: build.slug, build }));
}
