import { useRef, useState, type DragEvent } from 'react';
import { Button } from '#src/components/button.tsx';
import { plural } from '#domain/format.ts';
import { useBench, usePictures } from '../bench.ts';
import { BlockFrame } from '../block-frame.tsx';
import { deskBlock, type BlockDeskProps } from '../desk-block.ts';
import { PhotoDesk } from './photo-desk.tsx';
import { photos, type Photo, type PhotosData } from './photos.ts';
import { UploadDesk } from './upload-desk.tsx';

function imagesOf(list: DataTransfer | null): File[] {
  return [...(list?.files ?? [])];
}

function PhotosDesk({ id, data, onChange }: BlockDeskProps<PhotosData>) {
  const { tookOut } = useBench();
  const pictures = usePictures();
  const picker = useRef<HTMLInputElement>(null);
  const camera = useRef<HTMLInputElement>(null);
  const [over, setOver] = useState(false);
  const uploads = pictures.uploads.filter((upload) => upload.block === id);
  const withPhotos = (change: (now: Photo[]) => Photo[]) => onChange((now) => ({ ...now, photos: change(now.photos) }));

  const take = (files: File[]) => {
    if (files.length > 0) pictures.add(id, files);
  };
  const drop = (event: DragEvent) => {
    setOver(false);
    const files = imagesOf(event.dataTransfer);
    if (files.length === 0) return;
    event.preventDefault();
    event.stopPropagation();
    take(files);
  };
  const move = (photo: string, by: number) => withPhotos((now) => {
    const from = now.findIndex((one) => one.id === photo);
    const moved = now[from];
    const to = from + by;
    if (!moved || to < 0 || to >= now.length) return now;
    const rest = now.filter((one) => one.id !== photo);
    return [...rest.slice(0, to), moved, ...rest.slice(to)];
  });
  const takeOut = (photo: Photo, place: number) => {
    withPhotos((now) => now.filter((one) => one.id !== photo.id));
    tookOut('Photo taken out', () => withPhotos((now) => (now.some((one) => one.id === photo.id) ? now : [...now.slice(0, place), photo, ...now.slice(place)])));
  };
  const input = (capture: boolean) => (
    <input
      ref={capture ? camera : picker} type="file" multiple={!capture} hidden accept="image/*,.heic,.heif" aria-label={capture ? 'A photo from the camera' : 'Photos from this device'}
      {...(capture ? { capture: 'environment' as const } : {})}
      onChange={(event) => { take([...(event.target.files ?? [])]); event.target.value = ''; }}
    />
  );
  const count = data.photos.length;
  return (
    <BlockFrame kind={null} word="Photos" note={count > 0 ? plural(count, 'photo', 'photos') : undefined}>
      {(count > 0 || uploads.length > 0) && (
        <ol className="mt-2! mb-0! list-none! p-0!">
          {data.photos.map((photo, index) => (
            <PhotoDesk
              key={photo.id} block={id} photo={photo} place={index} last={index === count - 1}
              onPhoto={(part) => withPhotos((now) => now.map((one) => (one.id === photo.id ? { ...one, ...part } : part.cover ? { ...one, cover: false } : one)))}
              onMove={(by) => move(photo.id, by)} onTakeOut={() => takeOut(photo, index)}
            />
          ))}
          {uploads.map((upload) => <UploadDesk key={upload.id} upload={upload} />)}
        </ol>
      )}
      <div
        onDragOver={(event) => { event.preventDefault(); setOver(true); }} onDragLeave={() => setOver(false)} onDrop={drop}
        className={`mt-3 flex flex-wrap items-center gap-2.5 border border-dashed px-3.5 py-3 ${over ? 'border-scribe bg-scribe-wash' : 'border-rule-strong'}`}
      >
        {input(false)}
        {input(true)}
        <Button kind="plain" onClick={() => picker.current?.click()}>Pick photos</Button>
        <span className="hidden pointer-coarse:inline-flex"><Button kind="quiet" onClick={() => camera.current?.click()}>Take a photo</Button></span>
        <p className="text-small text-ink-soft">or drop them here, or paste. 40 MB each at the most; JPEG, PNG, WebP, HEIC, GIF.</p>
      </div>
    </BlockFrame>
  );
}

export const photosDesk = deskBlock<PhotosData>({
  word: 'Photos', kind: () => null, version: photos.version, Desk: PhotosDesk, blank: () => ({ photos: [] }),
  words: (data) => `${plural(data.photos.length, 'photo', 'photos')}${data.photos.map((photo) => (photo.caption ? `; ${photo.caption}` : '')).join('')}`,
});
