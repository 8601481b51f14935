import type { ReactNode } from 'react';
import { Picture, type PictureProps } from './picture.tsx';

export interface FigureProps extends PictureProps {
  caption?: ReactNode;
}

export function Figure({ caption, ...picture }: FigureProps) {
  return (
    <figure>
      <Picture {...picture} />
      {caption && <figcaption className="mt-2 text-small text-ink-soft">{caption}</figcaption>}
    </figure>
  );
}
