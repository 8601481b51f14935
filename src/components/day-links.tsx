import { Link } from 'react-router-dom';

export interface DayLink {
  to: string;
  title: string;
}

/** The day before and the day after, at the end of an entry. */
export function DayLinks({ before, after }: { before: DayLink | null; after: DayLink | null }) {
  return (
    <nav aria-label="Other days of this build" className="not-printed text-control">
      <Day word="Day before" day={before} none="This is the first day" />
      <Day word="Day after" day={after} none="Not written yet" />
    </nav>
  );
}

function Day({ word, day, none }: { word: string; day: DayLink | null; none: string }) {
  return (
    <p className="mb-4">
      <span className="block text-small text-ink-soft">{word}</span>
      {day ? <Link to={day.to}>{day.title}</Link> : none}
    </p>
  );
}
