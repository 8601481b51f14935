import Fraction from 'fraction.js';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { exactText } from '#domain/quantity.ts';
import { Build, Movement, Receipt } from '#server/entities/index.ts';
import { verifyLedger } from '#server/features/entries/ledger-check.service.ts';
import { readDeskOf } from '#server/features/entries/desk.service.ts';
import { buildFigures, figuresOfEntries, lineFigures, shedFigures, usedOfBuilds } from '#server/features/shelf/figures.service.ts';
import { findShed } from '#server/features/shelf/shelves.service.ts';
import type { Caller } from '#server/http/context.ts';
import { boughtBlock, costBlock, dayOf, timeBlock, usedBlock, Workshop } from '#tests/support/workshop.ts';

let shop: Workshop;
let people = 0;
beforeAll(async () => {
  shop = await Workshop.open();
});
afterAll(async () => {
  expect((await verifyLedger(shop.em())).differences).toEqual([]);
  await shop.close();
});

const newPerson = () => shop.person(`restorer${(people += 1)}`);

async function figures(build: string) {
  const em = shop.em();
  return buildFigures(em, await em.findOneOrFail(Build, { slug: build }));
}

async function entryFigures(build: string, number: number) {
  const { id } = await shop.entry(build, number);
  return (await figuresOfEntries(shop.em(), [id])).get(id);
}

async function shedOf(owner: Caller, currency: string) {
  const em = shop.em();
  const person = { id: owner.id };
  const shed = await findShed(em, person, currency);
  if (!shed) throw new Error('There is no shed.');
  return shedFigures(em, shed);
}

const noted = { spent: 0, used: 0, wasted: 0, left: 0, movedIn: 0, onOrder: 0, notSorted: 0, returned: 0, sold: 0, movedOut: 0, receipts: 0, materialsLeft: 0, unsettled: false };

test('resin by the US gallon and brushes by fifteen, eight boards: 25.00 + 5.33, half a gallon and seven brushes left', async () => {
  // common practice, no source
  const owner = await newPerson();
  const build = await shop.build(owner, { currency: 'USD', measures: 'us' });
  const resin = await shop.material(owner, build, 'Laminating resin', { dimension: 'volume', unit: 'us-cup' });
  const brushes = await shop.material(owner, build, 'Chip brushes');
  await shop.signOff(owner, build, dayOf('2026-03-01', [boughtBlock([
    { of: resin, amount: '1', unit: 'US gal', money: '50.00' }, { of: brushes, amount: '15', unit: 'pieces', money: '10.00' },
  ])]));
  const boards = Array.from({ length: 8 }, () => [{ of: resin, amount: '1 cup' }, { of: brushes, amount: '1' }]).flat();
  const number = await shop.signOff(owner, build, dayOf('2026-03-02', [usedBlock(boards)]));
  expect(await entryFigures(build, number)).toMatchObject({ used: 2500 + 533, wasted: 0, unsettled: false });
  expect(await figures(build)).toEqual({ ...noted, spent: 6000, used: 3033, left: 2967, receipts: 1, materialsLeft: 2 });
  const rows = await shop.em().find(Movement, { material: brushes.id, kind: 'used' }, { orderBy: { place: 'asc' } });
  // 10.00 over fifteen, to the half-even penny after each: 0.67, 1.33, 2.00, 2.67, 3.33, 4.00, 4.67, 5.33
  expect(rows.map(({ value }) => value)).toEqual([67, 66, 67, 67, 66, 67, 67, 66]);
  const next = await shop.start(owner, build, '2026-03-03');
  const { shelf } = await readDeskOf(shop.em(), owner, build, next);
  const halfAGallon = new Fraction(231).mul(new Fraction(254, 10).pow(3)).div(1000).div(2);
  expect(shelf).toEqual([
    { material: resin.id, shelf: 'shelf', left: exactText(halfAGallon), short: '0/1', worth: 2500 },
    { material: brushes.id, shelf: 'shelf', left: '7/1', short: '0/1', worth: 467 },
  ]);
});

