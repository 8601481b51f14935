import { useState } from 'react';
import type { StageView } from '#contracts/builds.ts';
import { Button } from '#src/components/button.tsx';
import { Checkbox } from '#src/components/checkbox.tsx';
import { Panel } from '#src/components/panel.tsx';
import { SelectField } from '#src/components/select-field.tsx';
import { TextField } from '#src/components/text-field.tsx';
import type { FormState } from '#src/lib/form-action.ts';
import { rowsNamed, stageText, type stageFields } from './stage-form.ts';

const units = [
  { value: 'piece', label: 'pieces' }, { value: 'm', label: 'm' }, { value: 'm2', label: 'm²' }, { value: 'ft', label: 'ft' }, { value: 'ft2', label: 'ft²' }, { value: 'h', label: 'hours' },
];
/** Blank rows at the end, so that stages can be added without scripts: more where there are none yet. */
const blanksFor = (stages: number) => (stages === 0 ? 3 : 1);

export function StageRows({ stages, currency, form }: { stages: readonly StageView[]; currency: string; form: FormState }) {
  const [added, setAdded] = useState(blanksFor(stages.length));
  const count = Math.max(stages.length + added, rowsNamed(form.value('count', '0')));
  return (
    <>
      <input type="hidden" name="count" value={count} />
      <div className="grid gap-4">
        {Array.from({ length: count }, (_, index) => <StageRow key={index} index={index} stage={stages[index]} currency={currency} form={form} />)}
      </div>
      <div className="mt-4"><Button kind="quiet" onClick={() => setAdded(added + 1)}>Add a stage</Button></div>
    </>
  );
}

function StageRow({ index, stage, currency, form }: { index: number; stage: StageView | undefined; currency: string; form: FormState }) {
  const named = (name: string) => `stages.${index}.${name}`;
  const field = (name: (typeof stageFields)[number]) => ({
    name: named(name), defaultValue: form.value(named(name), stageText(stage, name, currency)), error: form.error(named(name)),
  });
  return (
    <Panel>
      <fieldset className="grid grid-cols-2 items-start gap-4 wide:grid-cols-[minmax(0,2fr)_repeat(3,minmax(0,1fr))]">
        <legend className="sr-only">{stage ? stage.title : `New stage ${index + 1}`}</legend>
        <input type="hidden" name={named('id')} value={stage?.id ?? ''} />
        <div className="col-span-2 wide:col-span-1"><TextField {...field('title')} label={stage ? 'Stage' : 'New stage'} maxLength={60} /></div>
        <TextField {...field('plannedMoney')} label={`Planned, ${currency}`} inputMode="decimal" optional />
        <TextField {...field('plannedTime')} label="Hours" optional hint="30 h, or 7 h 30 min" />
        <TextField name={named('order')} label="Order" inputMode="numeric" defaultValue={form.value(named('order'), String(index + 1))} />
        <div className="col-span-2 wide:col-span-1"><TextField {...field('workKind')} label="Work to count" optional hint="steamed rib, panel coated" maxLength={60} /></div>
        <TextField {...field('plannedWork')} label="How many" inputMode="decimal" optional />
        <SelectField {...field('workUnit')} label="Counted in" options={units} />
        <div className="self-end">
          <Checkbox name={named('done')} label="Done" defaultChecked={form.ticked(named('done'), stage?.done ?? false)} />
          {stage && !stage.used && <Checkbox name={named('gone')} label="Take it out" defaultChecked={form.ticked(named('gone'), false)} />}
        </div>
      </fieldset>
    </Panel>
  );
}
