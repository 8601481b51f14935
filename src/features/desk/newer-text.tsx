import { useMemo, useState, type ReactNode } from 'react';
import type { DeskView } from '#contracts/entries.ts';
import { Button } from '#src/components/button.tsx';
import { Dialog } from '#src/components/dialog.tsx';
import type { EntryContext } from '#src/blocks/derive-entry.ts';
import type { EntryDocument } from '#src/blocks/pure.ts';
import type { NewerText } from './saver.ts';
import { differencesOf, mergedText, usualSide, usualWords, type Difference, type Side } from './two-texts.ts';

export interface NewerTextDialogProps {
  view: DeskView;
  context: EntryContext;
  mine: EntryDocument;
  /** The text both stand on, where it is known. */
  base: EntryDocument | null;
  newer: NewerText;
  onChoose: (document: EntryDocument) => void;
  /** Goes on writing; what is typed stays in this browser until the two texts are brought together. */
  onLater: () => void;
}

/** A piece of one text in words. */
function shown(words: string | null): ReactNode {
  if (words === null) return <em className="text-ink-soft">Not there</em>;
  return words.trim() === '' ? <em className="text-ink-soft">Nothing in it yet</em> : words;
}

/** Two texts of one entry, side by side where they differ. */
export function NewerTextDialog({ view, context, mine, base, newer, onChoose, onLater }: NewerTextDialogProps) {
  const stages = useMemo(() => new Map(view.stages.map(({ id, title }) => [id, title])), [view.stages]);
  const differences = useMemo(() => differencesOf({ mine, theirs: newer.document, base }, context, stages), [mine, base, newer.document, context, stages]);
  const [picked, setPicked] = useState<ReadonlyMap<string, Side>>(new Map());
  const sideOf = (difference: Difference) => picked.get(difference.key) ?? usualSide(difference);
  const all = (side: Side) => onChoose(side === 'mine' ? mine : newer.document);
  const together = () => onChoose(mergedText(mine, newer.document, new Map(differences.map((one) => [one.key, sideOf(one)]))));
  return (
    <Dialog
      open title="Somebody saved a newer text" closeWord="Later" onClose={onLater}
      actions={
        <>
          <Button onClick={together}>Go on with what is picked</Button>
          <Button kind="plain" onClick={() => all('mine')}>Keep all of mine</Button>
          <Button kind="plain" onClick={() => all('theirs')}>Keep all of theirs</Button>
        </>
      }
    >
      <p className="text-control">It was saved from somewhere else after you opened this desk. Both texts are here; pick what to go on with, piece by piece.</p>
      <div className="mt-4 max-h-[50vh] space-y-4 overflow-y-auto">
        {differences.map((difference) => (
          <Piece key={difference.key} difference={difference} side={sideOf(difference)} onSide={(side) => setPicked((now) => new Map(now).set(difference.key, side))} />
        ))}
      </div>
    </Dialog>
  );
}

function Piece({ difference, side, onSide }: { difference: Difference; side: Side; onSide: (side: Side) => void }) {
  const choice = (of: Side, title: string) => (
    <label className={`block border p-3 text-small ${side === of ? 'border-2 border-scribe' : 'border-rule'}`}>
      <span className="flex items-center gap-2 font-semibold">
        <input type="radio" name={difference.key} checked={side === of} onChange={() => onSide(of)} className="size-[18px] accent-scribe" />
        {title}
      </span>
      <span className="mt-1.5 block whitespace-pre-wrap">{shown(difference[of])}</span>
    </label>
  );
  return (
    <fieldset>
      <legend className="text-small font-semibold">{difference.label}</legend>
      <p className="mb-1 text-note text-ink-soft">{usualWords(difference)}</p>
      <div className="grid gap-2.5 wide:grid-cols-2">
        {choice('mine', 'Yours')}
        {choice('theirs', 'Theirs')}
      </div>
    </fieldset>
  );
}
