import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { DeskView } from '#contracts/entries.ts';
import { AppError } from '#contracts/errors.ts';
import { Button } from '#src/components/button.tsx';
import { Dialog } from '#src/components/dialog.tsx';

interface PublishedActionsProps {
  view: DeskView;
  /** There is something to throw away besides what readers see. */
  changed: boolean;
  onTakeBack: () => Promise<void>;
  onThrowAway: () => Promise<void>;
}

type Asked = 'take-back' | 'throw-away' | null;
const quiet = 'min-h-6 text-small text-ink-soft underline underline-offset-[0.18em] hover:text-ink max-wide:min-h-11';

/** What else can become of an entry; each is asked once more, saying what goes and what stays. */
export function PublishedActions({ view, changed, onTakeBack, onThrowAway }: PublishedActionsProps) {
  const [asked, setAsked] = useState<Asked>(null);
  const [problem, setProblem] = useState<string | null>(null);
  const { published, href } = view.entry;
  const close = () => {
    setAsked(null);
    setProblem(null);
  };
  const go = async () => {
    setProblem(null);
    try {
      await (asked === 'take-back' ? onTakeBack() : onThrowAway());
      close();
    } catch (cause) {
      if (!(cause instanceof AppError)) throw cause;
      setProblem(cause.message);
    }
  };
  const throwWord = published ? 'Throw the changes away' : 'Throw this entry away';
  return (
    <div className="flex flex-col items-start gap-1">
      {published && href && <Link to={href} className="inline-flex items-center text-small max-wide:min-h-11">The entry as readers see it now</Link>}
      {published && <button type="button" className={quiet} onClick={() => setAsked('take-back')}>Take it back</button>}
      {(changed || !published) && <button type="button" className={quiet} onClick={() => setAsked('throw-away')}>{throwWord}</button>}
      <Dialog
        open={asked !== null} title={asked === 'take-back' ? 'Take it back' : throwWord} onClose={close}
        actions={
          <>
            <Button kind="lead" onClick={() => void go()}>{asked === 'take-back' ? 'Take it back' : throwWord}</Button>
            <Button kind="quiet" onClick={close}>Leave it</Button>
          </>
        }
      >
        <p className="text-control">
          {asked === 'take-back' && 'Readers no longer see the entry, and what it used, bought and cost leaves the build’s figures until it is signed off again. Its text stays here as a draft.'}
          {asked === 'throw-away' && (published ? 'The text goes back to what readers see now. What was changed since is gone.' : 'The entry goes, with its words, blocks and photos. It is not signed off, so no figures change.')}
        </p>
        {problem && <p role="alert" className="mt-3 text-small font-semibold text-lead">{problem}</p>}
      </Dialog>
    </div>
  );
}
