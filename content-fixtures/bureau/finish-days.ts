import type { DemoEntry } from '../demo-build.ts';
import { bought, bullets, caution, cost, fromShed, h, p, photos, quote, steps, straight, table, time, took, toShelf, use, used, waited, waste, wentWrong, worked } from '../entry-words.ts';

// Drawers, brass, polish, and the inside.

const runners: DemoEntry = {
  key: 'bu04', by: 'restorer', daysAgo: 60, daysAgoTo: 59, stage: 'Drawers and beading',
  title: 'Eight runners, and two bottoms closed',
  lead: 'A hundred and forty years of pulling had worn up to five millimetres off the drawer sides. They have new oak edges, and they slide with one hand again.',
  work: { amount: '8', unit: 'piece', kind: 'drawer runner' },
  content: [
    p('A drawer wears hollow at the back of its own lower edge, and then it drops, rides up at the front and grinds the rail it sits on. New runners in the carcase do not help while the side is a banana, so the sides come first.'),
    bought(
      { supplier: 'Joiner’s yard', discount: '2.00' },
      toShelf('oak', '5 lengths', '21.00'), toShelf('canvas', '0.5 m²', '8.40'),
    ),
    photos({ 'bureau-runner-worn.jpg': 'The rule touches only at the ends. That gap is 5 mm on this one.' }),
    table(['Drawer', 'Left', 'Right'], ['Top', '2.5 mm', '3 mm'], ['Second', '4 mm', '5 mm'], ['Third', '3.5 mm', '4.5 mm'], ['Bottom', '3 mm', '3 mm']),
    steps(
      'Scribe a line parallel to the top edge, just above the deepest wear.',
      'Plane down to it: a straight slope is quicker to fit than a straight step.',
      'Glue on an oak strip over long, over high and over wide.',
      'When it is dry, plane it to the old height at the front, where nothing had worn.',
    ),
    used(use('oak', '3.4 m'), waste('oak', '450 mm'), use('glue', '70 g')),
    photos({ 'bureau-runner-new.jpg': 'Pale now. It will be brown in fifty years, and that is soon enough.' }, 'cover'),
    wentWrong('Planing the first strip flush while the glue was only eight hours old.', 'The plane lifted 450 mm of it clean off, and the face had to be scraped and done again.', 'A night and a day in a cool room. Hide glue grips at once but it takes its time to be hard.'),
    h('Bottoms'),
    p('Two had shrunk and split along the joint. A fillet of old pine in the gap, linen canvas soaked in thin glue across the underside, and the blocks along the front rubbed back on. The bottom stays free at the back, as it was made, so that it can shrink again without splitting.'),
    photos({ 'bureau-drawer-bottom.jpg': 'Canvas while it is still wet. It pulls itself flat as it dries.' }),
    used(use('canvas', '0.12 m²', 'whole'), use('glue', '60 g', 'whole')),
    time(took('marlow', '6 h 30 min', 'runners'), took('Tove', '2 h', 'holding and planing'), took('marlow', '2 h', 'bottoms', 'setup'), waited('24 h', 'glue')),
  ],
};

const beading: DemoEntry = {
  key: 'bu05', by: 'restorer', daysAgo: 38, stage: 'Drawers and beading',
  title: 'Cock beading, mitre by mitre, and black brass',
  lead: 'Nearly seven metres of new bead round the drawer fronts, and three escutcheons brought back as far as I want them to come.',
  work: { amount: '6.8', unit: 'm', kind: 'cock bead fitted' },
  content: [
    p('The bead stands 2 mm proud of the front and takes the knocks that the veneer would otherwise take. It had done so: four lengths were gone, and most of the rest were held by polish alone. I took them all off and kept the best as patterns.'),
    bought(
      { supplier: 'Polishers’ supplies', daysAgo: 45, delivery: '6.90' },
      toShelf('bead', '9 lengths', '27.90'), toShelf('pin', '1 box', '6.20'), toShelf('escutcheonPin', '1 bag', '4.50'), toShelf('paste', '1 tube', '5.80'),
    ),
    photos({ 'bureau-cock-bead.jpg': 'Three sides on. Tape is enough of a clamp while the glue grabs, and the pins only keep it from sliding.' }, 'cover'),
    used(use('bead', '6.8 m'), waste('bead', '700 mm'), use('pin', '48'), use('glue', '50 g')),
    bullets('Mitre the top length first, both ends, and fit the sides to it.', 'Cut a hair long and spring it in.', 'Blunt the pins before driving, or the bead splits.', 'Round the edge last, with the drawer in its place.'),
    wentWrong('Cutting all the mitres in one batch from a list of lengths.', 'Two drawers are not square, one of them by 3 mm. 700 mm of bead had mitres for a drawer that does not exist.', 'Mark every piece on its own drawer and number it.'),
    time(took('marlow', '6 h', 'mitres and fitting'), took('marlow', '40 min', 'mitre block', 'setup'), waited('10 h', 'glue')),
    h('Brass'),
    p('Paste, a soft cloth and patience, and then I stopped. The hollows stay dark, because a bureau with brass like a new tap looks like a bureau in a shop. Six of the little pins had been replaced with steel tacks, and those have gone.'),
    photos({ 'bureau-escutcheons.jpg': 'Before, half way, and where I stopped.' }),
    used(use('paste', '15 g', 'opened'), use('escutcheonPin', '6', 'whole')),
    time(took('Tove', '1 h 30 min', 'brass', 'setup')),
    cost(['Key cut for the fall lock', 'service', '28.00']),
  ],
};

