import { z } from 'zod';
import Fraction from 'fraction.js';
import { exponentOf, isCurrency } from '#domain/currency.ts';
import { dayProblem } from '#domain/day.ts';
import { formatDay, formatMoney } from '#domain/format.ts';
import { readMoney } from '#domain/money.ts';
import { exactText } from '#domain/quantity.ts';
import { wordsForQuantity } from '#domain/quantity-words.ts';
import { costsToTheDoor, type DoorCosts } from '#domain/receipt.ts';
import { plainDay } from '#contracts/fields.ts';
import type { SlipView } from '#contracts/slip.ts';
import { bases, costCategories, lineGoesList, lineGoesWords } from '#contracts/words.ts';
import { amountFaults, amountLineShape, materialOf, readLine, typedAmount } from '../amount-line.ts';
import { pureBlock, type BlockContext, type BlockDerivation, type BlockFault, type ProjectionContext } from '../block.ts';

const money = z.string().max(40);
export const boughtLine = z.object({
  ...amountLineShape,
  /** What the line came to on the paper, in the receipt's currency. */
  money,
  goes: z.enum(lineGoesList),
  category: z.enum(costCategories),
  /** A day, or nothing: it came with the receipt. */
  arrivedOn: plainDay.nullable(),
  onOrder: z.boolean(),
});
export type BoughtLine = z.output<typeof boughtLine>;
/** A receipt told inside the entry. */
export const boughtData = z.object({
  supplier: z.string().max(120),
  /** Its own date; nothing means the day of work. */
  day: plainDay.nullable(),
  /** Nothing means the build's. */
  currency: z.string().max(3).nullable(),
  /** Build money for one of the receipt's. */
  rate: z.string().max(20),
  basis: z.enum(bases),
  discount: money, delivery: money, tax: money, paperTotal: money,
  lines: z.array(boughtLine).max(200),
});
export type BoughtData = z.output<typeof boughtData>;

export function blankBoughtLine(id: string): BoughtLine {
  return { id, material: null, name: '', amount: '', unit: '', exact: null, read: '', money: '', goes: 'shelf', category: 'consumable', arrivedOn: null, onOrder: false };
}
export function blankBought(): BoughtData {
  return { supplier: '', day: null, currency: null, rate: '', basis: 'paper', discount: '', delivery: '', tax: '', paperTotal: '', lines: [] };
}

const stocked = (line: BoughtLine) => line.goes === 'shelf' || line.goes === 'shed';

/** Reads the typed money of a receipt, gathering what is wrong, and where something stands that is no money. */
function moneyReader(currency: string, faults: BlockFault[], unread: string[]) {
  return (text: string, path: string, needed: boolean): number => {
    if (text.trim() === '') {
      if (needed) faults.push({ path, problem: 'Say what it came to, such as 12.50.' });
      return 0;
    }
    const reading = readMoney(text, currency);
    if (!reading.ok) {
      faults.push({ path, problem: reading.problem });
      unread.push(path);
    }
    return reading.ok ? reading.value.minor : 0;
  };
}

function rateOf(data: BoughtData, currency: string, into: string, faults: BlockFault[], unread: string[]): Fraction {
  if (currency === into) return new Fraction(1);
  if (!/^\d+(\.\d+)?$/.test(data.rate.trim()) || Number(data.rate) === 0) {
    faults.push({ path: 'rate', problem: `Say how much ${into} one ${currency} cost, such as 0.86.` });
    unread.push('rate');
    return new Fraction(1);
  }
  return new Fraction(data.rate.trim());
}

// A receipt goes up to this many minor units of the build's currency, so that thousands of them still add up exactly.
const mostConverted = 1e14;

/** Whether the whole receipt, converted, is still a sum of money; a slip of the finger in a rate is not. */
function fitsConverted(due: number, rate: Fraction, currency: string, into: string): boolean {
  return rate.mul(due).mul(new Fraction(10).pow(exponentOf(into) - exponentOf(currency))).lte(mostConverted);
}

interface BoughtReading { currency: string; rate: Fraction; discount: number; delivery: number; tax: number; paperTotal: number | null; own: number[]; door: DoorCosts; faults: BlockFault[]; /** Paths of figures that cannot be read: while there are any the sums are not the receipt's. */ unread: string[] }

/** A receipt's figures from what was typed, with every fault. The desk and the ledger both read it here. */
export function readBought(data: BoughtData, context: BlockContext): BoughtReading {
  const faults: BlockFault[] = [];
  const unread: string[] = [];
  const named = data.currency ?? context.currency;
  if (!isCurrency(named)) faults.push({ path: 'currency', problem: `“${named}” is not a currency on the ISO 4217 list.` });
  const currency = isCurrency(named) ? named : context.currency;
  const read = moneyReader(currency, faults, unread);
  const own = data.lines.map((line) => read(line.money, `${line.id}.money`, true));
  const [discount, delivery, tax] = [read(data.discount, 'discount', false), read(data.delivery, 'delivery', false), read(data.tax, 'tax', false)];
  const paperTotal = data.paperTotal.trim() === '' ? null : read(data.paperTotal, 'paperTotal', false);
  const lineSum = own.reduce((sum, value) => sum + value, 0);
  if (discount > lineSum && data.lines.length > 0) faults.push({ path: 'discount', problem: 'The discount is more than the lines come to.' });
  const rate = rateOf(data, currency, context.currency, faults, unread);
  const fits = currency === context.currency || fitsConverted(Math.max(lineSum + delivery + tax, paperTotal ?? 0), rate, currency, context.currency);
  if (!fits) faults.push({ path: 'rate', problem: `That comes to more ${context.currency} than a receipt can hold: look at the rate again.` });
  const priced = (minor: number) => (fits ? minor : 0);
  const door = costsToTheDoor({
    currency, into: context.currency, rate, lines: data.lines.map((line, index) => ({ key: line.id, value: priced(own[index] ?? 0) })),
    discount: priced(Math.min(discount, lineSum)), delivery: priced(delivery), tax: priced(tax), paperTotal: paperTotal === null ? null : priced(paperTotal),
  });
  return { currency, rate, discount: Math.min(discount, lineSum), delivery, tax, paperTotal, own, door, faults, unread };
}