test('an entry set before others in time takes the cheaper lot, and the later ones are priced again', async () => {
  const owner = await newPerson();
  const build = await shop.build(owner);
  const nails = await shop.material(owner, build, 'Nails');
  await shop.signOff(owner, build, dayOf('2026-04-01', [boughtBlock([{ of: nails, amount: '10', money: '10.00' }])]));
  await shop.signOff(owner, build, dayOf('2026-04-02', [boughtBlock([{ of: nails, amount: '10', money: '20.00' }])]));
  const later = await shop.signOff(owner, build, dayOf('2026-04-10', [usedBlock([{ of: nails, amount: '10' }])]));
  expect(await entryFigures(build, later)).toMatchObject({ used: 1000 });
  const earlier = await shop.signOff(owner, build, dayOf('2026-04-05', [usedBlock([{ of: nails, amount: '4' }])]));
  expect(await entryFigures(build, earlier)).toMatchObject({ used: 400 });
  expect(await entryFigures(build, later)).toMatchObject({ used: 600 + 800 });
  await shop.takeBack(owner, build, earlier);
  expect(await entryFigures(build, later)).toMatchObject({ used: 1000 });
  expect(await entryFigures(build, earlier)).toBeUndefined();
});

test('a receipt corrected re-prices both its lines: B goes from 12.50 to 11.25 at the door', async () => {
  // the worked history: receipt A 10, B 10, delivery 5; A corrected to 30
  const owner = await newPerson();
  const build = await shop.build(owner);
  const [oak, ash] = [await shop.material(owner, build, 'Oak'), await shop.material(owner, build, 'Ash')];
  const told = (money: string) => dayOf('2026-05-01', [boughtBlock([
    { id: 'line-oak', of: oak, amount: '1', money }, { id: 'line-ash', of: ash, amount: '1', money: '10.00' },
  ], { delivery: '5.00' }, 'receipt-of-timber')]);
  const number = await shop.signOff(owner, build, told('10.00'));
  const uses = await shop.signOff(owner, build, dayOf('2026-05-02', [usedBlock([{ of: oak, amount: '1' }, { of: ash, amount: '1' }])]));
  const usedBy = async (material: number) => (await shop.em().findOneOrFail(Movement, { material, kind: 'used' })).value;
  expect([await usedBy(oak.id), await usedBy(ash.id)]).toEqual([1250, 1250]);
  const receipt = await shop.em().findOneOrFail(Receipt, { block: 'receipt-of-timber' });
  await shop.signOff(owner, build, told('30.00'), number);
  expect([await usedBy(oak.id), await usedBy(ash.id)]).toEqual([3375, 1125]);
  expect(await entryFigures(build, uses)).toMatchObject({ used: 4500 });
  // papers hang on the row, so an edit keeps it
  expect((await shop.em().findOneOrFail(Receipt, { block: 'receipt-of-timber' })).id).toBe(receipt.id);
  expect(await figures(build)).toMatchObject({ spent: 4500, used: 4500, left: 0 });
});

test('what is used before it is bought waits, and is settled by the next receipt on the day of the use', async () => {
  const owner = await newPerson();
  const build = await shop.build(owner, { method: 'average' });
  const tape = await shop.material(owner, build, 'Tape');
  const use = await shop.signOff(owner, build, dayOf('2026-06-01', [usedBlock([{ of: tape, amount: '2', id: 'line-tape' }], 'used-tape')]));
  const { id } = await shop.entry(build, use);
  expect((await lineFigures(shop.em(), id)).get('used-tape:line-tape')).toEqual({ value: 0, short: '2/1' });
  expect(await figures(build)).toEqual({ ...noted, unsettled: true });
  // the worked history: 5 at 1 and 5 at 3, one day: the use settles at 2.00 from the first, left 18.00
  await shop.signOff(owner, build, dayOf('2026-06-05', [boughtBlock([{ of: tape, amount: '5', money: '5.00' }, { of: tape, amount: '5', money: '15.00' }])]));
  expect((await lineFigures(shop.em(), id)).get('used-tape:line-tape')).toEqual({ value: 200, short: '0/1' });
  expect(await figures(build)).toEqual({ ...noted, spent: 2000, used: 200, left: 1800, receipts: 1, materialsLeft: 1 });
});

