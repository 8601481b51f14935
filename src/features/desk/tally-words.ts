import { formatMinutes, formatMoney, formatMoneySoFar, plural } from '#domain/format.ts';
import { oneOfWork } from '#domain/work-words.ts';
import type { TallyFact } from '#src/components/running-tally.tsx';
import type { DeskReckoning } from './desk-ledger.ts';

export interface TallyWords {
  figure: string;
  /** Under the figure: "this day: £88.34 used, £3.40 wasted". */
  words: string;
  /** Beside it on a phone: "this day, one rib £5.20". */
  short: string;
  groups: TallyFact[][];
}

const numbers = ['', 'one person', 'two people', 'three people', 'four people', 'five people', 'six people'];

function timeFacts({ figures }: DeskReckoning): TallyFact[] {
  const hands = figures.minutes === 0 ? [] : [{ label: figures.people > 1 ? `Hands on, ${numbers[figures.people] ?? `${figures.people} people`}` : 'Hands on', value: formatMinutes(figures.minutes) }];
  return figures.waiting === 0 ? hands : [...hands, { label: 'Waiting', value: formatMinutes(figures.waiting) }];
}

function stageFacts({ stage }: DeskReckoning, currency: string): TallyFact[] {
  if (!stage) return [];
  const facts = [{ label: stage.planned === null ? `${stage.title} so far` : `${stage.title}, of ${formatMoney(stage.planned, currency)} planned`, value: formatMoney(stage.soFar, currency) }];
  return stage.finishAt === null || stage.soFar === 0 ? facts : [...facts, { label: `${stage.title} would finish at`, value: formatMoney(stage.finishAt, currency) }];
}

/** The day's tally in words, for the box at the side and the line at the foot. */
export function tallyWords(reckoning: DeskReckoning, currency: string): TallyWords {
  const { figures, one } = reckoning;
  const money = (minor: number) => formatMoney(minor, currency);
  const parts = [`${money(figures.used)} used`, figures.wasted > 0 ? `${money(figures.wasted)} wasted` : '', figures.costs > 0 ? `${money(figures.costs)} in costs` : ''].filter(Boolean);
  const name = one && oneOfWork(one);
  const takes = one && name ? [{ label: `One ${name} takes`, value: [formatMoneySoFar(one.money, currency, one.unsettled), one.minutes > 0 ? formatMinutes(one.minutes) : ''].filter(Boolean).join(', ') }] : [];
  const bought = figures.bought > 0 || figures.boughtUnread ? [{ label: 'Bought, to the door', value: figures.boughtUnread ? '—' : money(figures.bought) }] : [];
  const short = figures.linesShort > 0 ? [{ label: 'Not bought yet', value: [plural(figures.linesShort, 'line', 'lines'), figures.estimate === null ? '' : `about ${money(figures.estimate)}`].filter(Boolean).join(', ') }] : [];
  return {
    figure: money(figures.day),
    words: `this day: ${parts.join(', ')}${figures.linesShort > 0 ? '; some not bought yet' : ''}`,
    short: one && name ? `this day, one ${name} ${money(one.money)}` : 'this day',
    groups: [[...takes, ...stageFacts(reckoning, currency)], [...timeFacts(reckoning), ...bought, ...short]],
  };
}
