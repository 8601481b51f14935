import type { ReactNode } from 'react';

export interface PageHeadProps {
  kicker?: ReactNode;
  title: ReactNode;
  /** `page` for entries and builds, `place` for tools such as the shelf or settings. */
  lettering?: 'page' | 'place';
  lede?: ReactNode;
  /** Buttons under the lede. */
  actions?: ReactNode;
  /** Stands at the right, at the foot: the writer, pictures. */
  aside?: ReactNode;
  asideWidth?: 'narrow' | 'wide';
  /** Tabs or figures under the title. */
  children?: ReactNode;
}

const asideColumns = { narrow: 'wide:grid-cols-[minmax(0,1fr)_300px]', wide: 'wide:grid-cols-[minmax(0,1fr)_420px]' };

export function PageHead({ kicker, title, lettering = 'page', lede, actions, aside, asideWidth = 'narrow', children }: PageHeadProps) {
  const heading = lettering === 'page' ? 'lettering-page max-w-[20ch]' : 'lettering-place';
  return (
    <div className={`grid items-end gap-x-14 gap-y-5 ${aside ? asideColumns[asideWidth] : ''}`}>
      <div className="min-w-0">
        {kicker}
        <h1 className={`${heading} ${lettering === 'page' ? 'mt-3' : 'mt-2'}`}>{title}</h1>
        {lede && <div className="mt-3.5 max-w-[56ch] font-read text-[1.125rem]/[1.5] text-ink-soft wide:text-lede">{lede}</div>}
        {actions && <div className="not-printed mt-5 flex flex-wrap gap-2.5">{actions}</div>}
        {children}
      </div>
      {aside && <div className="min-w-0">{aside}</div>}
    </div>
  );
}
