import { afterAll, beforeAll, beforeEach, expect, test } from 'vitest';
import { AppError } from '#contracts/errors.ts';
import { putStages } from '#server/features/builds/stages.service.ts';
import { Build, Cost, Entry, EntryAddress, Movement, Receipt, Shelf, Stage, TimeLine, WorkKind } from '#server/entities/index.ts';
import { readDeskOf } from '#server/features/entries/desk.service.ts';
import { verifyLedger } from '#server/features/entries/ledger-check.service.ts';
import { readLastLines } from '#server/features/entries/last-time.service.ts';
import { signOffDay } from '#server/features/entries/sign-off.service.ts';
import { buildFigures, figuresOfStages } from '#server/features/shelf/figures.service.ts';
import type { Caller } from '#server/http/context.ts';
import { boughtBlock, costBlock, dayOf, timeBlock, usedBlock, Workshop } from '#tests/support/workshop.ts';

const [morning, noon, evening] = ['2026-11-20T08:00:00Z', '2026-11-20T12:00:00Z', '2026-11-20T18:00:00Z'].map((at) => new Date(at));
let shop: Workshop;
let owner: Caller;
let build: string;
let rounds = 0;
beforeAll(async () => {
  shop = await Workshop.open();
});
beforeEach(async () => {
  rounds += 1;
  owner = await shop.person(`signer${rounds}`);
  build = await shop.build(owner, { title: `Signed ${rounds}` });
});
afterAll(async () => {
  expect((await verifyLedger(shop.em())).differences).toEqual([]);
  await shop.close();
});

async function outcomeOf(run: Promise<unknown>): Promise<AppError> {
  const error = await run.then(() => new Error('It was expected to be refused.'), (reason: unknown) => reason);
  if (!(error instanceof AppError)) throw error;
  return error;
}

/** Every row of the ledger an entry has, as it stands. */
async function rowsOf(number: number) {
  const { id, ...entry } = await shop.entry(build, number);
  const em = shop.em();
  const rows = await Promise.all(['movement', 'receipt', 'cost', 'time_line'].map((table) => em.execute<object[]>(`select * from ${table} where entry_id = ? order by id`, [id])));
  return { rows, version: entry.version, published: entry.published, slug: entry.slug };
}

test('what bars signing off is said beside each field, all at once, and nothing is published', async () => {
  const rope = await shop.material(owner, build, 'Rope', { dimension: 'length' });
  const number = await shop.start(owner, build, '2026-03-01');
  const document = dayOf('2026-03-01', [
    usedBlock([{ of: rope, amount: '1,5 m', id: 'line-comma' }, { of: rope, amount: '', id: 'line-empty' }, { of: rope, amount: '-2 m', id: 'line-minus' }, { of: rope, amount: '3 stones', id: 'line-stones' }], 'used-wrong'),
    boughtBlock([{ of: rope, amount: '5 m', money: '12,50', id: 'line-money' }], {}, 'bought-wrong'),
    timeBlock([{ time: '7.5', id: 'line-time' }], 'time-wrong'),
  ], { title: ' ', work: { amount: 'many', unit: 'piece', kind: 'splice' } });
  const { code, fields } = await outcomeOf(shop.signOff(owner, build, document, number));
  expect(code).toBe('bad-input');
  expect(Object.keys(fields ?? {}).toSorted()).toEqual([
    'bought-wrong.line-money.money', 'time-wrong.line-time.time', 'title', 'used-wrong.line-comma.amount', 'used-wrong.line-empty.amount',
    'used-wrong.line-minus.amount', 'used-wrong.line-stones.amount', 'work.amount',
  ]);
  expect(fields?.['used-wrong.line-comma.amount']).toMatch(/1\.5/);
  expect((await rowsOf(number)).rows.flat()).toEqual([]);
});

