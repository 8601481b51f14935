import type { TapeView } from '#contracts/tape.ts';
import { formatMinutes, formatMoneySoFar } from '#domain/format.ts';
import { Tape } from '#src/components/tape.tsx';

export interface BuildTapeProps {
  title: string;
  tape: TapeView;
  currency: string;
  /** From the address: `?tape=hours`. Without money there are hours only. */
  hours: boolean;
  /** The same page with the other scale. */
  otherHref: string;
  /** Number of the entry one is reading, drawn in red lead. */
  current?: number;
  size?: 'short' | 'tall';
}

/** A build's tape by money, or by hours where costs are hidden or hours are asked for. */
export function BuildTape({ title, tape, currency, hours, otherHref, current, size }: BuildTapeProps) {
  const withMoney = tape.days.some((day) => day.money !== undefined);
  const scale = hours || !withMoney ? 'hours' : 'money';
  return (
    <Tape
      title={`${title}, day by day`}
      scale={scale}
      from={tape.from}
      to={tape.to}
      bars={tape.days.map((day) => ({ day: day.day, amount: scale === 'hours' ? day.minutes : day.money ?? 0, label: day.title, href: day.href, unsettled: scale === 'money' && day.unsettled === true, current: day.number === current }))}
      show={(amount, unsettled) => (scale === 'hours' ? formatMinutes(amount) : formatMoneySoFar(amount, currency, unsettled))}
      {...(withMoney ? { toggleHref: otherHref } : {})}
      {...(size ? { size } : {})}
    />
  );
}
