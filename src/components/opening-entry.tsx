import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { Kicker, type KickerProps } from './kicker.tsx';
import { Picture, type PictureData } from './picture.tsx';

export interface OpeningEntryProps {
  to: string;
  kicker: KickerProps;
  title: string;
  lede?: string;
  picture?: PictureData | null;
  /** The slip that belongs to it. */
  slip?: ReactNode;
}

/** The day the home page opens on; its title is the page's `h1`. */
export function OpeningEntry({ to, kicker, title, lede, picture, slip }: OpeningEntryProps) {
  return (
    <article className={`grid gap-x-9 gap-y-4 ${picture ? 'wide:grid-cols-[minmax(0,1fr)_400px] wide:grid-rows-[auto_1fr]' : ''}`}>
      {picture && (
        <Link to={to} tabIndex={-1} aria-hidden="true" className="block aspect-[3/2] wide:col-start-1 wide:row-span-2 wide:row-start-1 wide:aspect-auto wide:min-h-[420px]">
          <Picture picture={{ ...picture, alt: '' }} sizes="(min-width: 1280px) 716px, (min-width: 864px) calc(100vw - 500px), calc(100vw - 36px)" priority fill />
        </Link>
      )}
      <div className="min-w-0">
        <Kicker {...kicker} />
        <h1 className="lettering-page mt-2 max-w-[20ch]">
          <Link to={to} className="text-ink no-underline hover:underline">
            {title}
          </Link>
        </h1>
        {lede && <p className="mt-3 max-w-[56ch] font-read text-[1.125rem]/[1.5] text-ink-soft wide:text-lede">{lede}</p>}
      </div>
      {slip && <div className="min-w-0 self-start">{slip}</div>}
    </article>
  );
}
