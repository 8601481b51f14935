import { formatDay } from '#domain/format.ts';
import { useBench } from './bench.ts';
import { LabelledInput, LineFaults, QuietSelect, type Option } from './line-fields.tsx';

interface OwnDaySelectProps {
  block: string;
  /** The kind of the block in words: Used, Time. */
  word: string;
  day: string | null;
  onDay: (day: string | null) => void;
}

// More days than this are no list to pick from.
const mostListed = 62;
const dayMs = 86_400_000;

/** The days from the first to the last; nothing where they are too many to list. */
function daysFrom(first: string, last: string): string[] | null {
  const [from, to] = [Date.parse(first), Date.parse(last)];
  const count = Math.round((to - from) / dayMs) + 1;
  if (!(count <= mostListed)) return null;
  return Array.from({ length: Math.max(0, count) }, (_, at) => new Date(from + at * dayMs).toISOString().slice(0, 10));
}

/** Which day of several a block stands on. Shown where there is a choice, or where a day was picked that is none of them any more. */
export function OwnDaySelect({ block, word, day, onDay }: OwnDaySelectProps) {
  const { context } = useBench();
  const { day: first, dayTo } = context;
  if (dayTo === null && day === null) return null;
  const name = `${block}.day`;
  const last = dayTo ?? first;
  const days = daysFrom(first, last);
  const pick = (value: string) => onDay(value === '' ? null : value);
  if (days === null) {
    return <div className="mt-2 max-w-48"><LabelledInput name={name} label={`Day of ${word}, if not the last`} type="date" min={first} max={last} value={day ?? ''} onValue={pick} /></div>;
  }
  const offered = day === null || days.includes(day) ? days : [day, ...days];
  const options: Option[] = [
    { value: '', label: dayTo === null ? 'On the day of the entry' : 'On the last day' },
    ...offered.map((one) => ({ value: one, label: formatDay(one) })),
  ];
  return (
    <div className="mt-1">
      <QuietSelect name={name} label={`Day of ${word}`} value={day ?? ''} options={options} onValue={pick} />
      <LineFaults names={[name]} />
    </div>
  );
}
