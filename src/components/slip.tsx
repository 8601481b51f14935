export type SlipKind = 'used' | 'bought' | 'cost' | 'time' | 'mix' | 'worked' | 'wrong' | 'measure';

export interface SlipLine {
  label: string;
  /** Amount, pack, person: under the label. */
  small?: string;
  /** Money or time, at the right. */
  value?: string;
}

export interface SlipSum {
  label: string;
  value: string;
}

/** A finding in words: "What was tried" and what it was. */
export interface SlipWords {
  lead?: string;
  words: string;
}

/** What a block says to a reader; `SlipTable` says the same without the look. */
export interface SlipContent {
  kind: SlipKind;
  /** The kind in words: Used, Bought, Went wrong … */
  word: string;
  note?: string;
  lines: readonly SlipLine[];
  text?: readonly SlipWords[];
  sum?: SlipSum | null;
  footnote?: string;
}

export function Slip({ kind, word, note, lines, text, sum, footnote }: SlipContent) {
  return (
    <section data-kind={kind} aria-label={note ? `${word} ${note}` : word} className="slip num text-small">
      <p className="mb-[7px] flex flex-wrap items-baseline gap-x-2 pr-4">
        <b className="font-head font-[740] text-[var(--kind-text)] font-stretch-[110%]">{word}</b>
        {note && <span className="text-note text-ink-faint">{note}</span>}
      </p>
      {text?.map((part) => (
        <p key={part.words} className="mb-1.5 font-read text-[1.0625rem]/[1.45]">
          {part.lead && <b className="font-ui text-note font-semibold text-ink-soft">{part.lead} </b>}
          {part.words}
        </p>
      ))}
      {lines.length > 0 && (
        <dl className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-3 gap-y-[5px]">
          {lines.map((line, index) => (
            // Two lines may read alike; their place on the slip tells them apart.
            <SlipRow key={index} {...line} />
          ))}
        </dl>
      )}
      {sum && (
        <p className="mt-[9px] flex justify-between gap-3 border-t border-rule-strong pt-[7px] font-[650]">
          <span>{sum.label}</span>
          <span className="text-right">{sum.value}</span>
        </p>
      )}
      {footnote && <p className="mt-1.5 text-note text-ink-faint">{footnote}</p>}
    </section>
  );
}

function SlipRow({ label, small, value }: SlipLine) {
  return (
    <div className="contents">
      <dt className="min-w-0">
        {label}
        {small && <small className="block text-[0.78125rem] text-ink-faint">{small}</small>}
      </dt>
      <dd className="text-right whitespace-nowrap">{value}</dd>
    </div>
  );
}
