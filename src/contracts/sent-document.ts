import { z } from 'zod';
import { entryDocument } from '#src/blocks/entry-document.ts';

// A document is read by a schema that follows lists into lists, is drawn on every page and feed it stands in, and is kept
// twice. So it is measured as it comes in, step by step, before anything follows it down. Common practice, no source: a long
// day's write-up is some 15,000 letters.
const mostLetters = 100_000;
const mostBytes = 500_000;
const deepestList = 8;
/** What holds one value inside another in the deepest list there may be, and in a table in none, with room to spare. */
const deepest = 60;

interface Step { readonly value: unknown; readonly depth: number; readonly lists: number }

function isList(value: object): boolean {
  return 'type' in value && (value.type === 'bulletList' || value.type === 'orderedList');
}

function stepsInto({ value, depth, lists }: Step): Step[] {
  if (typeof value !== 'object' || value === null) return [];
  const within = lists + (isList(value) ? 1 : 0);
  return Object.values(value).map((inner: unknown) => ({ value: inner, depth: depth + 1, lists: within }));
}

function lettersOf(value: unknown): number {
  return typeof value === 'object' && value !== null && 'type' in value && value.type === 'text' && 'text' in value && typeof value.text === 'string' ? value.text.length : 0;
}

/** About what a value takes as JSON, without what it holds. */
function bytesOf(value: unknown): number {
  if (typeof value === 'string') return value.length + 3;
  return typeof value === 'object' && value !== null ? 2 + Object.keys(value).reduce((sum, key) => sum + (Array.isArray(value) ? 0 : key.length + 3), 0) : 6;
}

/** Why a document is more than an entry can hold, in words, or nothing. */
export function tooMuch(document: unknown): string | null {
  let letters = 0;
  let bytes = 0;
  const left: Step[] = [{ value: document, depth: 0, lists: 0 }];
  for (let step = left.pop(); step; step = left.pop()) {
    letters += lettersOf(step.value);
    bytes += bytesOf(step.value);
    const inner = stepsInto(step);
    if (step.lists > deepestList || step.depth > deepest) return 'Lists go eight deep at most: lift the innermost ones out.';
    if (letters > mostLetters) return 'An entry holds 100,000 letters at most: write the rest up as another day.';
    if (bytes > mostBytes) return 'An entry holds 500 kB of words and lines at most: write the rest up as another day.';
    for (const one of inner) left.push(one);
  }
  return null;
}

/** A document as the desk sends it. */
export const sentDocument = z.custom<z.input<typeof entryDocument>>().superRefine((document, context) => {
  const problem = tooMuch(document);
  if (problem !== null) context.addIssue({ code: 'custom', message: problem });
}).pipe(entryDocument);
