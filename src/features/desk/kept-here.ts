import { openDB, type DBSchema, type IDBPDatabase } from 'idb';
import { entryDocument, steppedUp, type EntryDocument } from '#src/blocks/pure.ts';

/** Whose desk, on which entry of which build. */
export interface KeptAt {
  readonly handle: string;
  readonly build: string;
  readonly number: number;
}
/** Whose text, of which entry: its guid is no other entry's ever, and stays through a new name of the build. */
export interface KeptKey {
  readonly handle: string;
  readonly guid: string;
}

export interface KeptText {
  readonly document: EntryDocument;
  /** The version of the server's text it stands on. */
  readonly version: number;
  /** That text itself, where it is known: what somebody changed can then be told from what somebody else did. */
  readonly base: EntryDocument | null;
  readonly onServer: boolean;
  readonly at: Date;
}

export interface KeptPicture {
  readonly id: string;
  readonly entry: string;
  readonly block: string;
  readonly name: string;
  readonly file: Blob;
  readonly order: number;
}

interface DeskStore extends DBSchema {
  texts: { key: string; value: KeptText };
  pictures: { key: string; value: KeptPicture; indexes: { entry: string } };
}

let opened: Promise<IDBPDatabase<DeskStore>> | null = null;

function store(): Promise<IDBPDatabase<DeskStore>> {
  opened ??= openDB<DeskStore>('tallywright-desk', 1, {
    upgrade: (database) => {
      database.createObjectStore('texts');
      database.createObjectStore('pictures', { keyPath: 'id' }).createIndex('entry', 'entry');
    },
  });
  return opened;
}

function keyOf({ handle, guid }: KeptKey): string {
  return `${handle}/${guid}`;
}

/** A text as this version of the site has it: an older one kept it, perhaps. */
function readAgain(kept: EntryDocument): EntryDocument | null {
  const parsed = entryDocument.safeParse({ ...kept, content: steppedUp(kept.content) });
  return parsed.success ? parsed.data : null;
}

/** What this browser keeps of a desk, by account: the text not yet on the server, and the pictures not yet gone up. */
export function keptHere(of: KeptKey) {
  const entry = keyOf(of);
  return {
    read: async (): Promise<KeptText | null> => {
      const kept = await (await store()).get('texts', entry);
      if (!kept) return null;
      const document = readAgain(kept.document);
      return document && { ...kept, document, base: kept.base ? readAgain(kept.base) : null };
    },
    keep: async (text: Omit<KeptText, 'at'>): Promise<void> => {
      await (await store()).put('texts', { ...text, at: new Date() }, entry);
    },
    forget: async (): Promise<void> => {
      const database = await store();
      await database.delete('texts', entry);
      for (const key of await database.getAllKeysFromIndex('pictures', 'entry', entry)) await database.delete('pictures', key);
    },
    pictures: async (): Promise<KeptPicture[]> => {
      const kept = await (await store()).getAllFromIndex('pictures', 'entry', entry);
      return kept.toSorted((a, b) => a.order - b.order);
    },
    keepPicture: async (picture: Omit<KeptPicture, 'entry'>): Promise<void> => {
      await (await store()).put('pictures', { ...picture, entry });
    },
    forgetPicture: async (id: string): Promise<void> => {
      await (await store()).delete('pictures', id);
    },
  };
}
export type KeptHere = ReturnType<typeof keptHere>;
