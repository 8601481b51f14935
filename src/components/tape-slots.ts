import { dayNumber, mondayOf, writtenDay, writtenSpan } from './tape-days.ts';

export interface TapeBar {
  /** Plain date, YYYY-MM-DD. */
  day: string;
  /** Last day, where the entry covers several. */
  to?: string | null;
  /** Minor units of money, or minutes. */
  amount: number;
  /** The entry's title. */
  label: string;
  href: string;
  /** Some of the money is still to come. */
  unsettled?: boolean;
  current?: boolean;
}

/** What one bar of the tape stands for: an entry, or several of one day or one week. */
export interface Slot {
  key: string;
  /** Day numbers, both included. */
  first: number;
  last: number;
  amount: number;
  label: string;
  when: string;
  href: string;
  unsettled: boolean;
  current: boolean;
}

/** Every entry by itself, in order of days. */
export function entrySlots(bars: readonly TapeBar[]): Slot[] {
  return bars.map(slotOf).toSorted((a, b) => a.first - b.first || a.last - b.last);
}

/** Entries of one day share a bar: two in one place could not be told apart or pressed. */
export function daySlots(bars: readonly TapeBar[]): Slot[] {
  return gather(entrySlots(bars), (slot, latest) => slot.first <= latest.last, (head) => head.when);
}

export function weekSlots(slots: readonly Slot[]): Slot[] {
  const inWeek = slots.map((slot) => ({ ...slot, first: mondayOf(slot.first), last: mondayOf(slot.first) + 6 }));
  return gather(inWeek, (slot, latest) => slot.first === latest.first, (head) => `week of ${writtenDay(head.first)}`);
}

function slotOf(bar: TapeBar): Slot {
  const first = dayNumber(bar.day);
  const last = Math.max(first, dayNumber(bar.to ?? bar.day));
  return {
    key: `${bar.day} ${bar.href}`, first, last, amount: bar.amount, label: bar.label,
    when: writtenSpan(first, last), href: bar.href, unsettled: bar.unsettled ?? false, current: bar.current ?? false,
  };
}

/** Joins neighbours that belong together; one alone keeps its own words. */
function gather(slots: readonly Slot[], joins: (slot: Slot, latest: Slot) => boolean, when: (head: Slot) => string): Slot[] {
  const groups: Slot[][] = [];
  for (const slot of slots) {
    const open = groups.at(-1);
    const latest = open?.at(-1);
    if (open && latest && joins(slot, latest)) open.push(slot);
    else groups.push([slot]);
  }
  return groups.flatMap((group) => joined(group, when));
}

function joined(group: readonly Slot[], when: (head: Slot) => string): Slot[] {
  const [head] = group;
  if (!head || group.length === 1) return [...group];
  const shown = group.find((slot) => slot.current) ?? head;
  return [{
    ...shown,
    first: head.first,
    last: Math.max(...group.map((slot) => slot.last)),
    amount: group.reduce((sum, slot) => sum + slot.amount, 0),
    unsettled: group.some((slot) => slot.unsettled),
    label: `${group.length} entries`,
    when: when(head),
  }];
}
