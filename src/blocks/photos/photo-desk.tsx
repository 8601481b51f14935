import { Picture } from '#src/components/picture.tsx';
import { usePictures } from '../bench.ts';
import { LabelledInput } from '../line-fields.tsx';
import type { Photo } from './photos.ts';

interface PhotoDeskProps {
  block: string;
  photo: Photo;
  place: number;
  last: boolean;
  onPhoto: (part: Partial<Photo>) => void;
  onMove: (by: number) => void;
  onTakeOut: () => void;
}

const quiet = 'min-h-8 rounded-edge px-2 text-small text-ink-soft hover:bg-hover hover:text-ink aria-disabled:opacity-40 max-wide:min-h-11';

/** One photo: its words, its place, whether it is the cover. */
export function PhotoDesk({ block, photo, place, last, onPhoto, onMove, onTakeOut }: PhotoDeskProps) {
  const pictures = usePictures();
  const view = pictures.of(photo.picture)?.picture;
  const which = `photo ${place + 1}`;
  const path = (field: string) => `${block}.${photo.id}.${field}`;
  return (
    <li className="m-0! grid grid-cols-[6.5rem_minmax(0,1fr)] gap-x-4 border-b border-rule py-3 wide:grid-cols-[11rem_minmax(0,1fr)]">
      <div className="aspect-[4/3] overflow-hidden bg-grey-wash">
        {view && <Picture picture={{ ...view, id: view.key, alt: photo.alt || which }} sizes="(min-width: 864px) 176px, 104px" fill />}
      </div>
      <div className="space-y-2.5">
        <LabelledInput name={path('alt')} label="For people who cannot see it" placeholder="What the picture shows" value={photo.alt} maxLength={400} onValue={(alt) => onPhoto({ alt })} />
        <LabelledInput name={path('caption')} label="Caption" value={photo.caption} maxLength={400} onValue={(caption) => onPhoto({ caption })} />
        <div className="-mx-2 flex flex-wrap items-center">
          <label className="flex min-h-8 items-center gap-1.5 px-2 text-small text-ink-soft max-wide:min-h-11">
            <input type="checkbox" checked={photo.cover} onChange={(event) => onPhoto({ cover: event.target.checked })} className="size-[18px] accent-scribe" />
            Cover
          </label>
          <button type="button" aria-disabled={place === 0} aria-label={`Move ${which} earlier`} onClick={() => onMove(-1)} className={quiet}>Earlier</button>
          <button type="button" aria-disabled={last} aria-label={`Move ${which} later`} onClick={() => onMove(1)} className={quiet}>Later</button>
          <button type="button" aria-label={`Take out ${which}`} onClick={onTakeOut} className={quiet}>Take out</button>
        </div>
      </div>
    </li>
  );
}
