import type { BuildSettings } from '#contracts/builds.ts';
import { buildKinds, buildKindWords, measuresList, measuresWords, pricingMethods, pricingMethodWords, standsList, standsWords, visibilities, visibilityWords } from '#contracts/words.ts';
import { Checkbox } from '#src/components/checkbox.tsx';
import { Choice } from '#src/components/choice.tsx';
import { SelectField } from '#src/components/select-field.tsx';
import { TextArea } from '#src/components/text-area.tsx';
import { TextField } from '#src/components/text-field.tsx';
import type { FormState } from '#src/lib/form-action.ts';
import { currencyOptions } from './currency-options.ts';

type Known = Partial<BuildSettings>;
interface FieldsProps { form: FormState; build?: Known }

const optionsOf = <T extends string>(values: readonly T[], words: Readonly<Record<T, string>>) => values.map((value) => ({ value, label: words[value] }));
const kindWords = Object.fromEntries(buildKinds.map((kind) => [kind, buildKindWords[kind].one])) as Record<(typeof buildKinds)[number], string>;

/** What it is and what it is called. */
export function NamingFields({ form, build = {} }: FieldsProps) {
  return (
    <div className="grid gap-5">
      <TextField name="title" label="Name of the build" hint="As you speak of it: Sandpiper, a 1972 touring caravan" required maxLength={100} defaultValue={form.value('title', build.title)} error={form.error('title')} />
      <TextArea name="lead" label="In a few sentences" optional hint="How it came to you and where you mean to take it. It opens the build's page." maxLength={600} defaultValue={form.value('lead', build.lead)} error={form.error('lead')} />
      <div className="grid gap-5 wide:grid-cols-2">
        <SelectField name="kind" label="Kind" options={optionsOf(buildKinds, kindWords)} defaultValue={form.value('kind', build.kind ?? 'boat')} error={form.error('kind')} />
        <TextField name="startedOn" type="date" label="Started on" defaultValue={form.value('startedOn', build.startedOn)} error={form.error('startedOn')} />
      </div>
    </div>
  );
}

/** How amounts and money are written. */
export function ReckoningFields({ form, build = {} }: FieldsProps) {
  return (
    <div className="grid gap-5">
      <SelectField name="currency" label="Currency" options={currencyOptions} defaultValue={form.value('currency', build.currency ?? 'GBP')} error={form.error('currency')} hint={build.currencyFixed ? 'Money is already written down in this currency, so it stays.' : 'It stays once money is written down.'} />
      <Choice name="measures" label="A gallon, quart, pint or fluid ounce is" options={optionsOf(measuresList, measuresWords)} defaultValue={form.value('measures', build.measures ?? 'imperial')} error={form.error('measures')} />
      <Choice name="method" label="What leaves the shelf is priced" options={optionsOf(pricingMethods, pricingMethodWords)} defaultValue={form.value('method', build.method ?? 'fifo')} error={form.error('method')} hint="First in, first out: the oldest tin goes first, at what it cost. Moving average: every tin at the average of what is there." />
    </div>
  );
}

/** Who may read it and whether money is shown. */
export function ShowingFields({ form, build = {} }: FieldsProps) {
  return (
    <div className="grid gap-5">
      <Choice name="visibility" label="Who can read it" options={optionsOf(visibilities, visibilityWords)} defaultValue={form.value('visibility', build.visibility ?? 'public')} error={form.error('visibility')} />
      <input type="hidden" name="costsShown-asked" value="1" />
      <Checkbox name="costsShown" label="Show costs to everyone who can read it" hint="Left off, money is for you and your crew only: it is absent from pages, feeds and files. Amounts and hours stay." defaultChecked={form.ticked('costsShown', build.costsShown ?? true)} />
    </div>
  );
}

const numbers = [
  ['frameNumber', 'Frame number'], ['engineNumber', 'Engine number'], ['hullNumber', 'Hull number'], ['serialNumber', 'Serial number'], ['registration', 'Registration'],
] as const;

/** Maker, model, year, and the numbers that are private unless shown. */
export function IdentityFields({ form, build = {} }: FieldsProps) {
  return (
    <div className="grid gap-5">
      <div className="grid gap-5 wide:grid-cols-3">
        <TextField name="maker" label="Maker" optional maxLength={80} defaultValue={form.value('maker', build.maker)} error={form.error('maker')} />
        <TextField name="model" label="Model" optional maxLength={80} defaultValue={form.value('model', build.model)} error={form.error('model')} />
        <div>
          <TextField name="year" label="Year" optional inputMode="numeric" defaultValue={form.value('year', build.year == null ? '' : String(build.year))} error={form.error('year')} />
          <input type="hidden" name="yearAbout-asked" value="1" />
          <Checkbox name="yearAbout" label="About that year" defaultChecked={form.ticked('yearAbout', build.yearAbout ?? false)} />
        </div>
      </div>
      <div className="grid gap-5 wide:grid-cols-2">
        {numbers.map(([name, label]) => <TextField key={name} name={name} label={label} optional maxLength={60} autoComplete="off" defaultValue={form.value(name, build[name])} error={form.error(name)} />)}
      </div>
      <input type="hidden" name="numbersShown-asked" value="1" />
      <Checkbox name="numbersShown" label="Show these numbers to readers" hint="Left off, only you and your crew see them." defaultChecked={form.ticked('numbersShown', build.numbersShown ?? false)} />
    </div>
  );
}

/** Where it stands. */
export function StandsFields({ form, build = {} }: FieldsProps) {
  const words = { ...standsWords, 'laid-up': 'Laid up', waiting: 'Waiting for something' };
  return (
    <div className="grid gap-5 wide:grid-cols-2">
      <SelectField name="stands" label="Where it stands" options={optionsOf(standsList, words)} defaultValue={form.value('stands', build.stands ?? 'working')} error={form.error('stands')} />
      <TextField name="standsNote" label="Laid up until, or waiting for" optional maxLength={80} hint="Spring, or the chrome to come back" defaultValue={form.value('standsNote', build.standsNote)} error={form.error('standsNote')} />
    </div>
  );
}
