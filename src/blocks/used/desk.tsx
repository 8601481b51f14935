import { exactFrom } from '#domain/quantity.ts';
import { formatMoneySoFar } from '#domain/format.ts';
import { typedAmount } from '../amount-line.ts';
import { useBench, useFigure } from '../bench.ts';
import { BlockFrame, BlockSum, textButton } from '../block-frame.tsx';
import { deskBlock, type BlockDeskProps } from '../desk-block.ts';
import type { Figures } from '../figures-store.ts';
import { shortTitle } from '../short-title.ts';
import { OwnDaySelect } from '../own-day-select.tsx';
import { useSameAsLastTime } from '../same-as-last-time.tsx';
import { newId, useLines } from '../use-lines.ts';
import { UsedLineDesk } from './line-desk.tsx';
import { blankUsedLine, used, type UsedData, type UsedLine } from './used.ts';

function UsedDesk(props: BlockDeskProps<UsedData>) {
  const { id, data } = props;
  const bench = useBench();
  const lines = useLines<UsedLine, UsedData>(props, blankUsedLine, 'material');
  const currency = bench.context.currency;
  const sumOf = (fate: UsedLine['fate']) => ({ lines: priced }: Figures) => data.lines.filter((line) => line.fate === fate).reduce((sum, line) => sum + (priced.get(`${id}:${line.id}`)?.value ?? 0), 0);
  const [usedSum, wastedSum] = [useFigure(sumOf('used')), useFigure(sumOf('wasted'))];
  const shortOf = (fate: UsedLine['fate']) => ({ lines: priced }: Figures) => data.lines.some((line) => line.fate === fate && exactFrom(priced.get(`${id}:${line.id}`)?.short ?? '0/1').gt(0));
  const [usedShort, wastedShort] = [useFigure(shortOf('used')), useFigure(shortOf('wasted'))];

  const last = useSameAsLastTime({
    linesOf: ({ used: before }) => before, nothing: 'Nothing was written up as used before this day.',
    fill: (before) => lines.fill(before.map((line) => ({ ...blankUsedLine(newId()), ...line })), (line) => line.name.trim() === '' && line.amount.trim() === ''),
  });

  return (
    <BlockFrame
      kind="used" word="Used" note={`off ${shortTitle(bench.buildTitle)}’s shelf`}
      end={last.button}
    >
      {last.answer}
      <OwnDaySelect block={id} word="Used" day={data.day} onDay={(day) => props.onChange((now) => ({ ...now, day }))} />
      <ol className="list-none! p-0!">
        {data.lines.map((line) => <UsedLineDesk key={line.id} block={id} line={line} lines={lines} />)}
      </ol>
      <button type="button" onClick={() => lines.add()} className={`${textButton} mt-2.5 text-base`}>Add a line</button>
      <BlockSum label="Used" value={formatMoneySoFar(usedSum, currency, usedShort)} />
      {wastedSum > 0 && <p className="mt-1.5 flex justify-between gap-4 text-small text-ink-soft"><span>Wasted beside it</span><span>{formatMoneySoFar(wastedSum, currency, wastedShort)}</span></p>}
      {(usedShort || wastedShort) && <p className="mt-1.5 text-small text-ink-soft">Some of it is not bought yet: its cost comes in with the next receipt.</p>}
    </BlockFrame>
  );
}

export const usedDesk = deskBlock<UsedData>({
  word: 'Used', kind: () => 'used', version: used.version, Desk: UsedDesk,
  blank: () => ({ day: null, lines: [blankUsedLine(newId())] }),
  words: (data) => [data.day ?? '', data.lines.map((line) => [line.name, typedAmount(line), line.fate === 'wasted' ? 'wasted' : ''].filter(Boolean).join(', ')).join('; ')].filter(Boolean).join('; '),
});
