import { createHash } from 'node:crypto';
import type { changeStages, StageView } from '#contracts/builds.ts';
import type { ParsedOf } from '#contracts/endpoint.ts';
import { AppError } from '#contracts/errors.ts';
import { readMinutes } from '#domain/duration.ts';
import { exactFigure } from '#domain/figures.ts';
import { readMoney } from '#domain/money.ts';
import { exactFrom } from '#domain/quantity.ts';
import { readAmountOfWork } from '#domain/work.ts';
import { Stage, type Build } from '#server/entities/index.ts';
import type { Caller, Em } from '#server/http/context.ts';
import { requireCrewBuild, requireOwnBuild } from './build-access.service.ts';
import { workKindNamed } from './work-kinds.service.ts';

type StageInput = ParsedOf<typeof changeStages>['body']['stages'][number];

/** The stages that something of the ledger or a published day stands in. */
async function usedStages(em: Em, build: Build): Promise<Set<number>> {
  const standsIn = ['entry', 'movement', 'cost', 'time_line'].map((table) => `exists (select 1 from ${table} t where t.stage_id = s.id)`).join(' or ');
  const rows = await em.execute<{ id: number }[]>(`select s.id as id from stage s where s.build_id = ? and (${standsIn})`, [build.id]);
  return new Set(rows.map(({ id }) => id));
}

/** Tells one list of stages from another. */
function versionOf(stages: readonly Stage[]): string {
  const told = stages.map(({ id, title, position, plannedMoney, plannedMinutes, plannedWork, workUnit, workKind, done }) => [
    id, title, position, plannedMoney ?? null, plannedMinutes ?? null, plannedWork ?? null, workUnit ?? null, workKind?.id ?? null, done,
  ]);
  return createHash('sha256').update(JSON.stringify(told)).digest('base64url').slice(0, 20);
}

const inOrder = { orderBy: { position: 'asc', id: 'asc' }, populate: ['workKind'] } as const;

export async function listStages(em: Em, caller: Caller, slug: string): Promise<{ currency: string; stages: StageView[]; version: string }> {
  const build = await requireCrewBuild(em, caller, slug);
  const used = await usedStages(em, build);
  const stages = await em.find(Stage, { build: build.id }, inOrder);
  return {
    currency: build.currency, version: versionOf(stages),
    stages: stages.map((stage) => ({
      id: stage.id, title: stage.title, plannedMoney: stage.plannedMoney ?? null, plannedMinutes: stage.plannedMinutes ?? null,
      plannedWork: stage.plannedWork ? exactFigure(exactFrom(stage.plannedWork)) : null, workUnit: stage.workUnit ?? null,
      workKind: stage.workKind?.one ?? null, done: stage.done, used: used.has(stage.id),
    })),
  };
}

interface PlannedFigures { plannedMoney: number | null; plannedMinutes: number | null; plannedWork: string | null }

function plannedFigures(input: StageInput, index: number, currency: string, fields: Record<string, string>): PlannedFigures {
  const read = <T>(name: string, text: string, reading: { ok: true; value: T } | { ok: false; problem: string }): T | null => {
    if (text === '') return null;
    if (reading.ok) return reading.value;
    fields[`stages.${index}.${name}`] = reading.problem;
    return null;
  };
  const money = read('plannedMoney', input.plannedMoney, readMoney(input.plannedMoney, currency));
  const work = read('plannedWork', input.plannedWork, readAmountOfWork(input.plannedWork));
  if (work !== null && input.workKind === '') fields[`stages.${index}.workKind`] = 'Say what is counted, such as “steamed rib”.';
  return { plannedMoney: money?.minor ?? null, plannedMinutes: read('plannedTime', input.plannedTime, readMinutes(input.plannedTime)), plannedWork: work };
}

/**
 * Puts the whole list in place, in order. A stage that entries stand in stays.
 * @param version of the list it was made from; nothing for one that was made from none
 * @throws AppError `newer-exists`, with the version of now, when the list was changed since
 */
export async function replaceStages(em: Em, caller: Caller, slug: string, inputs: readonly StageInput[], version?: string): Promise<void> {
  await em.transactional(async (inner) => {
    const build = await requireOwnBuild(inner, caller, slug);
    const standing = versionOf(await inner.find(Stage, { build: build.id }, inOrder));
    if (version !== undefined && version !== standing) {
      throw new AppError('newer-exists', 'Somebody changed this plan since you opened it. Look at it as it is now, then say whose to keep.', undefined, { version: standing });
    }
    await putStages(inner, build, inputs);
  });
}

export async function putStages(em: Em, build: Build, inputs: readonly StageInput[]): Promise<void> {
  const fields: Record<string, string> = {};
  const planned = inputs.map((input, index) => plannedFigures(input, index, build.currency, fields));
  const existing = new Map((await em.find(Stage, { build: build.id })).map((stage) => [stage.id, stage]));
  inputs.forEach((input, index) => {
    if (input.id !== null && !existing.has(input.id)) fields[`stages.${index}.title`] = 'This stage is no longer there; add it again.';
  });
  if (Object.keys(fields).length > 0) throw new AppError('bad-input', 'Some of this needs mending.', fields);
  const kept = new Set(inputs.flatMap((input) => input.id ?? []));
  const used = await usedStages(em, build);
  for (const [id, stage] of existing) {
    if (kept.has(id)) continue;
    if (used.has(id)) throw new AppError('in-use', `“${stage.title}” has days written up in it, so it stays. Mark it done instead.`);
    em.remove(stage);
  }
  for (const [position, input] of inputs.entries()) {
    const figures = planned[position];
    if (!figures) continue;
    const workKind = input.workKind === '' ? null : await workKindNamed(em, input.workKind);
    const values = { title: input.title, position, ...figures, workUnit: figures.plannedWork ? input.workUnit : null, workKind, done: input.done };
    const stage = input.id === null ? undefined : existing.get(input.id);
    if (stage) Object.assign(stage, values);
    else em.persist(em.create(Stage, { build, ...values }));
  }
  await em.flush();
}
