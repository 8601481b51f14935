import type { SaveState } from './saver.ts';

function clock(time: Date): string {
  return `${String(time.getHours()).padStart(2, '0')}:${String(time.getMinutes()).padStart(2, '0')}`;
}

/** Whether the text is still the one that was opened: no working copy of it anywhere. */
export function nothingChanged({ phase, onServer, savedAt }: Pick<SaveState, 'phase' | 'onServer' | 'savedAt'>): boolean {
  return phase.is === 'still' && !(savedAt && onServer);
}

/** What is kept where, in one line. */
export function keptWords({ phase, keptHere, onServer, savedAt }: SaveState): string {
  const here = keptHere ? 'Kept here' : 'Not kept in this browser';
  switch (phase.is) {
    case 'still': return savedAt && onServer ? `Kept here and on the server, ${clock(savedAt)}` : 'Nothing changed yet';
    case 'waiting': return keptHere ? 'Kept here, on its way to the server' : 'Keeping it';
    case 'saving': return `${here}, going to the server`;
    case 'retrying': return `${here}; the server could not be reached, trying again`;
    case 'signed-out': return `${here}; you are signed out, so the server does not have it yet`;
    case 'newer': return `${here}; somebody saved a newer text`;
    case 'refused': return `${here}; the server would not take it: ${phase.problem}`;
  }
}

/** What a screen reader is told: only what changes what the writer can do. */
export function spokenState({ phase }: SaveState): string {
  switch (phase.is) {
    case 'retrying': return 'The server could not be reached. What you type is kept in this browser and sent as soon as it can be.';
    case 'signed-out': return 'You are signed out. What you type is kept in this browser.';
    case 'newer': return 'Somebody saved a newer text of this entry.';
    case 'refused': return phase.problem;
    case 'still': case 'waiting': case 'saving': return '';
  }
}
