import { z } from 'zod';
import { readMinutes } from '#domain/duration.ts';
import { formatMinutes } from '#domain/format.ts';
import type { SlipView } from '#contracts/slip.ts';
import { timeKinds } from '#contracts/words.ts';
import { ownDay, ownDayFaults, ownDayWords, standsOn } from '../own-day.ts';
import { pureBlock, type BlockContext, type BlockDerivation, type ProjectionContext } from '../block.ts';
import { nodeId } from '../prose.ts';

export const timeLine = z.object({
  id: nodeId,
  /** Handle of the owner or of somebody in the crew; nothing for just a name. */
  handle: z.string().max(40).nullable(),
  name: z.string().max(80),
  /** As typed: "7 h 30 min". */
  time: z.string().max(40),
  what: z.string().max(160),
  kind: z.enum(timeKinds),
});
export type TimeLineData = z.output<typeof timeLine>;
/** Who worked how long on what; waiting (curing) is kept apart. */
export const timeData = z.object({ day: ownDay, lines: z.array(timeLine).max(100) });
export type TimeData = z.output<typeof timeData>;

export function blankTimeLine(id: string): TimeLineData {
  return { id, handle: null, name: '', time: '', what: '', kind: 'each' };
}

function deriveTime(data: TimeData, context: BlockContext): BlockDerivation {
  if (data.lines.length === 0) return { faults: [{ path: '', problem: 'Add a line, or take this block out.' }] };
  const read = data.lines.map((line) => ({ line, minutes: readMinutes(line.time) }));
  return {
    faults: [...ownDayFaults(data.day, context), ...read.flatMap(({ line, minutes }) => [
      ...(line.name.trim() === '' && line.kind !== 'waiting' ? [{ path: `${line.id}.name`, problem: 'Say who.' }] : []),
      ...(minutes.ok ? [] : [{ path: `${line.id}.time`, problem: minutes.problem }]),
    ])],
    times: read.flatMap(({ line, minutes }) => minutes.ok ? [{
      line: line.id, day: standsOn(data.day, context), handle: line.handle, name: line.name.trim(), minutes: minutes.value, what: line.what.trim(), kind: line.kind,
    }] : []),
  };
}

function timeSlip(_id: string, data: TimeData, context: ProjectionContext): SlipView {
  const times = deriveTime(data, context).times ?? [];
  const handsOn = times.filter((time) => time.kind !== 'waiting').reduce((sum, time) => sum + time.minutes, 0);
  const note = ownDayWords(data.day, context);
  return {
    kind: 'time', word: 'Time',
    ...(note ? { note } : {}),
    lines: data.lines.map((line) => {
      const minutes = times.find((time) => time.line === line.id)?.minutes;
      const named = (line.handle && context.names.get(line.handle)) || line.name;
      const small = [line.what.trim(), line.kind === 'setup' ? 'setting up' : ''].filter(Boolean).join(', ');
      return {
        label: line.kind === 'waiting' ? 'Waiting' : named,
        ...(small ? { small } : {}),
        value: minutes === undefined ? line.time : formatMinutes(minutes),
      };
    }),
    sum: handsOn > 0 ? { label: 'Hands on', value: formatMinutes(handsOn) } : null,
  };
}

export const time = pureBlock({ type: 'time', version: 1, schema: timeData, stepsUp: {}, derive: deriveTime, slip: timeSlip });
