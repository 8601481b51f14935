import { memo, useState } from 'react';
import { exactFrom } from '#domain/quantity.ts';
import { formatMoney } from '#domain/format.ts';
import { countsWords } from '#contracts/words.ts';
import { AmountInput, useAmountWords, useShownBack } from '../amount-input.tsx';
import { useBench, useLineReckoning } from '../bench.ts';
import type { MaterialFacts } from '../block.ts';
import type { LineReckoning } from '../figures-store.ts';
import { ChoicesButton, FoldingLine, LineChoices } from '../line-choices.tsx';
import { LineFaults, optionsOf, QuietSelect } from '../line-fields.tsx';
import { MaterialPicker } from '../material-picker.tsx';
import { NewMaterial } from '../new-material.tsx';
import { TakeOutLine } from '../take-out-line.tsx';
import { unitWordOf } from '../unit-choice.ts';
import type { LineActions } from '../use-lines.ts';
import { notBoughtYet, type UsedLine } from './used.ts';

const fates = [{ value: 'used', label: 'Used' }, { value: 'wasted', label: 'Wasted' }];
const places = [{ value: 'shelf', label: 'Off the shelf' }, { value: 'shed', label: 'From the shed' }];

/** What is left after a line, or by how much it falls short. */
function useLeft(line: UsedLine, reckoning: LineReckoning | undefined): { words: string; short: boolean } {
  const inWords = useAmountWords(line);
  if (!reckoning || reckoning.left === null) return { words: '', short: false };
  const short = exactFrom(reckoning.short).gt(0);
  return short ? { words: `${inWords(reckoning.short)} short`, short } : { words: `${inWords(reckoning.left)} left`, short };
}

// As long as there is room for beside an amount on a phone.
const shortCounts: Readonly<Record<UsedLine['counts'], string>> = { each: 'for each', whole: 'whole job', opened: 'not counted' };

/** What is chosen for a line, in a few words; that it comes off the shelf the block says already. */
function chosen({ fate, counts, from }: UsedLine): string {
  return [fate === 'wasted' ? 'Wasted' : 'Used', shortCounts[counts], from === 'shed' ? 'from the shed' : ''].filter(Boolean).join(', ');
}

interface UsedLineDeskProps {
  block: string;
  line: UsedLine;
  lines: LineActions<UsedLine>;
}

/** One line: the material, how much, what is left after it, what it cost; below it what mostly stays as it is. */
export const UsedLineDesk = memo(function UsedLineDesk({ block, line, lines }: UsedLineDeskProps) {
  const bench = useBench();
  const [newName, setNewName] = useState<string | null>(null);
  const shownBack = useShownBack(line);
  const reckoning = useLineReckoning(block, line.id);
  const left = useLeft(line, reckoning);
  const path = (field: string) => `${block}.${line.id}.${field}`;
  const value = reckoning?.value;
  const change = (part: Partial<UsedLine>) => lines.change(line.id, part);
  const pick = (material: MaterialFacts) => {
    const same = line.material === material.id;
    change({ material: material.id, name: material.name, ...(same && line.unit ? {} : { unit: unitWordOf(material) }) });
    setNewName(null);
    lines.goTo(line.id, 'amount');
  };
  const of = line.name.trim() || 'this line';
  return (
    <FoldingLine name={path('line')}>
      <div className={`grid grid-cols-[auto_minmax(0,1fr)_auto] items-center gap-x-2 ${line.material === null ? 'gap-y-1' : ''} wide:gap-x-3.5 [grid-template-areas:'name_name_money'_'amount_left_left'] wide:grid-cols-[minmax(0,1fr)_auto_7rem_5rem] wide:[grid-template-areas:'name_amount_left_money']`}>
        <div className="[grid-area:name]">
          <MaterialPicker
            name={path('material')} value={line.name} picked={line.material !== null} onPick={pick} onNew={setNewName}
            onType={(name) => change({ name, material: null })}
          />
        </div>
        <div className="[grid-area:amount]"><AmountInput block={block} line={line} onLine={change} onEnter={() => lines.goOn(line.id)} /></div>
        <div className="min-w-0 [grid-area:left]">
          <ChoicesButton of={of} words={chosen(line)} strong={line.fate === 'wasted'} above={left.words && <span className={left.short ? 'font-semibold text-lead' : 'text-ink-soft'}>{left.words}</span>} />
        </div>
        <p className="text-right [grid-area:money]">{value === undefined || (value === 0 && left.short) ? '' : formatMoney(value, bench.context.currency)}</p>
        {left.short && <p className="col-span-full text-right text-small text-ink-soft">{notBoughtYet(reckoning?.estimate ?? null, bench.context.currency)}</p>}
      </div>
      {newName !== null && <NewMaterial key={newName} at={path('material')} name={newName} onAdded={pick} onLeave={() => setNewName(null)} />}
      {shownBack && <p className="text-small text-ink-soft">{shownBack}</p>}
      <LineChoices>
        <QuietSelect name={path('fate')} label={`Used or wasted: ${of}`} value={line.fate} options={fates} strong={line.fate === 'wasted'} onValue={(fate) => change({ fate: fate === 'wasted' ? 'wasted' : 'used' })} />
        <QuietSelect name={path('counts')} label={`What ${of} counts for`} value={line.counts} options={optionsOf(countsWords)} onValue={(counts) => change({ counts: counts === 'whole' || counts === 'opened' ? counts : 'each' })} />
        <QuietSelect name={path('from')} label={`Where ${of} came from`} value={line.from} options={places} onValue={(from) => change({ from: from === 'shed' ? 'shed' : 'shelf' })} />
        <TakeOutLine of={of} onTakeOut={() => lines.takeOut(line.id, line.name.trim() || 'A line')} />
      </LineChoices>
      <LineFaults names={[path('material'), path('amount')]} />
    </FoldingLine>
  );
});
