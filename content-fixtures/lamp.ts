import type { DemoBuild } from './demo-build.ts';
import { cost, p, time, took } from './entry-words.ts';

/** A build that nobody but its restorer sees. */
export const lamp: DemoBuild = {
  owner: 'restorer', crew: [], startedDaysAgo: 34, kind: 'other',
  title: 'A brass reading lamp',
  lead: 'A present, so it stays private until it has been given.',
  year: 1930, yearAbout: true, stands: 'working',
  currency: 'GBP', measures: 'imperial', method: 'fifo', visibility: 'private', costsShown: false,
  stages: [{ title: 'Wiring and brass', money: '60', time: '8 h' }],
  materials: {},
  entries: [{
    key: 'lp01', by: 'restorer', daysAgo: 34, stage: 'Wiring and brass',
    title: 'Old flex out',
    lead: 'The cloth had gone to powder and the copper was bare at the switch. Cut off, taken out and put in the bin before anybody could try it.',
    content: [
      p('The stem unscrews left-handed, which took me the first half hour to believe. The new flex is left for the electrician, who will also make the earth good.'),
      cost(['Electrician, wiring and test', 'service', '30.00']),
      time(took('marlow', '1 h 20 min', 'taking apart', 'setup')),
    ],
  }],
};
