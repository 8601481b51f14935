import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { AppError } from '#contracts/errors.ts';
import type { FormError } from '#src/components/error-summary.tsx';
import type { Said } from '#src/components/just-done.tsx';
import { useEntrySettled, type useEntryCalls } from '#src/queries/entries.ts';
import type { DeskReckoning } from './desk-ledger.ts';
import { deskFaults } from './faults.ts';
import type { KeptAt, KeptHere } from './kept-here.ts';
import type { NewerText, Saver } from './saver.ts';
import type { UploadsState } from './uploads.ts';

export interface SignOffParts {
  at: KeptAt;
  kept: KeptHere;
  saver: Saver;
  calls: ReturnType<typeof useEntryCalls>;
  /** The text as it is now, read and reckoned. */
  reckonNow: () => DeskReckoning;
  uploads: () => UploadsState;
}

/** A photo on its way, or stopped on it, is in nobody's text yet: signing off would leave it behind unsaid. */
export function photosOnTheWay({ uploads, going }: UploadsState): string | null {
  if (going) return 'Photos are still going up. Wait for them, or stop them and leave them out.';
  const stuck = uploads.filter(({ state }) => state === 'failed' || state === 'stopped').length;
  if (stuck === 0) return null;
  return stuck === 1 ? 'A photo has not gone up. Try it again, or leave it out.' : `${stuck} photos have not gone up. Try them again, or leave them out.`;
}

/** Publishing the day: faults first, each leading to its field; then one call, and on to the page. */
export function useSignOff({ at, kept, saver, calls, reckonNow, uploads }: SignOffParts) {
  const navigate = useNavigate();
  const settled = useEntrySettled(at);
  const [pending, setPending] = useState(false);
  const [attempt, setAttempt] = useState(0);
  const [errors, setErrors] = useState<FormError[]>([]);
  const [serverFaults, setServerFaults] = useState<Readonly<Record<string, string>>>({});

  const refuse = (found: FormError[]) => {
    setErrors(found);
    setAttempt((count) => count + 1);
  };
  const refused = (cause: AppError, reckoning: DeskReckoning) => {
    saver.release();
    if (cause.code === 'newer-exists') saver.meetNewer(cause.newer as NewerText);
    else if (cause.fields) {
      setServerFaults(cause.fields);
      refuse(deskFaults(cause.fields, reckoning.document).map(({ path, words }) => ({ name: path, message: words })));
    } else if (cause.code === 'unreachable') refuse([{ message: 'The server could not be reached. The day is kept in this browser: sign it off again when you are connected.' }]);
    else if (cause.code === 'sign-in-needed') refuse([{ message: 'You are signed out. The day is kept in this browser: sign in, then sign it off.' }]);
    else refuse([{ message: cause.message }]);
  };

  const signOff = async () => {
    if (pending) return;
    const reckoning = reckonNow();
    const found = deskFaults(reckoning.derived.faults, reckoning.document).map(({ path, words }) => ({ name: path, message: words }));
    const onTheWay = photosOnTheWay(uploads());
    if (onTheWay) found.push({ name: '', message: onTheWay });
    setServerFaults({});
    if (found.length > 0) {
      refuse(found);
      return;
    }
    setErrors([]);
    setPending(true);
    try {
      const version = await saver.hold();
      const { href } = await calls.signOff({ version, document: reckoning.document });
      await kept.forget();
      await settled();
      await navigate(href, { state: { said: 'Signed off. The build’s figures count it now.' } satisfies Said });
    } catch (cause) {
      if (!(cause instanceof AppError)) throw cause;
      refused(cause, reckoning);
    } finally {
      setPending(false);
    }
  };
  return { signOff, pending, attempt, errors, serverFaults };
}
