import { Figure } from './figure.tsx';
import type { PictureData } from './picture.tsx';

export interface GroupPhoto {
  picture: PictureData;
  caption?: string;
}

export interface PhotoGroupProps {
  photos: GroupPhoto[];
  /** The first group of an entry: its first picture is fetched at once. */
  first?: boolean;
  /** Shape of those that stand side by side. */
  crop?: 'landscape' | 'square';
}

/** The reading column is 796 px at the widest; below 864 px it is the page. */
const whole = '(min-width: 1280px) 796px, (min-width: 864px) calc(100vw - 420px), calc(100vw - 36px)';
const half = '(min-width: 1280px) 395px, (min-width: 864px) calc(50vw - 213px), calc(50vw - 21px)';

/** One picture fills the column; two stand side by side; with an odd count the first runs across. */
export function PhotoGroup({ photos, first = false, crop = 'landscape' }: PhotoGroupProps) {
  const odd = photos.length % 2 === 1;
  return (
    <div className={photos.length > 1 ? 'grid grid-cols-2 gap-x-1.5 gap-y-4' : ''}>
      {photos.map((photo, index) => {
        const across = odd && index === 0;
        return (
          <div key={photo.picture.id} className={across ? 'col-span-2' : 'min-w-0'}>
            <Figure picture={photo.picture} sizes={across ? whole : half} priority={first && index === 0} crop={across ? undefined : crop} caption={photo.caption} />
          </div>
        );
      })}
    </div>
  );
}
