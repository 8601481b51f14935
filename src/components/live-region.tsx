export interface LiveRegionProps {
  /** Said when it changes; empty says nothing. */
  message: string;
  /** Shown as well as said. */
  visible?: boolean;
}

/** For saves and uploads: stays in the page and changes its words. */
export function LiveRegion({ message, visible = false }: LiveRegionProps) {
  return (
    <p role="status" aria-live="polite" className={visible ? 'text-note' : 'sr-only'}>
      {message}
    </p>
  );
}
