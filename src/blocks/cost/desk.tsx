import { formatMoney } from '#domain/format.ts';
import { costCategories, costCategoryWords, type CostCategory } from '#contracts/words.ts';
import { useBench } from '../bench.ts';
import { BlockFrame, BlockSum, textButton } from '../block-frame.tsx';
import { deskBlock, type BlockDeskProps } from '../desk-block.ts';
import { FigureInput, LineFaults, LineInput, optionsOf, QuietSelect } from '../line-fields.tsx';
import { moneySum } from '../money-sum.ts';
import { TakeOutLine } from '../take-out-line.tsx';
import { OwnDaySelect } from '../own-day-select.tsx';
import { newId, useLines } from '../use-lines.ts';
import { blankCostLine, cost, type CostData, type CostLine } from './cost.ts';

const categories = optionsOf(costCategoryWords);
function categoryOf(value: string): CostCategory {
  return costCategories.find((one) => one === value) ?? 'other';
}

function CostDesk(props: BlockDeskProps<CostData>) {
  const { id, data } = props;
  const { context } = useBench();
  const lines = useLines<CostLine, CostData>(props, blankCostLine, 'label');
  return (
    <BlockFrame kind="cost" word="Cost" note="hire, carriage, a service, a tool: never on the shelf">
      <OwnDaySelect block={id} word="Cost" day={data.day} onDay={(day) => props.onChange((now) => ({ ...now, day }))} />
      <ol className="list-none! p-0!">
        {data.lines.map((line) => {
          const path = (field: string) => `${id}.${line.id}.${field}`;
          const of = line.label.trim() || 'this line';
          return (
            <li key={line.id} className="m-0! border-b border-rule py-1 wide:py-2">
              <div className="grid grid-cols-[minmax(0,1fr)_7.5rem] gap-x-3.5">
                <LineInput name={path('label')} label="What it was for" placeholder="What it was for" value={line.label} onValue={(label) => lines.change(line.id, { label })} onEnter={() => lines.goTo(line.id, 'money')} />
                <FigureInput name={path('money')} label={`What ${of} came to, in ${context.currency}`} placeholder="e.g. 12.50" value={line.money} onValue={(money) => lines.change(line.id, { money })} onEnter={() => lines.goOn(line.id)} />
              </div>
              <div className="flex items-center">
                <QuietSelect name={path('category')} label={`What kind of cost ${of} is`} value={line.category} options={categories} onValue={(category) => lines.change(line.id, { category: categoryOf(category) })} />
                <TakeOutLine of={of} onTakeOut={() => lines.takeOut(line.id, line.label.trim() || 'A line')} />
              </div>
              <LineFaults names={[path('label'), path('money')]} />
            </li>
          );
        })}
      </ol>
      <button type="button" onClick={() => lines.add()} className={`${textButton} mt-2.5 text-base`}>Add a line</button>
      <BlockSum label="Cost" value={formatMoney(moneySum(data.lines.map((line) => line.money), context.currency), context.currency)} />
    </BlockFrame>
  );
}

export const costDesk = deskBlock<CostData>({
  word: 'Cost', kind: () => 'cost', version: cost.version, Desk: CostDesk,
  blank: () => ({ day: null, lines: [blankCostLine(newId())] }),
  words: (data) => [data.day ?? '', data.lines.map((line) => `${line.label} ${line.money}`.trim()).join('; ')].filter(Boolean).join('; '),
});
