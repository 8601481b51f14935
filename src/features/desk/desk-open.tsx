import { useCallback, useEffect, useMemo, useState, type MouseEvent } from 'react';
import { useNavigate } from 'react-router-dom';
import type { DeskView } from '#contracts/entries.ts';
import { AppError } from '#contracts/errors.ts';
import { ErrorSummary } from '#src/components/error-summary.tsx';
import type { Said } from '#src/components/just-done.tsx';
import { PageColumns } from '#src/components/page-columns.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { BenchProvider, PicturesProvider } from '#src/blocks/bench.ts';
import { useEntrySettled } from '#src/queries/entries.ts';
import { putBack } from './block-commands.ts';
import { deskLedger } from './desk-ledger.ts';
import { DeskSide } from './desk-side.tsx';
import type { DeskStart } from './desk-start.ts';
import { EntryHead } from './entry-head.tsx';
import type { KeptAt, KeptHere } from './kept-here.ts';
import { NewerTextDialog } from './newer-text.tsx';
import { Notices, type Notice } from './notices.tsx';
import { OpeningNotice } from './opening-notice.tsx';
import { goneWords, type GoneBlock } from './took-out.ts';
import { putIn, Tray } from './tray.tsx';
import { useBenchOf, useFiguresOf } from './use-bench.ts';
import { useFaults } from './use-faults.ts';
import { useMissingHistory } from './use-missing-history.ts';
import { useMaterials } from './use-materials.ts';
import { useSaver } from './use-saver.ts';
import { useSignOff } from './use-sign-off.ts';
import { useUploads } from './use-uploads.ts';
import { filesOf, useWriting } from './use-writing.ts';
import type { NewerText } from './saver.ts';
import { spokenState } from './what-is-kept.ts';
import { WordsEditor } from './words-editor.tsx';

export interface DeskOpenProps {
  view: DeskView;
  start: DeskStart;
  at: KeptAt;
  kept: KeptHere;
  /** What was done to the entry that made the desk open again. */
  said: string | null;
  /** The entry was taken back: the desk opens again on what stands now. */
  onReopen: (said: string) => Promise<void>;
}

/** A press on a button leaves the focus in its field until it has done its work: leaving a field may show its fault, which would move the button from under the press. */
function stayInField(event: MouseEvent): void {
  if (event.target instanceof Element && event.target.closest('button')) event.preventDefault();
}

/** The desk with an entry on it. */
export function DeskOpen({ view, start, at, kept, said, onReopen }: DeskOpenProps) {
  const navigate = useNavigate();
  const settled = useEntrySettled(at);
  const { saver, state: save, calls } = useSaver(view, start, at, kept);
  const [notice, setNotice] = useState<Notice | null>(null);
  const [later, setLater] = useState(false);
  const say = useCallback((words: string) => setNotice({ words }), []);
  useEffect(() => {
    if (said === null) return undefined;
    const soon = setTimeout(() => say(said));
    return () => clearTimeout(soon);
  }, [said, say]);
  const tookOut = useCallback((words: string, restore: () => void) => setNotice({ words, putBack: restore }), []);

  const onGone = (gone: GoneBlock[]) => tookOut(goneWords(gone), () => putBack(writing.editor, gone));
  const onFiles = (files: File[]) => uploads.add(putIn(writing.editor, 'photos', true), files);
  const writing = useWriting({ start, saver, onGone, onFiles });
  const { document, current, edit, editor } = writing;
  const { uploads, state: uploadsState, pictures } = useUploads(at.build, document, editor, start, kept);

  const { materials, byId, addMaterial } = useMaterials(view);
  const ledger = useMemo(() => deskLedger(view), [view]);
  const reckoning = useMemo(() => ledger.reckon(document, byId), [ledger, document, byId]);
  useMissingHistory(view, reckoning, save);
  const signing = useSignOff({ at, kept, saver, calls, reckonNow: () => ledger.reckon(current.current, byId), uploads: uploads.state });
  const { touch, fault, shown } = useFaults(reckoning, signing.attempt > 0, signing.serverFaults);
  const bench = useBenchOf({ view, document, materials, byId, addMaterial, touch, say, tookOut }, useFiguresOf(view, reckoning, byId, fault));

  const preview = async () => {
    await saver.flush();
    await navigate(`/builds/${at.build}/edit/${at.number}/preview`);
  };
  const takeBack = async () => {
    const version = await saver.hold();
    try {
      await calls.takeBack(version);
      await kept.forget();
      await settled();
      await onReopen('Taken back. Readers no longer see it, and the build’s figures leave it out.');
    } finally {
      saver.release();
    }
  };
  const throwAway = async () => {
    const version = await saver.hold();
    try {
      await calls.discard(version);
      await kept.forget();
      await settled();
      await navigate(view.entry.href ?? `/builds/${at.build}`, { state: { said: view.entry.published ? 'The changes are thrown away. This is what readers see, as before.' : 'The entry is thrown away.' } satisfies Said });
    } catch (cause) {
      saver.release();
      if (!(cause instanceof AppError) || cause.code !== 'newer-exists') throw cause;
      // somebody's newer text stands there: it is shown beside this one instead
      saver.meetNewer(cause.newer as NewerText);
    }
  };
  const newer = save.phase.is === 'newer' ? save.phase.newer : null;
  const choose = (text: typeof document) => {
    setLater(false);
    if (newer) writing.goOnWith(newer, text);
  };
  return (
    <BenchProvider value={bench}>
    <PicturesProvider value={pictures}>
      <PageFrame>
        <h1 className="sr-only">Write up: {document.title.trim() || 'a day'}</h1>
        <PageColumns
          sticky
          aside={
            <DeskSide
              view={view} reckoning={reckoning} materials={materials} faults={shown} save={save} onTryAgain={saver.tryAgain}
              signingOff={signing.pending} onSignOff={() => void signing.signOff()} onPreview={() => void preview()}
              going={uploadsState.going} onStopAll={uploads.stopAll} onTakeBack={takeBack} onThrowAway={throwAway}
            />
          }
        >
          <div
            onMouseDownCapture={stayInField}
            onPaste={(event) => {
              const files = filesOf(event.clipboardData);
              const block = event.target instanceof Element ? event.target.closest('[data-block-view]')?.getAttribute('data-block-view') : undefined;
              if (files.length === 0 || event.defaultPrevented) return;
              event.preventDefault();
              const inPhotos = block && document.content.some((node) => node.type === 'photos' && node.attrs.id === block);
              if (inPhotos) uploads.add(block, files);
              else onFiles(files);
            }}
          >
            <ErrorSummary errors={signing.errors.map(({ name, message }) => (name ? { name, message } : { message }))} attempt={signing.attempt} />
            <OpeningNotice takenUp={start.takenUp} newerWaits={newer !== null && later} onLook={() => setLater(false)} />
            <EntryHead view={view} document={document} onHead={(part) => edit((now) => ({ ...now, ...part }))} />
            <WordsEditor editor={editor} />
            <Tray editor={editor} />
          </div>
        </PageColumns>
        <Notices saving={spokenState(save)} notice={notice} onClose={() => setNotice(null)} />
        {newer && !later && (
          <NewerTextDialog view={view} context={{ measures: view.build.measures, currency: view.build.currency, materials: byId }} mine={document} base={save.base} newer={newer} onChoose={choose} onLater={() => setLater(true)} />
        )}
      </PageFrame>
    </PicturesProvider>
    </BenchProvider>
  );
}
