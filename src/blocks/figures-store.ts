/** What a line of a block comes to, with everything before it in the ledger counted. */
export interface LineReckoning {
  /** Minor units of the build's currency; settled so far. */
  readonly value: number;
  /** Exact `n/d`: not bought yet. */
  readonly short: string;
  /** What the short part would cost at the last price paid; in no sum. */
  readonly estimate: number | null;
  /** Exact `n/d`: on its shelf after this line; nothing where it reaches no shelf. */
  readonly left: string | null;
}

/** What changes with every keystroke. */
export interface Figures {
  /** By `block:line`. */
  readonly lines: ReadonlyMap<string, LineReckoning>;
  /** Words for beside a field, once it has been left or signing off was tried. */
  readonly fault: (path: string) => string | undefined;
  /** "650 ml left", on the build's shelf as it would stand after this entry; nothing where none was ever there. */
  readonly leftWords: (material: number) => string | null;
}

export interface FiguresStore {
  readonly read: () => Figures;
  readonly subscribe: (listener: () => void) => () => void;
  readonly publish: (figures: Figures) => void;
}

function same(a: LineReckoning | undefined, b: LineReckoning): a is LineReckoning {
  return a !== undefined && a.value === b.value && a.short === b.short && a.estimate === b.estimate && a.left === b.left;
}

/** Figures beside the text, so that a keystroke draws only the fields and lines it changes, not every block of the entry. */
export function makeFiguresStore(start: Figures): FiguresStore {
  let now = start;
  const listeners = new Set<() => void>();
  return {
    read: () => now,
    subscribe: (listener) => {
      listeners.add(listener);
      return () => { listeners.delete(listener); };
    },
    publish: (next) => {
      const lines = new Map([...next.lines].map(([key, line]) => {
        const before = now.lines.get(key);
        return [key, same(before, line) ? before : line];
      }));
      now = { ...next, lines };
      for (const listener of listeners) listener();
    },
  };
}
