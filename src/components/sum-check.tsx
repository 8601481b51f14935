import { Chip } from './chip.tsx';

export interface SumPart {
  figure: string;
  words: string;
  tone?: 'used' | 'wasted' | 'left' | 'other';
}

export interface SumCheckProps {
  whole: SumPart;
  parts: SumPart[];
  /** Said by the ledger; a page never adds up for itself. */
  addsUp: boolean;
}

const tones = { used: 'text-scribe', wasted: 'text-lead', left: 'text-zinc-ink', other: 'text-ink' };

/** Spent = used + wasted + left on the shelf, with the check in view. */
export function SumCheck({ whole, parts, addsUp }: SumCheckProps) {
  return (
    <p className="num flex flex-wrap items-baseline gap-x-2.5 gap-y-1 text-lg">
      <Part {...whole} />
      {parts.map((part, index) => (
        <span key={part.words} className="flex flex-wrap items-baseline gap-x-2.5">
          <span>{index === 0 ? '=' : '+'}</span>
          <Part {...part} />
        </span>
      ))}
      <Chip kind={addsUp ? 'verd' : 'lead'}>{addsUp ? 'adds up' : 'does not add up'}</Chip>
    </p>
  );
}

function Part({ figure, words, tone = 'other' }: SumPart) {
  return (
    <span className="flex flex-wrap items-baseline gap-x-2.5">
      <b className={`lettering-figure text-[1.6875rem] ${tones[tone]}`}>{figure}</b>
      <span>{words}</span>
    </span>
  );
}
