import type { DemoBuild } from '../demo-build.ts';
import { finishDays } from './finish-days.ts';
import { veneerDays } from './veneer-days.ts';

export const bureau: DemoBuild = {
  owner: 'restorer', crew: [], startedDaysAgo: 95, kind: 'furniture',
  title: 'A walnut writing bureau, about 1880',
  lead: 'A small bureau with a split fall front, drawers that had worn themselves crooked and three sorts of polish on top of each other. All of it is being mended with the glue and the polish it was made with, so that the next person can undo it.',
  year: 1880, yearAbout: true, stands: 'finished',
  currency: 'EUR', measures: 'imperial', method: 'fifo', visibility: 'public', costsShown: true,
  before: 'bureau-arrived.jpg', after: 'bureau-finished.jpg',
  stages: [
    { title: 'Looking and cleaning', money: '50', time: '8 h', done: true },
    { title: 'Fall front', money: '45', time: '20 h', work: { amount: '4.6', unit: 'm', kind: 'stringing let in' }, done: true },
    { title: 'Drawers and beading', money: '85', time: '20 h', work: { amount: '8', unit: 'piece', kind: 'drawer runner' }, done: true },
    { title: 'Polish', money: '45', time: '12 h', work: { amount: '2.1', unit: 'm2', kind: 'surface polished' }, done: true },
    { title: 'Inside', money: '60', time: '6 h', done: true },
  ],
  materials: {
    soap: { name: 'Soft soap, neutral', dimension: 'mass', unit: 'g', packs: { jar: '250 g' } },
    cloth: { name: 'Cotton cloth, washed', dimension: 'area', unit: 'm2', packs: { bundle: '4 m2' } },
    linseed: { name: 'Raw linseed oil', dimension: 'volume', unit: 'ml', packs: { bottle: '500 ml' }, hazards: ['oily-rags'] },
    glue: { name: 'Hide glue, pearls', dimension: 'mass', unit: 'g', packs: { bag: '1 kg' } },
    veneer: { name: 'Figured walnut veneer, 0.9 mm', dimension: 'area', unit: 'm2', packs: { sheet: '0.2 m2' } },
    stringing: { name: 'Boxwood stringing, 1.5 mm', dimension: 'length', unit: 'm', packs: { length: '1 m' } },
    oak: { name: 'Oak strip, 14 x 8 mm', dimension: 'length', unit: 'm', packs: { length: '1 m' }, hazards: ['dust'] },
    canvas: { name: 'Linen canvas, unbleached', dimension: 'area', unit: 'm2' },
    bead: { name: 'Walnut cock bead, 10 x 3 mm', dimension: 'length', unit: 'm', packs: { length: '1 m' } },
    pin: { name: 'Brass veneer pin, 12 mm', dimension: 'count', unit: 'piece', packs: { box: '250' } },
    escutcheonPin: { name: 'Brass escutcheon pin', dimension: 'count', unit: 'piece', packs: { bag: '20' } },
    paste: { name: 'Brass cleaning paste', dimension: 'mass', unit: 'g', packs: { tube: '100 g' } },
    shellac: { name: 'Shellac flakes, button', dimension: 'mass', unit: 'g', packs: { bag: '250 g' } },
    alcohol: { name: 'Polisher’s alcohol', dimension: 'volume', unit: 'ml', packs: { bottle: '1 l' }, hazards: ['solvent'] },
    pumice: { name: 'Pumice, finest', dimension: 'mass', unit: 'g', packs: { jar: '150 g' } },
    leather: { name: 'Leather skiver, green', dimension: 'area', unit: 'm2', packs: { skin: '0.55 m2' } },
    wheat: { name: 'Wheat paste, dry', dimension: 'mass', unit: 'g', packs: { packet: '250 g' } },
    wax: { name: 'Beeswax polish', dimension: 'mass', unit: 'g', packs: { tin: '150 g' } },
  },
  entries: [...veneerDays, ...finishDays],
};
