import type { TallyView } from '#contracts/entry-view.ts';
import { formatMinutes, formatMoney, formatMoneySoFar } from '#domain/format.ts';

// How a day's tally is said, on the page and in feeds alike.

export interface TallyFact {
  readonly label: string;
  readonly value: string;
}

const peopleWords = ['', '', ', two people', ', three people', ', four people'];

/** What the day came to, in the large. */
export function tallyFigure(tally: TallyView): string {
  return tally.money ? formatMoney(tally.money.day, tally.currency) : formatMinutes(tally.minutes);
}

/** "this day: £88.34 used, £3.40 wasted, £12.00 of costs". */
export function tallySaid({ money, currency }: TallyView): string {
  if (!money) return 'hands on this day';
  const parts = [`${formatMoney(money.used, currency)} used`, ...(money.wasted > 0 ? [`${formatMoney(money.wasted, currency)} wasted`] : []), ...(money.costs > 0 ? [`${formatMoney(money.costs, currency)} of costs`] : [])];
  return `this day: ${parts.join(', ')}${money.unsettled ? '; some not bought yet' : ''}`;
}

/** Hours and work. */
export function dayFacts(tally: TallyView): TallyFact[] {
  return [
    ...(tally.minutes > 0 ? [{ label: `Hands on${peopleWords[tally.people] ?? `, ${tally.people} people`}`, value: formatMinutes(tally.minutes) }] : []),
    ...(tally.waiting > 0 ? [{ label: 'Waiting', value: formatMinutes(tally.waiting) }] : []),
    ...(tally.work ? [{ label: 'Work done', value: tally.work.words }] : []),
  ];
}

/** What one takes, and what was bought. Hours keep to one line. */
export function oneFacts(tally: TallyView): TallyFact[] {
  const { money, work, currency } = tally;
  const hours = tally.oneMinutes == null ? '' : formatMinutes(tally.oneMinutes).replaceAll(' ', '\u00a0');
  const one = [money?.one != null && money.one > 0 ? formatMoneySoFar(money.one, currency, money.oneUnsettled) : '', hours].filter(Boolean);
  return [
    ...(work && one.length > 0 ? [{ label: `${work.one} takes`, value: one.join(', ') }] : []),
    ...(money && money.bought > 0 ? [{ label: 'Bought', value: formatMoney(money.bought, currency) }] : []),
  ];
}

/** Where the build stands by now, which changes with every day signed off. */
export function buildFact({ money, currency }: TallyView): TallyFact[] {
  return money ? [{ label: 'Build so far', value: `${formatMoney(money.buildUsed, currency)} used${money.buildUnsettled ? ', some not bought yet' : ''}` }] : [];
}
