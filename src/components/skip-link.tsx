export interface SkipLinkProps {
  to?: string;
  children?: string;
}

/** First thing the keyboard meets; out of sight until it has the focus. */
export function SkipLink({ to = '#main', children = 'Skip to the page' }: SkipLinkProps) {
  return (
    <a
      href={to}
      className="not-printed sr-only focus:not-sr-only focus:absolute focus:top-2 focus:left-2 focus:z-50 focus:bg-card focus:px-4 focus:py-2 focus:font-semibold"
    >
      {children}
    </a>
  );
}
