import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, expect, test } from 'vitest';
import type { BuildPage } from '#contracts/builds.ts';
import { BuildPlan } from '#src/features/reading/build-plan.tsx';

afterEach(cleanup);

const stage = { stage: 'Paint', done: false, minutes: 60 };
const build = {
  slug: 'x', title: 'X', kind: 'boat', lead: '', owner: { handle: 'wren', name: 'Wren' }, crew: [], madeIn: '', identity: [], startedOn: '2026-01-01', stands: 'working', standsNote: '',
  archived: false, visibility: 'public', currency: 'GBP', days: 0, minutes: 0, before: null, after: null, tape: { from: '2026-01-01', to: '2026-01-01', days: [] },
  stages: [{ ...stage, days: 1 }, { ...stage, days: 2 }], entries: [], page: 1, pages: 1, may: { write: false, settle: false },
} satisfies BuildPage;
const row = { ...stage, planned: 1000, used: 400, wasted: 0, unsettled: false, finishAt: 1000, plannedMinutes: null };

// A console error fails the test: React tells there of two rows with one key.
test.each([['with costs', { ...build, plan: [row, { ...row, used: 500 }] }], ['with hours only', build]])('a plan with two stages of one name shows both, %s', (_, page) => {
  render(<BuildPlan build={page} />);
  expect(screen.getAllByRole('rowheader', { name: /Paint/ })).toHaveLength(2);
});
