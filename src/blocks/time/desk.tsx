import { readMinutes } from '#domain/duration.ts';
import { formatMinutes } from '#domain/format.ts';
import { BlockFrame, BlockSum, textButton } from '../block-frame.tsx';
import { deskBlock, type BlockDeskProps } from '../desk-block.ts';
import { OwnDaySelect } from '../own-day-select.tsx';
import { useSameAsLastTime } from '../same-as-last-time.tsx';
import { newId, useLines } from '../use-lines.ts';
import { TimeLineDesk } from './line-desk.tsx';
import { blankTimeLine, time, type TimeData, type TimeLineData } from './time.ts';

function handsOn(data: TimeData): number {
  return data.lines.filter((line) => line.kind !== 'waiting').reduce((sum, line) => {
    const minutes = readMinutes(line.time);
    return minutes.ok ? sum + minutes.value : sum;
  }, 0);
}

function TimeDesk(props: BlockDeskProps<TimeData>) {
  const { id, data } = props;
  const lines = useLines<TimeLineData, TimeData>(props, blankTimeLine, 'person');
  const last = useSameAsLastTime({
    linesOf: ({ time: before }) => before, nothing: 'No time was written up before this day.',
    fill: (before) => lines.fill(before.map((line) => ({ ...blankTimeLine(newId()), ...line })), (line) => line.name.trim() === '' && line.time.trim() === ''),
  });
  return (
    <BlockFrame kind="time" word="Time" end={last.button}>
      {last.answer}
      <OwnDaySelect block={id} word="Time" day={data.day} onDay={(day) => props.onChange((now) => ({ ...now, day }))} />
      <ol className="list-none! p-0!">
        {data.lines.map((line) => <TimeLineDesk key={line.id} block={id} line={line} lines={lines} />)}
      </ol>
      <button type="button" onClick={() => lines.add()} className={`${textButton} mt-2.5 text-base`}>Add a line</button>
      <BlockSum label="Hands on" value={formatMinutes(handsOn(data))} />
    </BlockFrame>
  );
}

export const timeDesk = deskBlock<TimeData>({
  word: 'Time', kind: () => 'time', version: time.version, Desk: TimeDesk,
  blank: () => ({ day: null, lines: [blankTimeLine(newId())] }),
  words: (data) => [data.day ?? '', data.lines.map((line) => [line.kind === 'waiting' ? 'waiting' : line.name, line.time, line.what].filter(Boolean).join(', ')).join('; ')].filter(Boolean).join('; '),
});
