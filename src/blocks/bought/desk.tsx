import { formatMoney } from '#domain/format.ts';
import { isCurrency } from '#domain/currency.ts';
import { typedAmount } from '../amount-line.ts';
import { useBench } from '../bench.ts';
import { BlockFrame, BlockSum, textButton } from '../block-frame.tsx';
import { deskBlock, type BlockDeskProps } from '../desk-block.ts';
import { newId, useLines } from '../use-lines.ts';
import { blankBought, blankBoughtLine, bought, readBought, type BoughtData, type BoughtLine } from './bought.ts';
import { BoughtLineDesk } from './line-desk.tsx';
import { PaperCheck } from './paper-check.tsx';
import { ReceiptHead, ReceiptFoot } from './receipt-fields.tsx';

function BoughtDesk(props: BlockDeskProps<BoughtData>) {
  const { id, data, onChange } = props;
  const { context } = useBench();
  const lines = useLines<BoughtLine, BoughtData>(props, blankBoughtLine, 'material');
  const reading = readBought(data, context);
  const set = (part: Partial<BoughtData>) => onChange((now) => ({ ...now, ...part }));
  const mine = data.lines.reduce((sum, line, index) => sum + (line.goes === 'not-mine' ? 0 : reading.door.lines[index]?.door ?? 0), 0) + reading.door.notSorted;
  const summed = reading.unread.length === 0;
  return (
    <BlockFrame kind="bought" word="Bought" note="a receipt, each line at its cost to the door">
      <ReceiptHead block={id} data={data} set={set} />
      <ol className="mt-4! mb-0! list-none! border-t border-rule p-0!">
        {data.lines.map((line, index) => (
          <BoughtLineDesk key={line.id} block={id} line={line} lines={lines} currency={reading.currency} door={summed ? reading.door.lines[index]?.door ?? 0 : null} foreign={isCurrency(reading.currency) && reading.currency !== context.currency} />
        ))}
      </ol>
      <button type="button" onClick={() => lines.add()} className={`${textButton} mt-2.5 text-base`}>Add a line</button>
      <ReceiptFoot block={id} data={data} set={set} currency={reading.currency} />
      <PaperCheck reading={reading} into={context.currency} />
      <BlockSum label="To the door" value={summed ? formatMoney(mine, context.currency) : '—'} />
    </BlockFrame>
  );
}

export const boughtDesk = deskBlock<BoughtData>({
  word: 'Bought', kind: () => 'bought', version: bought.version, Desk: BoughtDesk,
  blank: () => ({ ...blankBought(), lines: [blankBoughtLine(newId())] }),
  words: (data) => [data.supplier, ...data.lines.map((line) => [line.name, typedAmount(line), line.money].filter(Boolean).join(', '))].filter(Boolean).join('; '),
});
