import { rm } from 'node:fs/promises';
import type { RequestHandler } from 'express';
import multer from 'multer';
import { AppError } from '#contracts/errors.ts';
import { requireWritableBuild } from '#server/features/builds/build-access.service.ts';
import type { Parts } from '#server/http/context.ts';
import { contextOf } from '#server/http/request-context.ts';
import { maxUploadBytes, megabyte, tooHeavyWords } from './picture-limits.ts';
import { newPictureKey, readyQuarantine } from './picture-store.ts';
import { requireRoom } from './picture-room.ts';

/** What a form adds around its file: boundaries and headers. */
const formBytes = 16 * 1024;
const aboutField = (code: 'bad-input' | 'too-large', words: string) => new AppError(code, words, { picture: words });

/** Asked before a byte of the body is read. */
function askFirst(parts: Parts): RequestHandler {
  return async (req, _res, next) => {
    const { em, viewer } = await contextOf(req, parts);
    if (!viewer) throw new AppError('sign-in-needed', 'Sign in first.');
    if (viewer.suspended) throw new AppError('suspended', 'This account is suspended: you can read, and take your data away.');
    const build = await requireWritableBuild(em, viewer, String(req.params['build']));
    await requireRoom(em, viewer, build, parts.now());
    const announced = Number(req.get('content-length') ?? 0);
    if (announced > maxUploadBytes + formBytes) throw aboutField('too-large', tooHeavyWords(announced));
    next();
  };
}

function wordsFor(error: multer.MulterError): AppError {
  if (error.code === 'LIMIT_FILE_SIZE') return aboutField('too-large', `That file is over ${maxUploadBytes / megabyte} MB, which is the most.`);
  if (error.code === 'LIMIT_UNEXPECTED_FILE' || error.code === 'LIMIT_FILE_COUNT') return aboutField('bad-input', 'Send one picture at a time, in a field called picture.');
  return new AppError('malformed', 'The form with the picture could not be read.');
}

/** Multer and its parser throw plain errors for a body they cannot follow; what the disk throws has a code of its own. */
function translated(error: unknown): unknown {
  if (error instanceof multer.MulterError) return wordsFor(error);
  if (error instanceof Error && !('code' in error)) return new AppError('malformed', 'The picture did not arrive whole. Send it again.');
  return error;
}

/** Takes the one file of the form into quarantine under a random name. */
function intoQuarantine(parts: Parts): RequestHandler {
  const storage = multer.diskStorage({
    destination: (_req, _file, done) => void readyQuarantine(parts.config.dataDir).then((folder) => done(null, folder), (error: Error) => done(error, '')),
    filename: (_req, _file, done) => done(null, newPictureKey()),
  });
  const limits = { fileSize: maxUploadBytes, files: 1, fields: 0, parts: 1, headerPairs: 20 };
  const single = multer({ storage, limits, defParamCharset: 'utf8' }).single('picture');
  return (req, res, next) => {
    // whatever becomes of the request, nothing of it stays in quarantine
    res.on('close', () => {
      // of a file that was broken off multer keeps the name and no path, and has removed it
      if (req.file?.path) rm(req.file.path, { force: true }).catch((error: unknown) => req.log.error({ err: error }, 'an upload stays in quarantine'));
    });
    single(req, res, (error: unknown) => next(error === undefined ? undefined : translated(error)));
  };
}

export function pictureUpload(parts: Parts): readonly RequestHandler[] {
  return [askFirst(parts), intoQuarantine(parts)];
}
