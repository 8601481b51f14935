import { memo } from 'react';
import { fieldId, controlClass } from '#src/components/field.tsx';
import { readMinutes } from '#domain/duration.ts';
import { formatMinutes } from '#domain/format.ts';
import { timeKinds, timeKindWords, type TimeKind } from '#contracts/words.ts';
import { useBench } from '../bench.ts';
import { ChoicesButton, FoldingLine, LineChoices } from '../line-choices.tsx';
import { FigureInput, LineFaults, LineInput, optionsOf, QuietSelect, tall } from '../line-fields.tsx';
import { TakeOutLine } from '../take-out-line.tsx';
import type { LineActions } from '../use-lines.ts';
import type { TimeLineData } from './time.ts';

const somebodyElse = ' else';
const kinds = optionsOf(timeKindWords);
function kindOf(value: string): TimeKind {
  return timeKinds.find((one) => one === value) ?? 'each';
}

interface TimeLineDeskProps {
  block: string;
  line: TimeLineData;
  lines: LineActions<TimeLineData>;
}

/** Who: somebody of the build, or just a name. */
function WhoSelect({ block, line, lines }: TimeLineDeskProps) {
  const { people } = useBench();
  const named = line.handle === null && line.name !== '';
  const choose = (value: string) => {
    const person = people.find((one) => one.handle === value);
    lines.change(line.id, person ? { handle: person.handle, name: person.name } : { handle: null, name: value === somebodyElse && named ? line.name : '' });
    if (value === somebodyElse) requestAnimationFrame(() => lines.goTo(line.id, 'name'));
  };
  return (
    <select
      id={fieldId(`${block}.${line.id}.person`)} aria-label="Who" value={line.handle ?? (named ? somebodyElse : '')} onChange={(event) => choose(event.target.value)}
      className={`${controlClass} ${tall} select-control pr-8`}
    >
      <option value="">Who</option>
      {people.map((person) => <option key={person.handle} value={person.handle}>{person.name}</option>)}
      <option value={somebodyElse}>Somebody else</option>
    </select>
  );
}

/** One person's time, or waiting for something to cure. */
export const TimeLineDesk = memo(function TimeLineDesk(props: TimeLineDeskProps) {
  const { block, line, lines } = props;
  const path = (field: string) => `${block}.${line.id}.${field}`;
  const minutes = readMinutes(line.time);
  const waiting = line.kind === 'waiting';
  const of = waiting ? 'waiting' : line.name.trim() || 'this line';
  const shown = minutes.ok && formatMinutes(minutes.value) !== line.time.trim() ? formatMinutes(minutes.value) : null;
  const change = (part: Partial<TimeLineData>) => lines.change(line.id, part);
  return (
    <FoldingLine name={path('line')}>
      <div className="grid grid-cols-[minmax(0,1fr)_8rem] gap-x-3.5 gap-y-1 wide:grid-cols-[minmax(0,12rem)_minmax(0,1fr)_8rem]">
        {waiting ? <p className="py-2 font-semibold">Waiting</p> : <WhoSelect {...props} />}
        {!waiting && line.handle === null && (
          <div className="max-wide:order-3 max-wide:col-span-2 wide:order-4"><LineInput name={path('name')} label="Name" placeholder="Or just a name" value={line.name} onValue={(name) => change({ name })} onEnter={() => lines.goTo(line.id, 'time')} /></div>
        )}
        <div className="max-wide:order-4">
          <LineInput name={path('what')} label={`What ${of} was on`} placeholder={waiting ? 'What for: epoxy curing' : 'On what'} value={line.what} onValue={(what) => change({ what })} onEnter={() => lines.goOn(line.id)} />
        </div>
        <FigureInput name={path('time')} label={`How long, ${of}`} placeholder="e.g. 7 h 30" inputMode="text" value={line.time} onValue={(time) => change({ time })} onEnter={() => lines.goOn(line.id)} />
        <div className="order-5 wide:hidden">
          <ChoicesButton of={of} words={timeKindWords[line.kind]} above={shown && <span className="text-ink-soft">{shown}</span>} />
        </div>
      </div>
      <LineChoices>
        <QuietSelect name={path('kind')} label={`What the time of ${of} counts for`} value={line.kind} options={kinds} onValue={(kind) => change({ kind: kindOf(kind) })} />
        {shown && <span className="text-small text-ink-soft max-wide:hidden">{shown}</span>}
        <TakeOutLine of={of} onTakeOut={() => lines.takeOut(line.id, line.name.trim() || 'A line')} />
      </LineChoices>
      <LineFaults names={[path('name'), path('time')]} />
    </FoldingLine>
  );
});
