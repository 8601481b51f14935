import type { InputOf } from '#contracts/endpoint.ts';
import type { changeStages, StageView } from '#contracts/builds.ts';
import { formatMoney, formatMinutes } from '#domain/format.ts';
import { textOf } from '#src/lib/form-action.ts';

type StageInput = InputOf<typeof changeStages>['body']['stages'][number];

/** The fields of a stage as they stand in the form, all as typed. */
export const stageFields = ['title', 'plannedMoney', 'plannedTime', 'plannedWork', 'workUnit', 'workKind'] as const;

/** Far more rows than a plan may have: the page's action reads the form before anybody is asked who they are. */
const mostRows = 200;

/** The number of rows a form says it has, held to what can be read. */
export function rowsNamed(text: string): number {
  const count = Number(text);
  return Number.isInteger(count) && count > 0 ? Math.min(count, mostRows) : 0;
}

export function stageCount(form: FormData): number {
  return rowsNamed(textOf(form, 'count'));
}

/** The contract checks what was sent; a form without the field counts pieces. */
function unitSent(text: string): StageInput['workUnit'] {
  return (text || 'piece') as StageInput['workUnit'];
}

/** Stages as sent, in the order asked for. Empty rows and rows ticked to be taken out are left out. */
export function stageInputs(form: FormData): StageInput[] {
  const rows = Array.from({ length: stageCount(form) }, (_, index) => {
    const field = (name: string) => textOf(form, `stages.${index}.${name}`);
    const id = field('id');
    return {
      order: Number(field('order')) || index + 1, gone: form.has(`stages.${index}.gone`),
      stage: {
        id: id === '' ? null : Number(id), title: field('title'), plannedMoney: field('plannedMoney'), plannedTime: field('plannedTime'),
        plannedWork: field('plannedWork'), workUnit: unitSent(field('workUnit')), workKind: field('workKind'), done: form.has(`stages.${index}.done`),
      },
    };
  });
  return rows
    .filter(({ stage, gone }) => !gone && (stage.id !== null || stage.title !== '' || stage.plannedMoney !== ''))
    .toSorted((a, b) => a.order - b.order)
    .map(({ stage }) => stage);
}

/** What stands in a field of a stage that is already there. */
export function stageText(stage: StageView | undefined, name: (typeof stageFields)[number], currency: string): string {
  if (!stage) return name === 'workUnit' ? 'piece' : '';
  if (name === 'title') return stage.title;
  if (name === 'plannedMoney') return stage.plannedMoney === null ? '' : formatMoney(stage.plannedMoney, currency);
  if (name === 'plannedTime') return stage.plannedMinutes === null ? '' : formatMinutes(stage.plannedMinutes);
  if (name === 'plannedWork') return stage.plannedWork ?? '';
  if (name === 'workUnit') return stage.workUnit ?? 'piece';
  return stage.workKind ?? '';
}
