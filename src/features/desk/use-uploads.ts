import { useQueries, useQueryClient, type QueryClient } from '@tanstack/react-query';
import type { Editor } from '@tiptap/core';
import { useEffect, useMemo, useState, useSyncExternalStore } from 'react';
import type { DeskPicture } from '#contracts/pictures.ts';
import type { PicturesOnBench } from '#src/blocks/bench.ts';
import type { EntryDocument } from '#src/blocks/pure.ts';
import type { PhotosData } from '#src/blocks/photos/photos.ts';
import { pictureQuery, sendPicture } from '#src/queries/pictures.ts';
import { changeBlock } from './block-commands.ts';
import type { DeskStart } from './desk-start.ts';
import type { KeptHere } from './kept-here.ts';
import { makeUploads, type UploadParts } from './uploads.ts';

/** Where a picture goes among those already there, so that they stand as they were picked. */
export function placed(photos: PhotosData['photos'], photo: PhotosData['photos'][number], order: number, orders: ReadonlyMap<string, number>): PhotosData['photos'] {
  if (photos.some(({ id }) => id === photo.id)) return photos;
  const after = photos.findIndex(({ id }) => (orders.get(id) ?? -1) > order);
  return after === -1 ? [...photos, photo] : [...photos.slice(0, after), photo, ...photos.slice(after)];
}

function keysOf(document: EntryDocument): string[] {
  return [...new Set(document.content.flatMap((node) => (node.type === 'photos' ? node.attrs.data.photos.map(({ picture }) => picture) : [])))];
}

/** What happens when a picture has gone up: it stands in its block, where it was picked. */
function putInBlock(client: QueryClient, build: string, editor: Editor): UploadParts['onReady'] {
  const orders = new Map<string, number>();
  return ({ id, block, order }, picture) => {
    client.setQueryData(pictureQuery(build, picture.key).queryKey, picture);
    orders.set(id, order);
    changeBlock(editor, block, (data) => {
      // the id is that of a Photos block: only its desk adds uploads
      const now = data as PhotosData;
      return { ...now, photos: placed(now.photos, { id, picture: picture.key, caption: '', alt: '', cover: false }, order, orders) };
    });
  };
}

/** Pictures of one desk: those on their way up, and those its text shows. */
export function useUploads(build: string, document: EntryDocument, editor: Editor, start: DeskStart, kept: KeptHere) {
  const client = useQueryClient();
  const [uploads] = useState(() => makeUploads({
    send: (file, name, onProgress) => sendPicture(build, file, name, onProgress),
    onReady: putInBlock(client, build, editor),
    keepPicture: kept.keepPicture,
    forgetPicture: kept.forgetPicture,
    previewOf: (file) => URL.createObjectURL(file),
    dropPreview: (address) => URL.revokeObjectURL(address),
  }));
  const state = useSyncExternalStore(uploads.subscribe, uploads.state);
  useEffect(() => {
    uploads.resume(start.pictures);
    const back = () => uploads.retryFailed();
    window.addEventListener('online', back);
    return () => window.removeEventListener('online', back);
  }, [uploads, start]);

  const keys = useMemo(() => keysOf(document), [document]);
  const shown = useQueries({
    queries: keys.map((key) => pictureQuery(build, key)),
    combine: (results) => new Map<string, DeskPicture>(results.flatMap(({ data }) => (data ? [[data.key, data] as const] : []))),
  });
  const pictures: PicturesOnBench = useMemo(() => ({
    uploads: state.uploads, add: uploads.add, retry: uploads.retry, stop: uploads.stop, dismiss: uploads.dismiss, of: (key) => shown.get(key),
  }), [state.uploads, uploads, shown]);
  return { uploads, state, pictures };
}