function lineFaults(line: BoughtLine, context: BlockContext): BlockFault[] {
  const came = line.arrivedOn === null ? null : dayProblem(line.arrivedOn);
  if (stocked(line)) return [...amountFaults(line, context), ...(came === null ? [] : [{ path: `${line.id}.arrivedOn`, problem: came }])];
  return line.name.trim() === '' ? [{ path: `${line.id}.name`, problem: 'Say what was bought.' }] : [];
}

function deriveBought(data: BoughtData, context: BlockContext): BlockDerivation {
  const reading = readBought(data, context);
  const day = data.day ?? context.day;
  const faults = [...reading.faults, ...data.lines.flatMap((line) => lineFaults(line, context))];
  const dayFault = data.day === null ? null : dayProblem(data.day);
  if (dayFault !== null) faults.push({ path: 'day', problem: dayFault });
  if (data.lines.length === 0 && reading.paperTotal === null) faults.push({ path: '', problem: 'Add a line or the total on the paper, or take this block out.' });
  const difference = reading.door.paperDifference;
  return {
    faults,
    remarks: difference !== null && difference < 0 ? [`The lines at ${data.supplier.trim() || 'a supplier'} come to ${formatMoney(-difference, reading.currency)} more than the paper says.`] : [],
    receipt: {
      day, supplier: data.supplier.trim(), currency: reading.currency, rate: exactText(reading.rate), basis: data.basis,
      discount: reading.discount, delivery: reading.delivery, tax: reading.tax, paperTotal: reading.paperTotal,
      total: reading.door.total, notSorted: reading.door.notSorted,
      lines: data.lines.map((line, index) => ({
        line: line.id, label: materialOf(line, context)?.name ?? line.name.trim(), material: stocked(line) ? line.material : null,
        typed: typedAmount(line), amount: stocked(line) ? line.exact : null, own: reading.own[index] ?? 0, door: reading.door.lines[index]?.door ?? 0,
        goes: line.goes, category: line.category, arrivedOn: line.onOrder && stocked(line) ? null : line.arrivedOn ?? day,
      })),
    },
  };
}

function amountWords(line: BoughtLine, context: ProjectionContext): string {
  const material = materialOf(line, context);
  const amount = stocked(line) && material && line.exact ? wordsForQuantity(line.exact, material.dimension, { measures: context.measures, packs: material.packs, unit: material.unit }) : typedAmount(line);
  return [amount, line.goes === 'shelf' ? '' : lineGoesWords[line.goes].toLowerCase(), line.onOrder && stocked(line) ? 'on order' : ''].filter(Boolean).join(', ');
}

/** "delivery, tax and discount" */
function joined(words: readonly string[]): string {
  return words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`;
}

function sentence(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}

function boughtSlip(_id: string, data: BoughtData, context: ProjectionContext): SlipView {
  const reading = readBought(data, context);
  const shed = reading.door.lines.reduce((sum, line, index) => (data.lines[index]?.goes === 'shed' ? sum + line.door : sum), 0);
  const shares = [reading.delivery > 0 ? 'delivery' : '', reading.tax > 0 ? 'tax' : '', reading.discount > 0 ? 'discount' : ''].filter(Boolean);
  const notes = [
    shed > 0 ? `${formatMoney(shed, context.currency)} of it to the shed` : '',
    shares.length > 0 ? `each line with its share of ${joined(shares)}` : '',
    reading.currency === context.currency ? '' : `paid in ${reading.currency}`,
    data.basis === 'paper' ? '' : data.basis === 'memory' ? 'from memory' : 'a guess',
  ].filter(Boolean);
  const noteParts = [data.supplier.trim(), data.day && data.day !== context.day ? formatDay(data.day) : ''].filter(Boolean);
  const mine = reading.door.lines.reduce((sum, line, index) => sum + (data.lines[index]?.goes === 'not-mine' ? 0 : line.door), 0) + reading.door.notSorted;
  return {
    kind: 'bought', word: 'Bought',
    ...(noteParts.length > 0 ? { note: noteParts.join(', ') } : {}),
    lines: [
      ...data.lines.filter((line) => line.goes !== 'not-mine').map((line) => ({
        label: materialOf(line, context)?.name ?? line.name,
        small: amountWords(line, context),
        ...(context.costsShown ? { value: formatMoney(reading.door.lines.find((door) => door.key === line.id)?.door ?? 0, context.currency) } : {}),
      })),
      ...(context.costsShown && reading.door.notSorted > 0 ? [{ label: 'Not sorted yet', value: formatMoney(reading.door.notSorted, context.currency) }] : []),
    ],
    sum: context.costsShown ? { label: 'To the door', value: formatMoney(mine, context.currency) } : null,
    ...(context.costsShown && notes.length > 0 ? { footnote: sentence(notes.join(', ')) } : {}),
  };
}

export const bought = pureBlock({
  type: 'bought', version: 1, schema: boughtData, stepsUp: {},
  read: (data: BoughtData, kept, context) => ({ ...data, lines: data.lines.map((line) => stocked(line) ? readLine(line, kept?.lines.find((old) => old.id === line.id), context) : { ...line, exact: null, read: '' }) }),
  derive: deriveBought,
  slip: boughtSlip,
});
