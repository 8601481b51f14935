import type { BuildPage, PlanRow } from '#contracts/builds.ts';
import { formatMinutes, formatMoney, formatMoneySoFar } from '#domain/format.ts';
import { ButtonLink } from '#src/components/button.tsx';
import { DataTable } from '#src/components/data-table.tsx';
import { Empty } from '#src/components/empty.tsx';
import { PlanTable } from '#src/components/plan-table.tsx';

function sum(rows: readonly PlanRow[], figure: (row: PlanRow) => number | null): number {
  return rows.reduce((total, row) => total + (figure(row) ?? 0), 0);
}

function barOf(row: PlanRow, money: (minor: number) => string) {
  if (row.planned === null) return null;
  const used = row.used + row.wasted;
  return { planned: row.planned, used, ...(used > row.planned ? { over: `${money(used - row.planned)} over` } : {}) };
}

/** What was planned, what went and where it will finish, stage by stage. Plan compares used and wasted together. */
export function BuildPlan({ build }: { build: BuildPage }) {
  const { plan, currency } = build;
  const money = (minor: number) => formatMoney(minor, currency);
  if (!plan) return <StageHours build={build} />;
  if (plan.length === 0) return <Empty title="No plan yet" action={build.may.settle ? <ButtonLink kind="quiet" to={`/builds/${build.slug}/plan`}>Plan the stages</ButtonLink> : null}>Stages with what is planned for each stand here, beside what they took.</Empty>;
  const known = plan.every((row) => row.finishAt !== null || (row.planned === null && row.used + row.wasted === 0));
  const finish = sum(plan, (row) => row.finishAt);
  return (
    <PlanTable
      caption="Planned, used and finish at, by stage"
      rows={plan.map((row, index) => ({
        key: String(index), stage: row.stage, done: row.done,
        planned: row.planned === null ? '' : money(row.planned), used: formatMoneySoFar(row.used + row.wasted, currency, row.unsettled),
        ...(row.finishAt === null ? {} : { finishAt: money(row.finishAt) }), bar: barOf(row, money),
      }))}
      foot={{ label: 'Build', planned: money(sum(plan, (row) => row.planned)), used: formatMoneySoFar(sum(plan, (row) => row.used + row.wasted), currency, plan.some((row) => row.unsettled)), ...(known ? { finishAt: money(finish) } : {}) }}
    />
  );
}

/** Where costs are kept to the crew, the stages still show their days and hours. */
function StageHours({ build }: { build: BuildPage }) {
  if (build.stages.length === 0) return <Empty title="No stages yet">The parts of the build stand here, with the days and hours each took.</Empty>;
  return (
    <DataTable
      caption="Days and hours by stage"
      captionHidden
      columns={[{ key: 'stage', label: 'Stage' }, { key: 'days', label: 'Days', numeric: true }, { key: 'hours', label: 'Hands on', numeric: true }]}
      rows={build.stages.map((stage, index) => ({ key: String(index), cells: [stage.done ? `${stage.stage}, done` : stage.stage, stage.days, formatMinutes(stage.minutes)] }))}
    />
  );
}