test('a material of somebody else, a stage of another build and a photo that is not there are refused', async () => {
  const stranger = await shop.person(`stranger${rounds}`);
  const theirs = await shop.build(stranger, { title: `Theirs ${rounds}` });
  const teak = await shop.material(stranger, theirs, 'Teak');
  const number = await shop.start(owner, build, '2026-03-01');
  expect(await outcomeOf(shop.signOff(owner, build, dayOf('2026-03-01', [usedBlock([{ of: teak, amount: '1', id: 'line-teak' }], 'used-teak')]), number)))
    .toMatchObject({ code: 'bad-input', fields: { 'used-teak.line-teak.material': expect.stringContaining('Teak') } });
  const em = shop.em();
  const there = await em.findOneOrFail(Build, { slug: theirs });
  await putStages(em, there, [{ id: null, title: 'Deck', plannedMoney: '', plannedTime: '', plannedWork: '', workUnit: 'piece' as const, workKind: '', done: false }]);
  const deck = await em.findOneOrFail(Stage, { build: there.id });
  expect(await outcomeOf(shop.signOff(owner, build, dayOf('2026-03-01', [], { stage: deck.id }), number))).toMatchObject({ fields: { stage: 'Pick a stage of this build.' } });
  const photos = { type: 'photos' as const, attrs: { id: 'photos-lost', version: 1, data: { photos: [{ id: 'photo-lost', picture: 'a-key-of-no-picture', caption: '', alt: '', cover: false }] } } };
  expect(await outcomeOf(shop.signOff(owner, build, dayOf('2026-03-01', [photos, timeBlock([{ time: '1 h' }])]), number)))
    .toMatchObject({ fields: { 'photos-lost.photo-lost.picture': expect.any(String) } });
  expect((await rowsOf(number)).rows.flat()).toEqual([]);
  expect((await shop.entry(build, number)).published).toBeNull();
});

test.each(['movement', 'receipt_line', 'cost', 'time_line', 'entry_address'])('a fault while %s is written leaves everything as it was', async (table) => {
  const rope = await shop.material(owner, build, 'Rope');
  const number = await shop.signOff(owner, build, dayOf('2026-03-01', [boughtBlock([{ of: rope, amount: '4', money: '4.00' }]), costBlock([{ money: '1.00' }]), timeBlock([{ time: '1 h' }])]));
  const before = await rowsOf(number);
  const use = await shop.signOff(owner, build, dayOf('2026-03-02', [usedBlock([{ of: rope, amount: '2' }])]));
  const used = await rowsOf(use);
  await shop.em().execute(`create trigger planted before insert on ${table} begin select raise(abort, 'planted fault'); end`);
  const changed = dayOf('2026-03-01', [boughtBlock([{ of: rope, amount: '4', money: '8.00' }]), costBlock([{ money: '2.00' }]), timeBlock([{ time: '2 h' }])], { title: 'Another title' });
  await expect(shop.signOff(owner, build, changed, number)).rejects.toThrow(/planted fault/);
  await shop.em().execute('drop trigger planted');
  expect(await rowsOf(number)).toEqual(before);
  expect(await rowsOf(use)).toEqual(used);
  await shop.signOff(owner, build, changed, number);
  expect(await shop.em().findOneOrFail(Movement, { material: rope.id, kind: 'used' })).toMatchObject({ value: 400 });
});

