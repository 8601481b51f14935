import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { Kicker, type KickerProps } from './kicker.tsx';
import { Picture, type PictureData } from './picture.tsx';

export interface EntryRowProps {
  to: string;
  title: string;
  picture?: PictureData | null;
  kicker: KickerProps;
  small?: ReactNode;
  /** Left out where costs are not shown. */
  money?: string | null;
  hours?: string | null;
  heading?: 'h2' | 'h3';
}

/** One day in a list: its picture, what it was, and its figures at the right. */
export function EntryRow({ to, title, picture, kicker, small, money, hours, heading: Heading = 'h3' }: EntryRowProps) {
  return (
    <article className="relative grid grid-cols-[96px_minmax(0,1fr)] gap-x-4 border-b border-rule py-4 wide:grid-cols-[132px_minmax(0,1fr)_auto] wide:gap-x-5">
      <div className="h-[66px] wide:h-[90px]">{picture ? <Picture picture={{ ...picture, alt: '' }} sizes="(min-width: 864px) 132px, 96px" fill /> : <NoPicture />}</div>
      <div className="min-w-0">
        <Kicker {...kicker} />
        <Heading className="lettering-row mt-1">
          <Link to={to} className="text-ink no-underline after:absolute after:inset-0 hover:underline">
            {title}
          </Link>
        </Heading>
        {small && <p className="mt-1 text-small text-ink-soft">{small}</p>}
      </div>
      {(money || hours) && (
        <p className="num col-start-2 mt-1 flex gap-3 text-control wide:col-start-3 wide:mt-0 wide:block wide:text-right">
          {money && <b className="block font-[650]">{money}</b>}
          {hours && <span className="block text-ink-soft">{hours}</span>}
        </p>
      )}
    </article>
  );
}

export function NoPicture() {
  return (
    <svg viewBox="0 0 132 90" preserveAspectRatio="xMidYMid slice" aria-hidden="true" className="block h-full w-full bg-grey-wash">
      <path d="M48 30v30M58 30v30M68 30v30M78 30v30M42 56l44-22" fill="none" className="stroke-rule-strong" strokeWidth="3" />
    </svg>
  );
}
