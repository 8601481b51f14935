import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { DeskView } from '#contracts/entries.ts';
import { controlClass, Field, fieldId, FieldNotes } from '#src/components/field.tsx';
import { useBench, useFault } from '#src/blocks/bench.ts';
import { tall } from '#src/blocks/line-fields.tsx';
import type { EntryDocument } from '#src/blocks/pure.ts';
import { WorkDoneField } from './work-done-field.tsx';

export interface EntryHeadProps {
  view: DeskView;
  document: EntryDocument;
  onHead: (part: Partial<EntryDocument>) => void;
}

const compact = `${controlClass} ${tall}`;

/** The facts above the words: build, day, stage, work done, title, lead. */
export function EntryHead({ view, document, onHead }: EntryHeadProps) {
  const stageFault = useFault('stage');
  return (
    <>
      <p className="text-note"><Link to={`/builds/${view.build.slug}`} className={`lettering-name inline-flex items-center text-ink ${tall}`}>{view.build.title}</Link></p>
      <div className="mt-3 flex flex-wrap items-start gap-x-3 gap-y-3">
        <DayField document={document} onHead={onHead} />
        <Field name="stage" label="Stage" error={stageFault}>
          {(control) => (
            <select {...control} value={document.stage ?? ''} onChange={(event) => onHead({ stage: event.target.value === '' ? null : Number(event.target.value) })} className={`${compact} select-control w-auto! min-w-32 max-w-48 pr-8`}>
              <option value="">No stage</option>
              {view.stages.map((stage) => <option key={stage.id} value={stage.id}>{stage.title}</option>)}
            </select>
          )}
        </Field>
        <WorkDoneField work={document.work} kinds={view.workKinds} onWork={(work) => onHead({ work })} />
      </div>
      <WordsField
        name="title" label="Title" value={document.title} most={140} placeholder="What was done" next="lead" onValue={(title) => onHead({ title })}
        look="lettering-page mt-5 pt-[0.08em] pb-[0.2em] leading-[1.16]! text-ink placeholder:font-[500] placeholder:text-ink-faint"
      />
      <WordsField
        name="lead" label="Lead, one or two sentences for the lists" value={document.lead} most={600} placeholder="One or two sentences for the lists" next="content" onValue={(lead) => onHead({ lead })}
        look="mt-3 max-w-[56ch] font-read text-[1.125rem]/[1.5] text-ink-soft placeholder:text-ink-faint wide:text-lede"
      />
    </>
  );
}

function DayField({ document, onHead }: Omit<EntryHeadProps, 'view'>) {
  const bench = useBench();
  const faults = { day: useFault('day'), dayTo: useFault('dayTo') };
  const [spans, setSpans] = useState(document.dayTo !== null);
  const shown = spans || document.dayTo !== null;
  return (
    <div>
      <div className="flex items-start gap-1.5">
        <Field name="day" label={shown ? 'From' : 'Day of work'} error={faults.day}>
          {(control) => <input {...control} type="date" required min="1900-01-01" max="2100-12-31" value={document.day} onChange={(event) => event.target.value !== '' && onHead({ day: event.target.value })} className={`${compact} w-auto!`} />}
        </Field>
        {shown && (
          <Field name="dayTo" label="To" error={faults.dayTo}>
            {(control) => <input {...control} type="date" min={document.day} max="2100-12-31" value={document.dayTo ?? ''} onChange={(event) => onHead({ dayTo: event.target.value || null })} onBlur={() => bench.touch('dayTo')} className={`${compact} w-auto!`} />}
          </Field>
        )}
      </div>
      <button
        type="button" onClick={() => { if (shown) onHead({ dayTo: null }); setSpans(!shown); }}
        className={`min-h-6 text-small text-ink-soft underline decoration-rule-strong underline-offset-[0.2em] hover:text-ink ${tall}`}
      >
        {shown ? 'Just one day' : 'Over several days'}
      </button>
    </div>
  );
}

interface WordsFieldProps {
  name: 'title' | 'lead';
  label: string;
  value: string;
  most: number;
  placeholder: string;
  look: string;
  /** Where Enter goes on. */
  next: string;
  onValue: (value: string) => void;
}

/** Written where readers will read it, in the lettering they will see. Line breaks have no place here. */
function WordsField({ name, label, value, most, placeholder, look, next, onValue }: WordsFieldProps) {
  const bench = useBench();
  const error = useFault(name);
  const id = fieldId(name);
  return (
    <div>
      <textarea
        id={id} name={name} aria-label={label} aria-invalid={error ? true : undefined} aria-describedby={error ? `${id}-error` : undefined}
        rows={1} value={value} maxLength={most} placeholder={placeholder}
        onChange={(event) => onValue(event.target.value.replaceAll('\n', ' '))} onBlur={() => bench.touch(name)}
        onKeyDown={(event) => {
          if (event.key !== 'Enter' || event.nativeEvent.isComposing) return;
          event.preventDefault();
          document.getElementById(fieldId(next))?.focus();
        }}
        className={`block field-sizing-content w-full resize-none rounded-edge bg-transparent ${look} aria-[invalid]:border-l-[3px] aria-[invalid]:border-lead aria-[invalid]:pl-3`}
      />
      <FieldNotes id={id} error={error} />
    </div>
  );
}
