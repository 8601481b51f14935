import { useEffect, useState } from 'react';
import { useLocation } from 'react-router-dom';

/** What a page that led here hands on in its router state: "Signed off". */
export interface Said {
  said: string;
}

function saidIn(state: unknown): string | null {
  return typeof state === 'object' && state !== null && 'said' in state && typeof state.said === 'string' ? state.said : null;
}

/** What was just done on the page one comes from, shown and read out; loading the page again says it no more. */
export function JustDone() {
  const { state }: { state: unknown } = useLocation();
  const [said, setSaid] = useState<string | null>(null);
  useEffect(() => {
    const words = saidIn(state);
    if (words === null) return undefined;
    // after the first drawing, as a region that comes with its words in it is not read out
    const soon = setTimeout(() => {
      setSaid(words);
      window.history.replaceState({ ...(window.history.state as object | null), usr: null }, '');
    });
    return () => clearTimeout(soon);
  }, [state]);
  return <p role="status" className={said === null ? 'sr-only' : 'not-printed mb-5 max-w-reading border border-l-[5px] border-verd bg-card px-4 py-3 text-control font-semibold'}>{said}</p>;
}
