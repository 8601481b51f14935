import type { InputOf } from '#contracts/endpoint.ts';
import type { changeBuild } from '#contracts/builds.ts';
import { textOf } from '#src/lib/form-action.ts';

type BuildInput = Omit<InputOf<typeof changeBuild>['body'], 'version'>;

const texts = ['title', 'lead', 'maker', 'model', 'frameNumber', 'engineNumber', 'hullNumber', 'serialNumber', 'registration', 'standsNote'] as const;
const picks = ['kind', 'stands', 'currency', 'measures', 'method', 'visibility', 'startedOn'] as const;
const ticks = ['yearAbout', 'numbersShown', 'costsShown'] as const;

/** A build's settings from the form as sent. What the form does not hold is left alone; the contract checks every value. */
export function buildInput(form: FormData): BuildInput {
  const input: Record<string, unknown> = {};
  for (const name of texts) if (form.has(name)) input[name] = textOf(form, name);
  for (const name of picks) if (form.has(name)) input[name] = textOf(form, name);
  if (form.has('year')) {
    const year = textOf(form, 'year');
    // what is no number goes as it was typed and is refused; as NaN it would arrive as nothing and clear the year
    input['year'] = year === '' ? null : /^\d+$/.test(year) ? Number(year) : year;
  }
  // an unticked box is not sent: the form says which boxes it holds
  for (const name of ticks) if (form.has(`${name}-asked`)) input[name] = form.has(name);
  return input;
}
