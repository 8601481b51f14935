import type { RowView } from '#contracts/entry-view.ts';
import { plainWords } from './plain-words.ts';

// Heights are guessed in the wide layout's pixels, well enough to tell a gap one reads across from a hole in the page.

/** What a row's height is guessed from. */
export type GuessedRow = Pick<RowView, 'body' | 'slips'>;
type BodyNode = RowView['body'][number];
type SlipNode = RowView['slips'][number]['slip'];

const proseLine = 30;
const lettersALine = 62;
const slipLetters = 34;

function linesOf(words: string, letters: number): number {
  return Math.max(1, Math.ceil(words.length / letters));
}

function bodyHeight(node: BodyNode): number {
  if (node.type === 'photos') return node.photos.length === 0 ? 0 : (node.photos.length % 2 === 1 ? 570 : 0) + Math.floor(node.photos.length / 2) * 305;
  if (node.type === 'caution') return 60 + linesOf(node.words, 60) * 23;
  if (node.type === 'heading') return 58;
  if (node.type === 'table') return 48 + node.content.length * 45;
  if (node.type === 'bulletList' || node.type === 'orderedList') return 20 + node.content.reduce((sum, item) => sum + linesOf(plainWords(item), lettersALine - 6) * proseLine, 0);
  return 20 + linesOf(plainWords(node), lettersALine) * proseLine;
}

function slipHeight(slip: SlipNode): number {
  const text = (slip.text ?? []).reduce((sum, part) => sum + 8 + linesOf(part.words, slipLetters - 4) * 26, 0);
  const lines = slip.lines.reduce((sum, line) => sum + linesOf(line.label, slipLetters - 8) * 19 + (line.small ? linesOf(line.small, slipLetters) * 17 : 0) + 5, 0);
  return 50 + 24 + text + lines + (slip.sum ? 38 : 0) + (slip.footnote ? linesOf(slip.footnote, slipLetters) * 18 : 0);
}

/** The tallest gap words are pushed down by for the sake of a slip: beyond it they run on, and the next slip stands under the last. */
export const mostGap = 150;

/**
 * Which rows start a run of their own. A slip keeps to its words, and a slip taller than its words pushes the next ones down;
 * but where that would tear a hole into the page, the words run on.
 * @param beside height of what stands first in the margin, in pixels: the day's tally
 * @returns for each row, the index of the run it belongs to
 */
export function runsOf(rows: readonly GuessedRow[], beside: number): number[] {
  return laidOut(rows, beside).runs;
}

/**
 * How many of the last row's slips are left hanging far below the end of the words, and stand better under them.
 * Two abreast they take half their height there.
 */
export function hangingSlips(rows: readonly GuessedRow[], beside: number): number {
  let { text, margin } = laidOut(rows, beside);
  const slips = rows.at(-1)?.slips ?? [];
  let hanging = 0;
  for (const { slip } of slips.toReversed()) {
    const height = slipHeight(slip);
    if (margin - text < mostGap + height / 2) break;
    margin -= height;
    text += height / 2;
    hanging += 1;
  }
  // one alone would only change sides
  return hanging > 1 ? hanging : 0;
}

interface Laid { runs: number[]; text: number; margin: number }

function laidOut(rows: readonly GuessedRow[], beside: number): Laid {
  let run = 0;
  let text = 0;
  let margin = beside;
  // the day's tally belongs to no words in particular, so no words wait for it
  let onlyTally = true;
  const runs = rows.map((row, index) => {
    const gap = margin - text;
    if (index > 0 && gap <= (onlyTally ? 0 : mostGap)) {
      run += 1;
      text = Math.max(text, margin);
      margin = text;
    }
    text += row.body.reduce((sum, node) => sum + bodyHeight(node), 0);
    onlyTally &&= row.slips.length === 0;
    margin += row.slips.reduce((sum, { slip }) => sum + slipHeight(slip), 0);
    return run;
  });
  return { runs, text, margin };
}

/** The day's tally, guessed in pixels. */
const tallyHeight = 300;

/** Says of each row which run it belongs to and which of its slips stand under the words, so that the browser has nothing to work out. */
export function withRuns<R extends GuessedRow>(rows: readonly R[]): (R & { run: number; under: number })[] {
  const runs = runsOf(rows, tallyHeight);
  const hanging = hangingSlips(rows, tallyHeight);
  return rows.map((row, index) => ({ ...row, run: runs[index] ?? 0, under: index === rows.length - 1 ? hanging : 0 }));
}
