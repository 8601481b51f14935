import { Link } from 'react-router-dom';
import { cellClass, headClass, numberClass } from './table-cells.ts';
import type { Slot } from './tape-slots.ts';

export interface TapeTableProps {
  title: string;
  /** Heads the figures: Used, Hands on. */
  amountWord: string;
  /** Every entry by itself, also where the tape goes by weeks. */
  entries: readonly Slot[];
  show: (amount: number, unsettled?: boolean) => string;
}

/** The tape's figures as a table, for whoever cannot see it or would rather read. */
export function TapeTable({ title, amountWord, entries, show }: TapeTableProps) {
  return (
    <details className="not-printed open:basis-full">
      <summary className="min-h-6 text-right text-scribe underline underline-offset-[0.18em]">as a table</summary>
      <div className="mt-2 border border-rule bg-card text-ink">
        <table className="num w-full border-collapse text-control">
          <caption className="sr-only">{title}</caption>
          <thead>
            <tr>
              <th scope="col" className={headClass}>Day of work</th>
              <th scope="col" className={headClass}>Entry</th>
              <th scope="col" className={`${headClass} ${numberClass}`}>{amountWord}</th>
            </tr>
          </thead>
          <tbody>
            {entries.map((slot) => (
              <tr key={slot.key}>
                <th scope="row" className={`${cellClass} text-left font-normal`}>{slot.when}</th>
                <td className={cellClass}>
                  <Link to={slot.href} aria-current={slot.current ? 'true' : undefined}>
                    {slot.label}
                  </Link>
                </td>
                <td className={`${cellClass} ${numberClass}`}>{show(slot.amount, slot.unsettled)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </details>
  );
}
