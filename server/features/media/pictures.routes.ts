import { Router, type RequestHandler } from 'express';
import { AppError } from '#contracts/errors.ts';
import { addPicture, readPicture } from '#contracts/pictures.ts';
import type { Parts } from '#server/http/context.ts';
import { handle, type EndpointTable } from '#server/http/endpoint-table.ts';
import { contextOf } from '#server/http/request-context.ts';
import { picturesFolder, placeOf } from './picture-store.ts';
import { pictureUpload } from './picture-upload.ts';
import { addPictureToBuild, deskPictureOf, mayServePicture, pictureOfBuild } from './pictures.service.ts';

/** Sending a picture to a build, and asking how it stands. */
export function pictureRoutes(table: EndpointTable, parts: Parts): void {
  handle(table, addPicture, async ({ em, viewer, upload }, { params }) => deskPictureOf(await addPictureToBuild(parts, em, viewer, params.build, upload)), pictureUpload(parts));
  handle(table, readPicture, async ({ em, viewer }, { params }) => deskPictureOf(await pictureOfBuild(em, viewer, params.build, params.key)));
}

const keyPattern = /^[a-z0-9]{24}$/;
const filePattern = /^(?:original\.jpg|[1-9]\d{0,4}\.(?:avif|webp|jpg))$/;
const types: Readonly<Record<string, string>> = { avif: 'image/avif', webp: 'image/webp', jpg: 'image/jpeg' };
const nothingHere = () => new AppError('not-found', 'There is no such picture.');

function headersFor(file: string, forWhom: 'everyone' | 'crew'): Record<string, string> {
  const open = forWhom === 'everyone';
  return {
    'Content-Type': types[file.slice(file.lastIndexOf('.') + 1)] ?? 'application/octet-stream',
    'Content-Disposition': 'inline',
    'X-Content-Type-Options': 'nosniff',
    // the files behind a key never change
    'Cache-Control': open ? 'public, max-age=31536000, immutable' : 'private, no-store',
    // feed readers on the web show the pictures of a feed from their own site
    'Cross-Origin-Resource-Policy': open ? 'cross-origin' : 'same-origin',
  };
}

function sendPictureFile(parts: Parts): RequestHandler {
  const root = picturesFolder(parts.config.dataDir);
  return async (req, res, next) => {
    const { key, file } = req.params;
    if (typeof key !== 'string' || typeof file !== 'string' || !keyPattern.test(key) || !filePattern.test(file)) throw nothingHere();
    const { em, viewer } = await contextOf(req, parts);
    const forWhom = await mayServePicture(em, viewer, key);
    if (forWhom === 'nobody') throw nothingHere();
    // the headers go out with the file only: an answer that there is none must not be kept for a year
    const sending = { root, dotfiles: 'deny', cacheControl: false, headers: headersFor(file, forWhom) } as const;
    res.sendFile(`${placeOf(key)}/${file}`, sending, (error?: Error & { status?: number }) => {
      if (!error || res.headersSent) return;
      if (error.status === 416) res.status(416).end();
      else next(error.status === 404 ? nothingHere() : error);
    });
  };
}

/** The files themselves, at addresses that last. */
export function picturesRouter(parts: Parts): Router {
  const router = Router();
  router.get('/pictures/:key/:file', sendPictureFile(parts));
  return router;
}
