import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { noBody, nothing, slug } from './fields.ts';
import { pictureStates } from './words.ts';

/** A picture as pages need it; addresses are absolute paths on this site. */
export const pictureView = z.object({
  key: z.string(),
  width: z.number().int(),
  height: z.number().int(),
  alt: z.string(),
  caption: z.string(),
  /** Data URI a few hundred bytes long. */
  placeholder: z.string(),
  src: z.string(),
  /** Best format first. */
  sources: z.array(z.object({ type: z.string(), srcset: z.string() })),
});
export type PictureView = z.output<typeof pictureView>;

/** A picture as the desk sees it while it goes up. */
export const deskPicture = z.object({
  key: z.string(),
  state: z.enum(pictureStates),
  problem: z.string().nullable(),
  picture: pictureView.nullable(),
});
export type DeskPicture = z.output<typeof deskPicture>;

/** Multipart with one file field `picture`. Answers when the picture is ready or refused. */
export const addPicture = endpoint({
  method: 'POST', path: '/api/builds/:build/pictures', access: 'member',
  params: z.object({ build: slug }), query: nothing, body: noBody, reply: deskPicture,
});
export const readPicture = endpoint({
  method: 'GET', path: '/api/builds/:build/pictures/:key', access: 'member',
  params: z.object({ build: slug, key: z.string().max(60) }), query: nothing, body: noBody, reply: deskPicture,
});