test('a change that would leave a return with more than there is is refused in words, and a use may fall short', async () => {
  const oil = await shop.material(owner, build, 'Linseed oil', { dimension: 'volume', unit: 'l' });
  const buy = await shop.signOff(owner, build, dayOf('2026-03-01', [boughtBlock([{ of: oil, amount: '5 l', money: '20.00', id: 'line-oil' }], {}, 'bought-oil'), timeBlock([{ time: '1 h' }])]));
  const em = shop.em();
  const shelf = await em.findOneOrFail(Shelf, { build: { slug: build } }, { populate: ['build'] });
  // the day's act of giving back two litres, as a later issue will write it
  em.create(Movement, {
    shelf, build: shelf.build, key: 'returned:oil', kind: 'returned', material: oil.id, day: '2026-03-04', sequence: 90, place: 0, typed: '2 l', amount: '2000/1', cost: null, of: null, shortage: null, value: 800, short: '0/1', counts: null, stage: null,
  });
  await em.flush();
  const use = await shop.signOff(owner, build, dayOf('2026-03-03', [usedBlock([{ of: oil, amount: '3 l' }])]));
  const before = await rowsOf(buy);
  for (const attempt of [
    () => shop.signOff(owner, build, dayOf('2026-03-01', [boughtBlock([{ of: oil, amount: '4 l', money: '20.00' }])]), buy),
    () => shop.takeBack(owner, build, buy),
    () => shop.signOff(owner, build, dayOf('2026-03-02', [usedBlock([{ of: oil, amount: '500 ml' }])])),
  ]) {
    const { code, message } = await outcomeOf(attempt());
    expect(code).toBe('falls-short');
    expect(message).toMatch(/^Linseed oil: 2 l was taken back to the shop on 4 Mar 2026, and with this change (only (1|1\.5) l|none) would be there that day\./);
  }
  expect(await rowsOf(buy)).toEqual(before);
  await shop.em().nativeDelete(Movement, { key: 'returned:oil' });
  await shop.takeBack(owner, build, buy);
  expect(await shop.em().findOneOrFail(Movement, { entry: { number: use, build: { slug: build } } })).toMatchObject({ value: 0, short: '3000/1' });
  expect(await shop.em().count(Receipt, { build: { slug: build } })).toBe(0);
});

test('an entry has its address from its title, keeps every one it had, and none is given twice', async () => {
  const titled = (title: string) => dayOf('2026-03-01', [], { title });
  const [first, second, plan, empty] = [await shop.signOff(owner, build, titled('Ribs in')), await shop.signOff(owner, build, titled('Ribs in')), await shop.signOff(owner, build, titled('Plan')), await shop.signOff(owner, build, titled('…'))];
  const slugs = async () => (await Promise.all([first, second, plan, empty].map((number) => shop.entry(build, number)))).map(({ slug }) => slug);
  expect(await slugs()).toEqual(['ribs-in', 'ribs-in-2', 'plan-2', `day-${empty}`]);
  await shop.signOff(owner, build, titled('Ribs in!'), second);
  await shop.signOff(owner, build, titled('Ribs out'), first);
  expect(await slugs()).toEqual(['ribs-out', 'ribs-in-2', 'plan-2', `day-${empty}`]);
  await shop.signOff(owner, build, titled('Ribs in'), first);
  expect((await slugs())[0]).toBe('ribs-in');
  const addresses = await shop.em().find(EntryAddress, { build: { slug: build } }, { orderBy: { id: 'asc' } });
  expect(addresses.map(({ slug }) => slug)).toEqual(['ribs-in', 'ribs-in-2', 'plan-2', `day-${empty}`, 'ribs-out']);
  // taken back and thrown away: the address stays nobody's
  await shop.takeBack(owner, build, first);
  await shop.discard(owner, build, first);
  const again = await shop.signOff(owner, build, titled('Ribs in'));
  expect((await shop.entry(build, again)).slug).toBe('ribs-in-3');
});

test('the day it was first published and its guid stay; the edited date is of the words, and re-pricing never touches it', async () => {
  const rope = await shop.material(owner, build, 'Rope');
  const words = dayOf('2026-03-02', [usedBlock([{ of: rope, amount: '2' }])]);
  const number = await shop.start(owner, build, '2026-03-02');
  const sign = async (document: typeof words, at: Date | undefined) => signOffDay(shop.em(), owner, build, number, { version: (await shop.entry(build, number)).version, document }, at ?? new Date(0));
  await sign(words, morning);
  const first = await shop.entry(build, number);
  expect(first).toMatchObject({ firstPublishedAt: morning, editedAt: null, working: null, workingAt: null });
  await sign(words, noon);
  expect((await shop.entry(build, number)).editedAt).toBeNull();
  await shop.signOff(owner, build, dayOf('2026-03-01', [boughtBlock([{ of: rope, amount: '4', money: '4.00' }])]));
  const priced = await shop.entry(build, number);
  expect(priced.editedAt).toBeNull();
  expect((await shop.em().findOneOrFail(Movement, { entry: priced.id })).value).toBe(200);
  await sign({ ...words, lead: 'Two lengths.' }, evening);
  expect(await shop.entry(build, number)).toMatchObject({ guid: first.guid, firstPublishedAt: morning, editedAt: evening });
});

