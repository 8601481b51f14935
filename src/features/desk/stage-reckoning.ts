import type { DeskView } from '#contracts/entries.ts';
import { finishAt } from '#domain/forecast.ts';
import { exactFrom, exactText } from '#domain/quantity.ts';
import { workKindName } from '#domain/work-words.ts';
import { readAmountOfWork } from '#domain/work.ts';
import type { EntryDerivation, EntryDocument } from '#src/blocks/pure.ts';
import type { LineReckoning } from '#src/blocks/figures-store.ts';
import type { DayFigures } from './desk-ledger.ts';
import { lineKey } from './shelf-replay.ts';

/** A stage with this entry counted in. Minor units. */
export interface StageReckoning {
  readonly title: string;
  readonly planned: number | null;
  /** used + wasted, this entry included */
  readonly soFar: number;
  /** Nothing where there is not enough to go on beyond the plan. */
  readonly finishAt: number | null;
  /** Exact `n/d`, of the stage's kind of work, with this entry's. */
  readonly workDone: string;
  readonly workPlanned: string | null;
}

type DeskStage = DeskView['stages'][number];

/** This entry's work counts towards the stage's when it is of the stage's kind. */
function workHere(stage: DeskStage, derived: EntryDerivation): boolean {
  const { work } = derived;
  if (!work || stage.workUnit === null) return false;
  return work.unit === stage.workUnit && (stage.workKind === null || workKindName(stage.workKind) === work.kind);
}

function usedForEach(derived: EntryDerivation, lines: ReadonlyMap<string, LineReckoning>): number {
  return derived.uses.filter(({ counts }) => counts === 'each').reduce((sum, use) => sum + (lines.get(lineKey(use.block, use.line))?.value ?? 0), 0);
}

/** Where the entry's stage stands, and where it would finish. */
export function stageReckoning(
  view: DeskView, document: EntryDocument, derived: EntryDerivation, figures: DayFigures, lines: ReadonlyMap<string, LineReckoning>,
): StageReckoning | null {
  const stage = view.stages.find(({ id }) => id === document.stage);
  if (!stage) return null;
  const before = exactFrom(stage.workDone);
  const workDone = derived.work && workHere(stage, derived) ? before.add(exactFrom(derived.work.amount)) : before;
  const planned = stage.plannedWork === null ? null : readAmountOfWork(stage.plannedWork);
  const workPlanned = planned?.ok ? exactFrom(planned.value) : null;
  const [used, wasted] = [stage.used + figures.used + figures.costs, stage.wasted + figures.wasted];
  return {
    title: stage.title, planned: stage.planned, soFar: used + wasted,
    finishAt: finishAt({ planned: stage.planned, used, wasted, usedForEach: stage.usedForEach + usedForEach(derived, lines), workPlanned, workDone, percent: null, done: stage.done }),
    workDone: exactText(workDone), workPlanned: workPlanned ? exactText(workPlanned) : null,
  };
}