const polish: DemoEntry = {
  key: 'bu06', by: 'restorer', daysAgo: 20, daysAgoTo: 14, stage: 'Polish',
  title: 'Seven days with a rubber the size of a walnut',
  lead: 'French polishing is an hour a day for a week. On the third day it rained and I learned why the old books say to light the stove.',
  work: { amount: '2.1', unit: 'm2', kind: 'surface polished' },
  content: [
    caution('solvent'),
    h('Bodying up'),
    p('Flakes in alcohol over night, a hundred grams to the half litre, strained through a stocking. Pumice and a nearly dry rubber first to fill the grain, then figures of eight, then straight strokes off the ends. The rubber must never stop on the work: where it stops, it takes the polish with it. One drop of oil on its face when it begins to drag, and no more, since all of that oil has to come out again on the last day.'),
    photos({ 'bureau-polish.jpg': 'Half way across the top. The dull half has had one session fewer.' }, 'cover'),
    used(
      use('shellac', '180 g'), use('alcohol', '900 ml'), waste('alcohol', '100 ml'), waste('shellac', '20 g'), fromShed(use('linseed', '15 ml', 'whole')), use('pumice', '20 g', 'opened'), use('cloth', '0.3 m²', 'opened'),
    ),
    caution('oily-rags'),
    wentWrong('A session on a wet afternoon with the window open.', 'It bloomed: a white breath inside the polish that no cloth takes off. What was mixed had drawn water as well, and was poured away.', 'Stove lit, window shut until the rubber is put away, and no polishing when the washing does not dry.'),
    worked('A rubber with nothing in it but a few drops of alcohol, over the bloom, next dry morning.', 'The white went in two passes and took no colour with it.'),
    table(['Day', 'What', 'Time'], ['1', 'pumice and first body', '2 h'], ['2 to 5', 'body, an hour a day', '4 h'], ['6', 'let it sink', 'none'], ['7', 'spirit off', '1 h 30 min']),
    time(took('marlow', '7 h 30 min', 'polishing'), took('marlow', '1 h 15 min', 'mixing and straining', 'setup'), waited('96 h', 'between sessions')),
    bought(
      { supplier: 'Polishers’ supplies', daysAgo: 23, delivery: '6.90', discount: '3.00' },
      toShelf('shellac', '1 bag', '19.80'), toShelf('alcohol', '1 bottle', '11.50'), toShelf('pumice', '1 jar', '6.40'), straight('Wadding for rubbers', '4.20', 'consumable'),
    ),
    quote('If it looks finished, you have one more day.'),
  ],
};

const inside: DemoEntry = {
  key: 'bu07', by: 'restorer', daysAgo: 4, daysAgoTo: 2, stage: 'Inside',
  title: 'Green leather, and it stands in its corner',
  lead: 'The writing surface is laid, the pigeonholes are waxed and the fall comes down on its lopers without a sound. That was the last thing on the list.',
  work: { amount: '1', unit: 'piece', kind: 'writing surface laid' },
  content: [
    p('The old cloth had been stuck with something rubbery that came off in strings. Under it the recess was clean and 0.8 mm deep, which is exactly a skiver.'),
    steps(
      'Paste the wood, not the leather, and wait until it is tacky.',
      'Lay from the middle, smooth outwards with the side of the hand. Do not stretch it: it will want it back.',
      'Press it into the edge with a bone folder and leave it for an hour.',
      'Cut along the edge with a new blade, one pull a side, while it is still damp.',
    ),
    used(use('leather', '0.36 m²'), waste('leather', '0.05 m²'), use('wheat', '60 g')),
    photos({ 'bureau-open.jpg': 'Open on its lopers. The pigeonholes are the pale wood they always were, with one coat of wax.' }),
    wentWrong('Trimming the first edge with yesterday’s blade.', 'It dragged the damp leather into a lip, and that strip had to be laid again from the offcut.', 'A new blade for each side. They cost less than leather.'),
    time(took('marlow', '2 h 30 min', 'laying leather'), took('marlow', '1 h 30 min', 'old glue out, wax', 'setup'), took('Tove', '1 h', 'carrying and hinges', 'setup'), waited('12 h', 'paste')),
    used(use('wax', '40 g', 'whole')),
    bought(
      { supplier: 'Leather merchant', daysAgo: 12, delivery: '5.50' },
      toShelf('leather', '1 skin', '58.00'), toShelf('wheat', '1 packet', '4.80'), toShelf('wax', '1 tin', '9.20'),
    ),
    h('Finished, with three things left wrong on purpose'),
    bullets('The scratch on the left side, which is somebody’s initials.', 'The ink stain in the second pigeonhole.', 'The split, which you can find with a lamp if you look for it.'),
    photos({ 'bureau-finished.jpg': 'The same corner. The flowerpot has been given a table of its own.' }, 'cover'),
    p('If it comes apart again, hot water and a warm knife will open every joint I made.'),
  ],
};

export const finishDays: readonly DemoEntry[] = [runners, beading, polish, inside];
