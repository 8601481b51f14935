import type { Em } from '#server/http/context.ts';

export interface BuildDays {
  /** Published entries. */
  readonly days: number;
  /** The last day of work among them. */
  readonly lastDay: string;
}

/** How many days of each build are published, and the last of them; a build without any is absent. */
export async function daysOfBuilds(em: Em, buildIds: readonly number[]): Promise<Map<number, BuildDays>> {
  if (buildIds.length === 0) return new Map();
  const rows = await em.execute<(BuildDays & { build: number })[]>(
    `select build_id as build, count(*) as days, max(ifnull(day_to, day)) as lastDay from entry
     where published is not null and build_id in (${buildIds.map(() => '?').join(', ')}) group by build_id`, [...buildIds],
  );
  return new Map(rows.map(({ build, ...days }) => [build, days]));
}
