import { useState } from 'react';
import { readMinutes } from '#domain/duration.ts';
import { formatMinutes, plural } from '#domain/format.ts';
import { useBench } from '../bench.ts';
import { BlockFrame, BlockSum, textButton } from '../block-frame.tsx';
import { deskBlock, type BlockDeskProps } from '../desk-block.ts';
import { OwnDaySelect } from '../own-day-select.tsx';
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
  const bench = useBench();
  const lines = useLines<TimeLineData, TimeData>(props, blankTimeLine, 'person');
  const [asking, setAsking] = useState(false);
  const sameAsLastTime = async () => {
    setAsking(true);
    try {
      const last = await bench.lastTime();
      if (last.time.length === 0) bench.say('No time was written up before this day.');
      else {
        lines.fill(last.time.map((line) => ({ ...blankTimeLine(newId()), ...line })), (line) => line.name.trim() === '' && line.time.trim() === '');
        bench.say(`Filled in from “${last.title ?? 'the day before'}”: ${plural(last.time.length, 'line', 'lines')}.`);
      }
    } catch (cause) {
      bench.say(cause instanceof Error ? cause.message : 'The last time could not be fetched.');
    } finally {
      setAsking(false);
    }
  };
  return (
    <BlockFrame kind="time" word="Time" end={<button type="button" onClick={() => void sameAsLastTime()} aria-disabled={asking} className={textButton}>Same as last time</button>}>
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
