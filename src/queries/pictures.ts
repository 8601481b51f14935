import { queryOptions } from '@tanstack/react-query';
import type { DeskPicture, readPicture } from '#contracts/pictures.ts';
import { errorOf } from '#src/lib/fetch-transport.ts';
import { call } from '#src/lib/transport.ts';

export const pictureQuery = (build: string, key: string) => queryOptions({
  queryKey: ['pictures', build, key],
  queryFn: ({ client }) => call<typeof readPicture>(client, 'GET', '/api/builds/:build/pictures/:key', { params: { build, key } }),
  staleTime: Infinity,
});

export interface PictureGoingUp {
  /** Settles when the picture is ready or refused. Fails with `AppError`, or with `AbortError` after `stop`. */
  readonly done: Promise<DeskPicture>;
  readonly stop: () => void;
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch (cause) {
    // a proxy in between may answer in HTML; the status says enough then
    if (cause instanceof SyntaxError) return null;
    throw cause;
  }
}

/** Sends one picture, saying how much has gone: `fetch` cannot tell, so this is the one place with `XMLHttpRequest`. */
export function sendPicture(build: string, file: Blob, name: string, onProgress: (sent: number, whole: number) => void): PictureGoingUp {
  const request = new XMLHttpRequest();
  const done = new Promise<DeskPicture>((resolve, reject) => {
    request.open('POST', `/api/builds/${encodeURIComponent(build)}/pictures`);
    request.setRequestHeader('accept', 'application/json');
    request.upload.addEventListener('progress', (event) => onProgress(event.loaded, event.lengthComputable ? event.total : file.size));
    request.addEventListener('load', () => {
      const body = parsed(request.responseText);
      // the reply of our own endpoint, checked by its status
      if (request.status >= 200 && request.status < 300 && body !== null) resolve(body as DeskPicture);
      else reject(errorOf(request.status, body));
    });
    request.addEventListener('error', () => reject(new TypeError('The server could not be reached.')));
    request.addEventListener('abort', () => reject(new DOMException('Stopped', 'AbortError')));
    const form = new FormData();
    form.append('picture', file, name);
    request.send(form);
  });
  return { done, stop: () => request.abort() };
}
