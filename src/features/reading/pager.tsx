import { Link } from 'react-router-dom';

export interface PagerProps {
  page: number;
  pages: number;
  hrefOf: (page: number) => string;
  /** What is paged: "Entries". */
  label: string;
}

/** Paging by address, so that it works without scripts. */
export function Pager({ page, pages, hrefOf, label }: PagerProps) {
  if (pages <= 1) return null;
  return (
    <nav aria-label={`${label}, by page`} className="mt-6 flex flex-wrap items-center gap-x-5 gap-y-2 text-control">
      {page > 1 && <Link rel="prev" to={hrefOf(page - 1)}>Newer</Link>}
      <span className="num text-ink-soft">Page {page} of {pages}</span>
      {page < pages && <Link rel="next" to={hrefOf(page + 1)}>Older</Link>}
    </nav>
  );
}
