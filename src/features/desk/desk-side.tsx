import type { MouseEvent } from 'react';
import type { DeskView } from '#contracts/entries.ts';
import { Button } from '#src/components/button.tsx';
import { FootTally } from '#src/components/foot-tally.tsx';
import { Progress } from '#src/components/progress.tsx';
import { RunningTally } from '#src/components/running-tally.tsx';
import { SubmitButton } from '#src/components/submit-button.tsx';
import type { MaterialFacts } from '#src/blocks/pure.ts';
import type { DeskReckoning } from './desk-ledger.ts';
import type { DeskFault } from './faults.ts';
import { LookAtThis } from './look-at-this.tsx';
import { OnTheShelf } from './on-the-shelf.tsx';
import { PublishedActions } from './published-actions.tsx';
import type { SaveState } from './saver.ts';
import { tallyWords } from './tally-words.ts';
import type { UploadsState } from './uploads.ts';
import { keptWords, nothingChanged } from './what-is-kept.ts';

export interface DeskSideProps {
  view: DeskView;
  reckoning: DeskReckoning;
  materials: readonly MaterialFacts[];
  faults: readonly DeskFault[];
  save: SaveState;
  onTryAgain: () => void;
  signingOff: boolean;
  onSignOff: () => void;
  onPreview: () => void;
  going: UploadsState['going'];
  onStopAll: () => void;
  onTakeBack: () => Promise<void>;
  onThrowAway: () => Promise<void>;
}

function mb(bytes: number): string {
  return (bytes / 1_000_000).toFixed(1);
}

function GoingUp({ going, onStopAll }: { going: NonNullable<UploadsState['going']>; onStopAll: () => void }) {
  const left = going.secondsLeft === null ? '' : going.secondsLeft > 90 ? `, ${Math.round(going.secondsLeft / 60)} min left` : `, ${going.secondsLeft} s left`;
  return (
    <Progress
      title={going.count === 1 ? '1 photo going up' : `${going.count} photos going up`} share={going.size === 0 ? 0 : going.sent / going.size}
      detail={`${mb(going.sent)} of ${mb(going.size)} MB${left}`} onStop={onStopAll}
    />
  );
}

/** What is kept where, and what readers will see: said at the foot of the tally. */
function KeptAndSeen({ view, save, onTryAgain, onPreview }: Pick<DeskSideProps, 'view' | 'save' | 'onTryAgain' | 'onPreview'>) {
  const { build, entry } = view;
  const canTry = save.phase.is === 'retrying' || save.phase.is === 'refused' || save.phase.is === 'signed-out';
  const link = 'min-h-6 text-left text-small text-on-deep underline max-wide:min-h-11';
  return (
    <div className="mt-2.5">
      <p className="text-note">{keptWords(save)}</p>
      {save.phase.is === 'signed-out' && <p><a href={`/sign-in?next=${encodeURIComponent(`/builds/${build.slug}/edit/${entry.number}`)}`} className={`inline-block ${link}`}>Sign in</a></p>}
      {canTry && <p><button type="button" onClick={onTryAgain} className={link}>Try again now</button></p>}
      <p className="mt-1"><button type="button" onClick={onPreview} className={link}>What readers will see</button></p>
    </div>
  );
}

/** A link that leads to a field takes what was opened over it out of the way. */
function closeOnLink({ target }: MouseEvent): void {
  if (target instanceof Element && target.closest('a')) target.closest('details')?.removeAttribute('open');
}

/** The day's tally and all that is said beside it; on a phone the tally is pinned at the foot. */
export function DeskSide(props: DeskSideProps) {
  const { view, reckoning, materials, faults, signingOff, onSignOff, going, onStopAll } = props;
  const words = tallyWords(reckoning, view.build.currency);
  const name = view.entry.published ? 'Sign off the changes' : 'Sign off the day';
  const button = <SubmitButton kind="zinc" full pending={signingOff} pendingWord="Signing off" onClick={onSignOff}>{name}</SubmitButton>;
  const { remarks } = reckoning.derived;
  const toLookAt = faults.length + remarks.length;
  const beside = (
    <>
      <LookAtThis faults={faults} remarks={remarks} />
      <OnTheShelf view={view} reckoning={reckoning} materials={materials} />
    </>
  );
  return (
    <>
      <div className="space-y-5">
        <div className="max-wide:hidden">
          <RunningTally label="The day's tally" figure={words.figure} words={words.words} groups={words.groups}>
            {button}
            <KeptAndSeen {...props} />
          </RunningTally>
        </div>
        <div className="space-y-5 max-wide:hidden">{beside}</div>
        {going && <GoingUp going={going} onStopAll={onStopAll} />}
        <PublishedActions {...props} changed={!nothingChanged(props.save)} />
      </div>
      <FootTally
        label="The day's tally, at the foot" figure={words.figure} words={toLookAt === 0 ? words.short : `${words.short}; ${toLookAt} to look at`} groups={[[{ label: 'This day', value: words.words.replace('this day: ', '') }], ...words.groups]}
        action={<Button kind="zinc" aria-disabled={signingOff || undefined} onClick={onSignOff}>{signingOff ? 'Signing off' : 'Sign off'}</Button>}
      >
        <KeptAndSeen {...props} />
        <div onClickCapture={closeOnLink} className="mt-3 space-y-4 text-ink [--focus:var(--color-scribe)]">{beside}</div>
      </FootTally>
    </>
  );
}
