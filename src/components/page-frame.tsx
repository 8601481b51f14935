import type { ReactNode } from 'react';

export interface PageFrameProps {
  /** The band at the top, on card: usually a `PageHead`. Left out, the page starts on the sheet. */
  head?: ReactNode;
  /** Hangs from the band's lower edge: the tape. */
  hang?: ReactNode;
  children: ReactNode;
}

export const pageWidth = 'mx-auto w-full max-w-page px-[18px] wide:px-8';

/** The one `main` of a page: header band on card, body on sheet. */
export function PageFrame({ head, hang, children }: PageFrameProps) {
  return (
    <main id="main" tabIndex={-1} className="pb-20">
      {head && <div className="border-b border-rule bg-card">{<div className={`${pageWidth} pt-7 pb-6`}>{head}</div>}</div>}
      {hang && <div className={pageWidth}>{hang}</div>}
      <div className={`${pageWidth} pt-8`}>{children}</div>
    </main>
  );
}