test('taken back and signed off again as it was, a day is not edited; with other words it is', async () => {
  const rope = await shop.material(owner, build, 'Rope');
  const words = dayOf('2026-03-02', [usedBlock([{ of: rope, amount: '2' }])]);
  const number = await shop.start(owner, build, '2026-03-02');
  const sign = async (document: typeof words, at: Date | undefined) => signOffDay(shop.em(), owner, build, number, { version: (await shop.entry(build, number)).version, document }, at ?? new Date(0));
  await sign(words, morning);
  await shop.takeBack(owner, build, number);
  await sign(words, noon);
  expect(await shop.entry(build, number)).toMatchObject({ firstPublishedAt: morning, editedAt: null });
  await shop.takeBack(owner, build, number);
  await sign({ ...words, lead: 'Two lengths.' }, evening);
  expect(await shop.entry(build, number)).toMatchObject({ firstPublishedAt: morning, editedAt: evening });
});

test('stages add up what their published days used, the time and the work of their own kind', async () => {
  const em = shop.em();
  const of = await em.findOneOrFail(Build, { slug: build });
  const stage = (title: string, work: string) => ({ id: null, title, plannedMoney: '110.00', plannedTime: '', plannedWork: work, workUnit: 'piece' as const, workKind: work === '' ? '' : 'steamed rib', done: false });
  await putStages(em, of, [stage('Ribs', '24'), stage('Deck', '')]);
  const [ribs, deck] = await em.find(Stage, { build: of.id }, { orderBy: { position: 'asc' } });
  const oak = await shop.material(owner, build, 'Oak');
  const day = (date: string, amount: string, kind: string, at: number | undefined) => dayOf(date, [
    usedBlock([{ of: oak, amount: '2' }, { of: oak, amount: '1', fate: 'wasted' }, { of: oak, amount: '1', counts: 'whole' }]), costBlock([{ money: '3.00' }]), timeBlock([{ time: '1 h' }, { time: '9 h', kind: 'waiting' }]),
  ], { stage: at ?? null, work: { amount, unit: 'piece', kind } });
  await shop.signOff(owner, build, dayOf('2026-03-01', [boughtBlock([{ of: oak, amount: '20', money: '20.00' }])]));
  const one = await shop.signOff(owner, build, day('2026-03-02', '8', 'Steamed rib', ribs?.id));
  await shop.signOff(owner, build, day('2026-03-03', '1/3', 'steamed rib', ribs?.id));
  await shop.signOff(owner, build, day('2026-03-04', '9', 'nail', ribs?.id));
  const draft = await shop.start(owner, build, '2026-03-05');
  await shop.save(owner, build, draft, day('2026-03-05', '9', 'steamed rib', ribs?.id));
  const figures = await figuresOfStages(shop.em(), of);
  expect(figures.get(ribs?.id ?? 0)).toEqual({ unsettled: false, used: 3 * (300 + 300), wasted: 300, usedForEach: 900, minutes: 180, days: 3, workDone: '25/3' });
  expect(figures.get(deck?.id ?? 0)).toBeUndefined();
  expect(figures.get(null)).toMatchObject({ used: 0, days: 1, workDone: null });
  const desk = await readDeskOf(shop.em(), owner, build, one);
  expect(desk.stages).toMatchObject([{ title: 'Ribs', planned: 11_000, plannedWork: '24', workKind: 'steamed rib', used: 1200, wasted: 200, workDone: '1/3' }, { title: 'Deck', used: 0, workDone: '0/1' }]);
  expect(desk.workKinds.slice(0, 2)).toEqual([{ one: 'steamed rib', many: 'steamed ribs' }, { one: 'nail', many: 'nails' }]);
  expect(await shop.em().count(WorkKind, { one: 'steamed rib' })).toBe(1);
  expect(await buildFigures(shop.em(), of)).toMatchObject({ used: 1800, wasted: 300 });
});

