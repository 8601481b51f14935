import { memo, useState } from 'react';
import { formatMoney } from '#domain/format.ts';
import { readMoney } from '#domain/money.ts';
import { costCategories, costCategoryWords, lineGoesList, lineGoesWords } from '#contracts/words.ts';
import { AmountInput, useAmountWords, useShownBack } from '../amount-input.tsx';
import { useBench, useLineReckoning } from '../bench.ts';
import type { MaterialFacts } from '../block.ts';
import { FigureInput, LineFaults, LineInput, optionsOf, QuietSelect, tall } from '../line-fields.tsx';
import { MaterialPicker } from '../material-picker.tsx';
import { NewMaterial } from '../new-material.tsx';
import { TakeOutLine } from '../take-out-line.tsx';
import { unitWordOf } from '../unit-choice.ts';
import type { LineActions } from '../use-lines.ts';
import type { BoughtLine } from './bought.ts';

interface BoughtLineDeskProps {
  block: string;
  line: BoughtLine;
  lines: LineActions<BoughtLine>;
  /** The receipt's. */
  currency: string;
  /** Minor units of the build's currency; nothing while the receipt's sums cannot be told. */
  door: number | null;
  foreign: boolean;
}

/** On a shelf a line has a material and an amount; else words will do. */
function What({ block, line, lines }: Pick<BoughtLineDeskProps, 'block' | 'line' | 'lines'>) {
  const [newName, setNewName] = useState<string | null>(null);
  const path = (field: string) => `${block}.${line.id}.${field}`;
  const pick = (material: MaterialFacts) => {
    // A receipt is written in packs: two tins, one box.
    const unit = line.material === material.id && line.unit ? line.unit : material.packs[0]?.name ?? unitWordOf(material);
    lines.change(line.id, { material: material.id, name: material.name, unit });
    setNewName(null);
    lines.goTo(line.id, 'amount');
  };
  if (line.goes !== 'shelf' && line.goes !== 'shed') {
    return <LineInput name={path('name')} label="What was bought" placeholder="What was bought" value={line.name} onValue={(name) => lines.change(line.id, { name, material: null })} onEnter={() => lines.goTo(line.id, 'money')} />;
  }
  return (
    <>
      <MaterialPicker name={path('material')} value={line.name} picked={line.material !== null} onPick={pick} onNew={setNewName} onType={(name) => lines.change(line.id, { name, material: null })} />
      {newName !== null && <NewMaterial key={newName} at={path('material')} name={newName} onAdded={pick} onLeave={() => setNewName(null)} />}
    </>
  );
}

const arrivals = [{ value: 'with', label: 'Came with it' }, { value: 'day', label: 'Came another day' }, { value: 'order', label: 'On order' }];

/** Where it went, when it came. */
function Where({ block, line, lines }: Pick<BoughtLineDeskProps, 'block' | 'line' | 'lines'>) {
  const { context } = useBench();
  const path = (field: string) => `${block}.${line.id}.${field}`;
  const of = line.name.trim() || 'this line';
  const stocked = line.goes === 'shelf' || line.goes === 'shed';
  const came = (value: string) => lines.change(line.id, { onOrder: value === 'order', arrivedOn: value === 'day' ? line.arrivedOn ?? context.day : null });
  return (
    <>
      <QuietSelect name={path('goes')} label={`Where ${of} goes`} value={line.goes} options={optionsOf(lineGoesWords)} onValue={(value) => lines.change(line.id, { goes: lineGoesList.find((one) => one === value) ?? 'shelf' })} />
      {line.goes === 'straight' && (
        <QuietSelect name={path('category')} label={`What kind of cost ${of} is`} value={line.category} options={optionsOf(costCategoryWords)} onValue={(value) => lines.change(line.id, { category: costCategories.find((one) => one === value) ?? 'other' })} />
      )}
      {stocked && <QuietSelect name={path('came')} label={`When ${of} came`} value={line.onOrder ? 'order' : line.arrivedOn === null ? 'with' : 'day'} options={arrivals} onValue={came} />}
      {stocked && !line.onOrder && line.arrivedOn !== null && (
        <input
          type="date" aria-label={`Day ${of} came`} value={line.arrivedOn} onChange={(event) => { if (event.target.value !== '') lines.change(line.id, { arrivedOn: event.target.value }); }}
          className={`min-h-7 border-b border-dashed border-rule-strong bg-transparent text-small ${tall}`}
        />
      )}
    </>
  );
}

/** One line of a receipt: what, how much, what it says on the paper, and what it came to at the door. */
export const BoughtLineDesk = memo(function BoughtLineDesk({ block, line, lines, currency, door, foreign }: BoughtLineDeskProps) {
  const { context } = useBench();
  const reckoning = useLineReckoning(block, line.id);
  const shownBack = useShownBack(line);
  const inWords = useAmountWords(line);
  const path = (field: string) => `${block}.${line.id}.${field}`;
  const of = line.name.trim() || 'this line';
  const stocked = line.goes === 'shelf' || line.goes === 'shed';
  const left = reckoning?.left;
  const own = readMoney(line.money, currency);
  const atDoor = door !== null && own.ok && (foreign || own.value.minor !== door) ? `${formatMoney(door, context.currency)} to the door` : '';
  const after = [shownBack, stocked && left ? `then ${inWords(left)} there` : '', atDoor].filter(Boolean);
  return (
    <li className="m-0! border-b border-rule py-2.5">
      <div className={`grid grid-cols-[minmax(0,1fr)_7rem] items-start gap-x-3.5 gap-y-1.5 ${stocked ? 'wide:grid-cols-[minmax(0,1fr)_auto_7rem]' : ''}`}>
        <div className={stocked ? 'max-wide:col-span-2' : ''}><What block={block} line={line} lines={lines} /></div>
        {stocked && <AmountInput block={block} line={line} onLine={(part) => lines.change(line.id, part)} onEnter={() => lines.goTo(line.id, 'money')} />}
        <FigureInput name={path('money')} label={`What ${of} came to on the paper, in ${currency}`} placeholder="e.g. 12.50" value={line.money} onValue={(money) => lines.change(line.id, { money })} onEnter={() => lines.goOn(line.id)} />
      </div>
      <div className="mt-1 flex flex-wrap items-center gap-x-3.5 gap-y-1">
        <Where block={block} line={line} lines={lines} />
        <span className="text-small text-ink-soft">{after.join(', ')}</span>
        <TakeOutLine of={of} onTakeOut={() => lines.takeOut(line.id, line.name.trim() || 'A line')} />
      </div>
      <LineFaults names={[path('material'), path('name'), path('amount'), path('money')]} />
    </li>
  );
});
