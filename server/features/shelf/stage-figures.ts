import Fraction from 'fraction.js';
import { exactFrom, exactText } from '#domain/quantity.ts';
import type { Build } from '#server/entities/index.ts';
import type { Em } from '#server/http/context.ts';
import { summed, usedSum, wastedSum } from './sums.ts';

/** Figures of one stage, from published entries and from costs that stand in it. Minor units of the build's currency. */
export interface StageFigures {
  /** With the costs, which count as used on their day. */
  readonly used: number;
  readonly wasted: number;
  /** used + wasted of lines that count for each */
  readonly usedForEach: number;
  /** Some of what was used or wasted is not bought yet. */
  readonly unsettled: boolean;
  /** Hands on. */
  readonly minutes: number;
  /** Published entries. */
  readonly days: number;
  /** Exact `n/d` of the stage's own kind of work, in its unit; nothing where the stage measures none. */
  readonly workDone: string | null;
}

const nothing: StageFigures = { used: 0, wasted: 0, usedForEach: 0, unsettled: false, minutes: 0, days: 0, workDone: null };

interface StageSums { stage: number | null; used: number; wasted: number; usedForEach: number; unsettled: number; costs: number; minutes: number; days: number }

function queriesOf(): string[] {
  const others = 'build_id = ? and ifnull(entry_id, 0) <> ?';
  return [
    `select stage_id as stage, ${usedSum} as used, ${wastedSum} as wasted, ${summed("counts = 'each'", 'value')} as usedForEach, max(short <> '0/1') as unsettled from movement where ${others} and kind in ('used', 'wasted', 'counted') group by stage_id`,
    `select stage_id as stage, sum(money) as costs from cost where ${others} group by stage_id`,
    `select stage_id as stage, ${summed("kind <> 'waiting'", 'minutes')} as minutes from time_line where ${others} group by stage_id`,
    `select stage_id as stage, count(*) as days from entry where build_id = ? and id <> ? and published is not null group by stage_id`,
  ];
}

// Quantities are added here, exactly: SQL would turn them into floats.
async function workDone(em: Em, build: Pick<Build, 'id'>, without: number): Promise<Map<number, string>> {
  const rows = await em.execute<{ stage: number; amount: string | null }[]>(
    `select s.id as stage, e.work_amount as amount from stage s left join entry e
       on e.stage_id = s.id and e.published is not null and e.id <> ? and e.work_unit = s.work_unit and (s.work_kind_id is null or e.work_kind_id = s.work_kind_id)
     where s.build_id = ? and s.work_unit is not null`, [without, build.id],
  );
  const sums = new Map<number, Fraction>();
  for (const { stage, amount } of rows) {
    const sum = sums.get(stage) ?? new Fraction(0);
    sums.set(stage, amount === null ? sum : sum.add(exactFrom(amount)));
  }
  return new Map([...sums].map(([stage, sum]) => [stage, exactText(sum)]));
}

/**
 * Figures of every stage anything was done in, by the stage's id; `null` is what stands outside any stage.
 * @param options.without an entry to leave out, as its desk does
 */
export async function figuresOfStages(em: Em, build: Pick<Build, 'id'>, options: { without?: number } = {}): Promise<Map<number | null, StageFigures>> {
  const without = options.without ?? 0;
  const figures = new Map<number | null, StageFigures>();
  for (const query of queriesOf()) {
    for (const { stage = null, costs = 0, unsettled = 0, ...sums } of await em.execute<Partial<StageSums>[]>(query, [build.id, without])) {
      const before = figures.get(stage) ?? nothing;
      figures.set(stage, { ...before, ...sums, used: (sums.used ?? before.used) + costs, unsettled: before.unsettled || unsettled === 1 });
    }
  }
  for (const [stage, amount] of await workDone(em, build, without)) {
    figures.set(stage, { ...(figures.get(stage) ?? nothing), workDone: amount });
  }
  return figures;
}
