import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { NoPicture } from './entry-row.tsx';
import { Kicker } from './kicker.tsx';
import { Picture, type PictureData } from './picture.tsx';

export interface BuildRowProps {
  to: string;
  title: string;
  picture?: PictureData | null;
  /** Kind, years, where it stands. */
  facts: ReactNode[];
  lead?: string;
  /** "£437.76 used", "31 days, 185 h 45 min"; left out where costs are not shown. */
  figures: string[];
  heading?: 'h2' | 'h3';
}

/** One build in a list of builds. */
export function BuildRow({ to, title, picture, facts, lead, figures, heading: Heading = 'h2' }: BuildRowProps) {
  return (
    <article className="relative grid grid-cols-[96px_minmax(0,1fr)] gap-x-4 border-b border-rule py-5 wide:grid-cols-[220px_minmax(0,1fr)_auto] wide:gap-x-7">
      <div className="h-[72px] wide:h-[146px]">{picture ? <Picture picture={{ ...picture, alt: '' }} sizes="(min-width: 864px) 220px, 96px" fill /> : <NoPicture />}</div>
      <div className="min-w-0">
        <Kicker items={facts} />
        <Heading className="lettering-section mt-1.5">
          <Link to={to} className="text-ink no-underline after:absolute after:inset-0 hover:underline">
            {title}
          </Link>
        </Heading>
        {lead && <p className="mt-2 line-clamp-3 max-w-[56ch] font-read text-[1.0625rem]/[1.5] text-ink-soft">{lead}</p>}
      </div>
      {figures.length > 0 && (
        <ul className="num col-start-2 mt-2 text-control wide:col-start-3 wide:mt-0 wide:text-right">
          {figures.map((figure, index) => (
            <li key={figure} className={index === 0 ? 'font-[650]' : 'text-ink-soft'}>
              {figure}
            </li>
          ))}
        </ul>
      )}
    </article>
  );
}