test('same as last time: the lines of the day before, of the same stage where there is one, drafts included', async () => {
  const em = shop.em();
  const of = await em.findOneOrFail(Build, { slug: build });
  await putStages(em, of, ['Ribs', 'Deck'].map((title) => ({ id: null, title, plannedMoney: '', plannedTime: '', plannedWork: '', workUnit: 'piece' as const, workKind: '', done: false })));
  const [ribs, deck] = await em.find(Stage, { build: of.id }, { orderBy: { position: 'asc' } });
  const oak = await shop.material(owner, build, 'Oak');
  const day = (date: string, amount: string, stage: number | undefined) => dayOf(date, [usedBlock([{ of: oak, amount }]), timeBlock([{ time: amount === '1' ? '1 h' : '2 h' }])], { stage: stage ?? null, title: `Day ${amount}` });
  await shop.signOff(owner, build, day('2026-03-01', '1', ribs?.id));
  const draft = await shop.start(owner, build, '2026-03-02');
  await shop.save(owner, build, draft, day('2026-03-02', '2', deck?.id));
  await shop.signOff(owner, build, day('2026-03-09', '9', deck?.id));
  const number = await shop.start(owner, build, '2026-03-05');
  const last = (stage: number | null) => readLastLines(shop.em(), owner, build, number, stage);
  expect(await last(null)).toMatchObject({ title: 'Day 2', used: [{ material: oak.id, amount: '2' }], time: [{ time: '2 h' }] });
  expect(await last(ribs?.id ?? 0)).toMatchObject({ title: 'Day 1', used: [{ amount: '1' }], time: [{ time: '1 h' }] });
  const earliest = await shop.start(owner, build, '2026-01-01');
  expect(await readLastLines(shop.em(), owner, build, earliest, null)).toEqual({ title: null, used: [], time: [] });
});

test('hours are of a member of the build, and leaving the crew takes none away', async () => {
  const mate = await shop.person(`rower${rounds}`);
  const passer = await shop.person(`passer${rounds}`);
  await shop.joins(build, mate);
  const told = dayOf('2026-03-01', [timeBlock([{ handle: mate.handle, name: 'Mate', time: '1 h' }, { handle: passer.handle, name: 'Passer-by', time: '2 h' }])]);
  const number = await shop.signOff(owner, build, told);
  const people = async () => (await shop.em().find(TimeLine, { entry: { number, build: { slug: build } } }, { populate: ['person'], orderBy: { id: 'asc' } })).map(({ person, name }) => [person?.handle ?? null, name]);
  expect(await people()).toEqual([[mate.handle, 'Mate'], [null, 'Passer-by']]);
  await shop.em().execute('delete from crew_member where person_id = ?', [mate.id]);
  await shop.signOff(owner, build, { ...told, lead: 'Corrected.' }, number);
  expect(await people()).toEqual([[mate.handle, 'Mate'], [null, 'Passer-by']]);
});

test('only those who write in a build sign off in it', async () => {
  const stranger = await shop.person(`onlooker${rounds}`);
  const number = await shop.start(owner, build, '2026-03-01');
  expect(await outcomeOf(shop.signOff(stranger, build, dayOf('2026-03-01', []), number))).toMatchObject({ code: 'not-allowed' });
  expect(await outcomeOf(shop.start(stranger, build, '2026-03-01'))).toMatchObject({ code: 'not-allowed' });
  const hidden = await shop.build(owner, { title: `Hidden ${rounds}`, visibility: 'private' });
  expect(await outcomeOf(shop.start(stranger, hidden, '2026-03-01'))).toMatchObject({ code: 'not-found' });
  expect(await outcomeOf(shop.takeBack(owner, build, number))).toMatchObject({ code: 'bad-input' });
  expect(await shop.em().count(Cost, { build: { slug: build } })).toBe(0);
  expect(await shop.em().count(Entry, { build: { slug: build } })).toBe(1);
});
