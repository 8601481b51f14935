import type { DemoBuild } from '../demo-build.ts';
import { driveDays } from './drive-days.ts';
import { ironDays } from './iron-days.ts';

export const lathe: DemoBuild = {
  owner: 'crew', crew: ['restorer'], startedDaysAgo: 118, kind: 'machine',
  title: 'A treadle lathe out of the nettles',
  lead: 'A woodturner’s lathe of about 1911, worked by foot. It spent thirty years against a yard wall with a seized flywheel, a cracked treadle and a bearing somebody had tried to mend with roofing lead. It turns now, and it is quieter than I am.',
  year: 1911, yearAbout: true, stands: 'working',
  currency: 'USD', measures: 'us', method: 'average', visibility: 'public', costsShown: true,
  before: 'lathe-in-the-yard.jpg', after: 'lathe-running.jpg',
  stages: [
    { title: 'Rescue and rust', money: '100', time: '24 h', work: { amount: '7', unit: 'piece', kind: 'part derusted' }, done: true },
    { title: 'Bearings', money: '190', time: '26 h', work: { amount: '2', unit: 'piece', kind: 'bearing scraped' }, done: true },
    { title: 'Treadle and drive', money: '250', time: '24 h', done: true },
    { title: 'Paint and proving', money: '40', time: '12 h', work: { amount: '30', unit: 'ft2', kind: 'casting painted' } },
  ],
  materials: {
    penetrating: { name: 'Penetrating oil', dimension: 'volume', unit: 'us-cup', packs: { can: '1 gal' }, hazards: ['solvent'] },
    // Bought by weight, used by the cup. Common practice, no source: about 0.95 g to the millilitre, poured, not pressed.
    soda: { name: 'Washing soda', dimension: 'volume', unit: 'us-cup', ratio: { to: 'mass', amount: '19/20' } },
    anode: { name: 'Plain steel bar, 1/2 in', dimension: 'length', unit: 'ft', packs: { bar: '10 ft' } },
    spindleOil: { name: 'Spindle oil', dimension: 'volume', unit: 'us-cup', packs: { jug: '1 gal' } },
    whiteMetal: { name: 'White metal, tin based', dimension: 'mass', unit: 'lb', packs: { ingot: '5 lb' }, hazards: ['molten-metal'] },
    clay: { name: 'Damming clay', dimension: 'mass', unit: 'lb', packs: { tub: '5 lb' } },
    fuelGas: { name: 'Torch gas cylinder', dimension: 'count', unit: 'piece', hazards: ['hot-work'] },
    blue: { name: 'Marking blue', dimension: 'volume', unit: 'us-tsp', packs: { tube: '2 fl oz' } },
    pin: { name: 'Stitching pin, 1/4 in', dimension: 'count', unit: 'piece', packs: { bag: '20' } },
    key: { name: 'Stitching key', dimension: 'count', unit: 'piece', packs: { card: '5' } },
    plate: { name: 'Steel plate, 1/4 in', dimension: 'area', unit: 'ft2' },
    bolt: { name: 'Square-head bolt, 3/8 in', dimension: 'count', unit: 'piece' },
    ash: { name: 'Ash, rough sawn', dimension: 'timber', unit: 'board-foot', hazards: ['dust'] },
    bronze: { name: 'Bronze bar, 1 1/4 in', dimension: 'length', unit: 'in', packs: { piece: '6 in' } },
    linseed: { name: 'Boiled linseed oil', dimension: 'volume', unit: 'us-fl-oz', packs: { can: '1 pt' }, hazards: ['oily-rags'] },
    belt: { name: 'Flat leather belting, 1 in', dimension: 'length', unit: 'ft' },
    lace: { name: 'Rawhide lace', dimension: 'length', unit: 'in', packs: { coil: '72 in' } },
    enamel: { name: 'Machine enamel, black', dimension: 'volume', unit: 'us-cup', packs: { can: '1 qt' }, hazards: ['solvent'] },
  },
  entries: [...ironDays, ...driveDays],
};
