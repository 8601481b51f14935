import { AppError } from '#contracts/errors.ts';
import { mostOfBuild } from '#domain/money.ts';
import type { Build } from '#server/entities/index.ts';
import type { Em } from '#server/http/context.ts';
import { buildFigures, shedFigures } from './figures.service.ts';
import { findShed } from './shelves.service.ts';

function refuse(holder: string): never {
  throw new AppError('bad-input', `That comes to more money than ${holder} can hold: look at this day’s figures again.`);
}

/**
 * Asked after a day's rows are written and before they are kept: sums over a build or a shed must stay exact,
 * since lists and the front page show them.
 * @throws AppError `bad-input` where what was spent or used is beyond that
 */
export async function requireMoneyThatFits(em: Em, build: Build): Promise<void> {
  const { spent, used, wasted } = await buildFigures(em, build);
  if (spent > mostOfBuild || used + wasted > mostOfBuild) refuse('a build');
  const shed = await findShed(em, build.owner, build.currency);
  if (shed && (await shedFigures(em, shed)).spent > mostOfBuild) refuse('a shed');
}