test('bought and used in one entry: what comes in comes first, wherever it stands in the text', async () => {
  const owner = await newPerson();
  const build = await shop.build(owner);
  const glue = await shop.material(owner, build, 'Glue', { dimension: 'volume' });
  const number = await shop.signOff(owner, build, dayOf('2026-06-01', [
    usedBlock([{ of: glue, amount: '250 ml' }, { of: glue, amount: '250 ml', fate: 'wasted' }]),
    boughtBlock([{ of: glue, amount: '1 l', money: '8.00' }]),
  ]));
  expect(await entryFigures(build, number)).toMatchObject({ used: 200, wasted: 200, bought: 800, unsettled: false });
});

test('costs, straight into use, not mine, on order and not sorted: each in its own place, and the sum holds', async () => {
  const owner = await newPerson();
  const build = await shop.build(owner);
  const varnish = await shop.material(owner, build, 'Varnish', { dimension: 'volume' });
  const receipt = (onOrder: boolean) => boughtBlock([
    { id: 'line-shelf', of: varnish, amount: '2 l', money: '20.00' },
    { id: 'line-order', of: varnish, amount: '1 l', money: '10.00', onOrder },
    { id: 'line-straight', name: 'Sanding discs', money: '5.00', goes: 'straight' },
    { id: 'line-not-mine', name: 'Bread and milk', money: '5.00', goes: 'not-mine' },
  ], { delivery: '4.00', paperTotal: '50.00' }, 'receipt-mixed');
  const document = (onOrder: boolean) => dayOf('2026-07-01', [receipt(onOrder), costBlock([{ money: '12.00' }]), timeBlock([{ time: '2 h' }, { time: '1 h 30', kind: 'setup' }, { time: '12 h', kind: 'waiting' }])]);
  const number = await shop.signOff(owner, build, document(true));
  // 44.00 over four lines and 6.00 not sorted; by hand: delivery 2.00, 1.00, 0.50, 0.50
  expect(await entryFigures(build, number)).toEqual({ used: 0, wasted: 0, costs: 550 + 1200, bought: 2200 + 1100 + 550 + 600, minutes: 210, waiting: 720, unsettled: false });
  expect(await figures(build)).toEqual({ ...noted, spent: 2200 + 1100 + 550 + 600 + 1200, used: 1750, left: 2200, onOrder: 1100, notSorted: 600, receipts: 1, materialsLeft: 1 });
  await shop.signOff(owner, build, document(false), number);
  expect(await figures(build)).toMatchObject({ onOrder: 0, left: 3300, spent: 5650 });
  const { build: { id } } = await shop.entry(build, number);
  expect((await usedOfBuilds(shop.em(), [id])).get(id)).toBe(1750);
});

test('a receipt in another currency is converted once and reaches the shelf at its cost to the door', async () => {
  // the worked history: three lines of 1.05 abroad at 0.9, 2.84 in all: 0.95, 0.95, 0.94
  const owner = await newPerson();
  const build = await shop.build(owner);
  const rivets = await Promise.all(['Short', 'Middling', 'Long'].map((name) => shop.material(owner, build, `${name} rivets`)));
  await shop.signOff(owner, build, dayOf('2026-07-01', [boughtBlock(rivets.map((of) => ({ of, amount: '1', money: '1.05' })), { currency: 'EUR', rate: '0.9' })]));
  const lots = await shop.em().find(Movement, { material: { $in: rivets.map(({ id }) => id) } }, { orderBy: { place: 'asc' } });
  expect(lots.map(({ value }) => value)).toEqual([95, 95, 94]);
  expect(await figures(build)).toMatchObject({ spent: 284, left: 284 });
});

