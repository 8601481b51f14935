import type { ReactNode } from 'react';
import { Picture, type PictureProps } from './picture.tsx';

export interface FigureProps extends PictureProps {
  caption?: ReactNode;
  /** Cut to a common shape, so that pictures in a row are level. */
  crop?: 'landscape' | 'square';
}

const crops = { landscape: 'aspect-[4/3]', square: 'aspect-square' };

export function Figure({ caption, crop, ...picture }: FigureProps) {
  return (
    <figure>
      {crop ? (
        <div className={crops[crop]}>
          <Picture {...picture} fill />
        </div>
      ) : (
        <Picture {...picture} />
      )}
      {caption && <figcaption className="mt-2 text-small text-ink-soft">{caption}</figcaption>}
    </figure>
  );
}
