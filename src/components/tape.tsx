import { useEffect, useRef } from 'react';
import { SkipLink } from './skip-link.tsx';
import { layoutTape, type Strip, type TapeUnit } from './tape-layout.ts';
import { entrySlots, type TapeBar } from './tape-slots.ts';
import { type TapeSize, TapeStrip } from './tape-strip.tsx';
import { TapeTable } from './tape-table.tsx';

export type TapeScale = 'money' | 'hours';

export interface TapeProps {
  /** "Curlew, day by day". */
  title: string;
  scale: TapeScale;
  /** Plain dates the tape runs between. */
  from: string;
  to: string;
  bars: TapeBar[];
  /** Writes an amount out: `£91.74` or `7 h 30 min`; unsettled where some of the money is still to come. */
  show: (amount: number, unsettled?: boolean) => string;
  /** Chosen by the layout when left out: days while they can be told apart, then weeks. */
  unit?: TapeUnit;
  /** The same page with the other scale. */
  toggleHref?: string;
  /** Taller on a build's own page. */
  size?: TapeSize;
  /** Only where a page has more than one tape. */
  id?: string;
}

const scaleWords = {
  money: { said: 'Money used', heading: 'Used', other: 'by hours' },
  hours: { said: 'Hands on', heading: 'Hands on', other: 'by money' },
} as const;
/** More links than this before the words want a way past. */
const manyBars = 8;

/** A build's life as a measuring tape, with the same figures as a table under it. */
export function Tape({ title, scale, from, to, bars, show, unit, toggleHref, size = 'short', id = 'tape' }: TapeProps) {
  const layout = layoutTape({ from, to, bars, unit });
  const words = scaleWords[scale];
  return (
    <div className="relative">
      {bars.length > manyBars && <SkipLink to={`#${id}-after`}>Past the tape</SkipLink>}
      {layout.strips.map((strip) => (
        <TapeLength key={strip.year ?? 'all'} strip={strip} title={title} size={size} show={show} />
      ))}
      <div id={`${id}-after`} tabIndex={-1} className="mt-2 flex flex-wrap items-baseline gap-x-4 gap-y-1 text-note text-ink-soft">
        <p className="num mr-auto max-wide:basis-full">
          {words.said}, a bar a {layout.unit}
          {layout.tallest > 0 && <>. The tallest is {show(layout.tallest)}</>}
        </p>
        {toggleHref && (
          <a href={toggleHref} className="not-printed">
            {words.other}
          </a>
        )}
        <TapeTable title={title} amountWord={words.heading} entries={entrySlots(bars)} show={show} />
      </div>
    </div>
  );
}

interface TapeLengthProps {
  strip: Strip;
  title: string;
  size: TapeSize;
  show: (amount: number, unsettled?: boolean) => string;
}

/** One tape in its own sideways window, opened where the reader is. */
function TapeLength({ strip, title, size, show }: TapeLengthProps) {
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => {
    const region = box.current;
    if (region) region.scrollLeft = strip.mark - region.clientWidth / 2;
  }, [strip.mark]);
  const name = strip.year === null ? title : `${title}, ${strip.year}`;
  return (
    <>
      {strip.idle && <p className="num mt-4 text-note text-ink-soft">Nothing written up in {strip.idle.from === strip.idle.to ? strip.idle.from : `${strip.idle.from} to ${strip.idle.to}`}</p>}
      {strip.year !== null && <p className="lettering-name num mt-4 mb-1 text-control">{strip.year}</p>}
      {/* oxlint-disable-next-line jsx-a11y/no-noninteractive-tabindex -- what slides sideways must be reached and slid by keyboard */}
      <section ref={box} aria-label={name} tabIndex={0} className="tape">
        <TapeStrip strip={strip} name={name} size={size} show={show} />
      </section>
    </>
  );
}
