import slugify from '@sindresorhus/slugify';
import { Person } from '#server/entities/index.ts';
import type { Em } from '#server/http/context.ts';

// Addresses of ours, and words that would pass for the people who run the place.
const reserved = new Set([
  'about', 'account', 'accounts', 'admin', 'administration', 'administrator', 'api', 'assets', 'build', 'builds', 'contact', 'costs',
  'crew', 'demo', 'entry', 'everyone', 'feed', 'feeds', 'following', 'github', 'help', 'home', 'info', 'mail', 'materials', 'member',
  'moderation', 'moderator', 'my-builds', 'new', 'nobody', 'notifications', 'official', 'outbox', 'people', 'person', 'pictures',
  'plan', 'privacy', 'receipts', 'reckoner', 'record', 'root', 'search', 'security', 'settings', 'shed', 'shelf', 'sign-in', 'sign-out',
  'sign-up', 'staff', 'suggest', 'support', 'system', 'tallywright', 'team', 'terms', 'webmaster', 'write',
]);
const endings = ['2', '3', 'shed', 'works', 'bench', '4', '5'];
const longestHandle = 30;

async function free(em: Em, handles: readonly string[]): Promise<string[]> {
  const taken = new Set((await em.find(Person, { handle: { $in: [...handles] } }, { fields: ['handle'] })).map(({ handle }) => handle));
  return handles.filter((handle) => !taken.has(handle) && !reserved.has(handle));
}

/** Why this handle cannot be had, with three that can; nothing when it is free. */
export async function handleProblem(em: Em, handle: string): Promise<string | undefined> {
  const candidates = endings.map((ending) => `${handle.slice(0, longestHandle - ending.length - 1).replace(/-$/, '')}-${ending}`);
  const open = await free(em, [handle, ...candidates]);
  if (open[0] === handle) return undefined;
  const why = reserved.has(handle) ? 'This word is kept for the site.' : 'This handle is taken.';
  return open.length > 0 ? `${why} Free: ${open.slice(0, 3).join(', ')}.` : `${why} Try another.`;
}

/** A handle made of somebody's name elsewhere, for them to change. */
export function handleFrom(text: string): string {
  return slugify(text, { decamelize: false }).replace(/^[^a-z]+/, '').slice(0, longestHandle).replace(/-$/, '');
}
