import { useSuspenseQuery } from '@tanstack/react-query';
import { Form, Link } from 'react-router-dom';
import type { MyBuilds } from '#contracts/builds.ts';
import { formatDay } from '#domain/format.ts';
import { Choice } from '#src/components/choice.tsx';
import { ErrorSummary } from '#src/components/error-summary.tsx';
import { Panel } from '#src/components/panel.tsx';
import { SelectField } from '#src/components/select-field.tsx';
import { SubmitButton } from '#src/components/submit-button.tsx';
import { TextField } from '#src/components/text-field.tsx';
import { useFormState } from '#src/lib/form-action.ts';
import { stagesQuery } from '#src/queries/builds.ts';
import { useToday } from './use-today.ts';

function dayBefore(day: string): string {
  const date = new Date(`${day}T12:00:00Z`);
  date.setUTCDate(date.getUTCDate() - 1);
  return date.toISOString().slice(0, 10);
}

export interface StartDayProps {
  build: MyBuilds['builds'][number];
  /** There are others to pick from. */
  others: boolean;
}

/** The day and the stage; then the desk opens. A plain form, so that it works without scripts too. */
export function StartDay({ build, others }: StartDayProps) {
  const { data: { stages } } = useSuspenseQuery(stagesQuery(build.slug));
  const form = useFormState();
  const today = useToday();
  const yesterday = dayBefore(today);
  return (
    <Form method="post" noValidate className="group max-w-[640px]">
      <ErrorSummary errors={form.errors} attempt={form.attempt ?? 0} />
      <Panel>
        <div className="grid gap-5">
          <p className="flex flex-wrap items-baseline justify-between gap-3">
            <b className="lettering-row">{build.title}</b>
            {others && <Link to="/write" className="text-small">Another build</Link>}
          </p>
          <input type="hidden" name="build" value={build.slug} />
          <Choice
            key={today} name="day" label="Day of work" defaultValue={form.value('day', today)} error={form.error('day')}
            options={[{ value: today, label: `Today, ${formatDay(today)}` }, { value: yesterday, label: `Yesterday, ${formatDay(yesterday)}` }, { value: 'other', label: 'Another day' }]}
          />
          {/* Shown by the style sheet, so that it is there without scripts too. */}
          <div className="hidden group-has-[input[value=other]:checked]:block">
            <TextField name="otherDay" label="Which day" type="date" max={today} defaultValue={form.value('otherDay', yesterday)} />
          </div>
          {stages.length > 0 && (
            <SelectField
              name="stage" label="Stage" defaultValue={form.value('stage', String(stages.find(({ done }) => !done)?.id ?? ''))}
              options={[{ value: '', label: 'No stage' }, ...stages.map(({ id, title, done }) => ({ value: String(id), label: done ? `${title}, done` : title }))]}
            />
          )}
          <div><SubmitButton kind="zinc" pending={form.pending} pendingWord="Opening the desk">Open the desk</SubmitButton></div>
        </div>
      </Panel>
    </Form>
  );
}