test('the shed serves several builds: what a day draws is moved in and used there, and moved out of the shed', async () => {
  const owner = await newPerson();
  const [boat, van] = [await shop.build(owner, { title: 'Skiff' }), await shop.build(owner, { title: 'Van', method: 'average' })];
  const screws = await shop.material(owner, boat, 'Screws');
  await shop.signOff(owner, boat, dayOf('2026-08-01', [boughtBlock([{ of: screws, amount: '100', money: '10.00', goes: 'shed' }, { of: screws, amount: '50', money: '10.00', goes: 'shed', onOrder: true }])]));
  const crew = await newPerson();
  await shop.joins(van, crew);
  // the restorer's own working copy names the screws in this build: crew draw on nothing of the shed that it does not
  await shop.save(owner, van, await shop.start(owner, van, '2026-08-04'), dayOf('2026-08-04', [usedBlock([{ of: screws, amount: '1', from: 'shed' }])]));
  const inVan = await shop.signOff(crew, van, dayOf('2026-08-03', [usedBlock([{ of: screws, amount: '30', from: 'shed' }])]));
  const inBoat = await shop.signOff(owner, boat, dayOf('2026-08-02', [usedBlock([{ of: screws, amount: '50', from: 'shed' }, { of: screws, amount: '10', from: 'shed', fate: 'wasted' }])]));
  expect(await entryFigures(van, inVan)).toMatchObject({ used: 300 });
  expect(await entryFigures(boat, inBoat)).toMatchObject({ used: 500, wasted: 100 });
  // the boat's receipt brought nothing to the boat: the lines are the shed's
  const charged = await shop.em().find(Movement, { material: screws.id }, { populate: ['build'], orderBy: { kind: 'asc', day: 'asc', place: 'asc' } });
  expect(charged.map(({ kind, build }) => [kind, build?.slug ?? null])).toEqual([['bought', null], ['used', boat], ['used', van], ['wasted', boat]]);
  expect(await figures(boat)).toEqual({ ...noted, movedIn: 600, used: 500, wasted: 100, receipts: 1 });
  expect(await figures(van)).toEqual({ ...noted, movedIn: 300, used: 300 });
  expect(await shedOf(owner, 'GBP')).toMatchObject({ spent: 2000, left: 100, movedOut: 900, onOrder: 1000 });
  // beyond the shed it falls short like any use, and waits
  await shop.signOff(crew, van, dayOf('2026-08-03', [usedBlock([{ of: screws, amount: '45', from: 'shed' }])]), inVan);
  expect(await entryFigures(van, inVan)).toMatchObject({ used: 400, unsettled: true });
});

test('a shed is kept for each currency', async () => {
  const owner = await newPerson();
  const [here, abroad] = [await shop.build(owner, { title: 'Cutter' }), await shop.build(owner, { title: 'Launch', currency: 'JPY' })];
  const wax = await shop.material(owner, here, 'Wax', { dimension: 'mass' });
  await shop.signOff(owner, here, dayOf('2026-08-01', [boughtBlock([{ of: wax, amount: '1 kg', money: '9.00', goes: 'shed' }])]));
  await shop.signOff(owner, abroad, dayOf('2026-08-01', [boughtBlock([{ of: wax, amount: '1 kg', money: '1500', goes: 'shed' }]), usedBlock([{ of: wax, amount: '500 g', from: 'shed' }])]));
  expect(await shedOf(owner, 'GBP')).toMatchObject({ spent: 900, left: 900 });
  expect(await shedOf(owner, 'JPY')).toMatchObject({ spent: 1500, left: 750, movedOut: 750 });
});
