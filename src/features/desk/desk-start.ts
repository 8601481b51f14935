import { useEffect, useState } from 'react';
import type { DeskView } from '#contracts/entries.ts';
import type { EntryDocument } from '#src/blocks/pure.ts';
import type { KeptHere, KeptPicture, KeptText } from './kept-here.ts';
import { sameText } from './same-text.ts';
import type { NewerText } from './saver.ts';

/** What the desk opens with. */
export interface DeskStart {
  readonly document: EntryDocument;
  /** When the text was kept here that had not reached the server and is taken up now. */
  readonly takenUp: Date | null;
  /** The version of the server's text this one stands on, and that text where it is known. */
  readonly version: number;
  readonly base: EntryDocument | null;
  /** The server has a newer text than the one this browser's stands on. */
  readonly newer: NewerText | null;
  readonly pictures: readonly KeptPicture[];
}

export function startOf({ entry }: Pick<DeskView, 'entry'>, kept: KeptText | null, pictures: readonly KeptPicture[]): DeskStart {
  if (!kept || kept.onServer || sameText(kept.document, entry.document)) return { document: entry.document, takenUp: null, version: entry.version, base: entry.document, newer: null, pictures };
  const onNewest = kept.version === entry.version;
  return {
    document: kept.document, takenUp: kept.at, version: kept.version, base: onNewest ? entry.document : kept.base,
    newer: onNewest ? null : { version: entry.version, document: entry.document }, pictures,
  };
}

/** Reads what this browser keeps of the entry before the desk opens; a browser that keeps nothing opens on the server's text. */
export function useDeskStart(view: DeskView | undefined, kept: KeptHere): DeskStart | null {
  const [start, setStart] = useState<DeskStart | null>(null);
  useEffect(() => {
    if (!view || start) return undefined;
    let left = false;
    const open = async () => {
      const [text, pictures] = await Promise.all([kept.read(), kept.pictures()]);
      if (!left) setStart(startOf(view, text, pictures));
    };
    open().catch((cause: unknown) => {
      if (!(cause instanceof Error)) throw cause;
      if (!left) setStart(startOf(view, null, []));
    });
    return () => { left = true; };
  }, [view, kept, start]);
  return start;
}
