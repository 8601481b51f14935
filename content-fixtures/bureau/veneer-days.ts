import type { DemoEntry } from '../demo-build.ts';
import { bold, bought, bullets, cost, h, italic, notMine, p, photos, quote, steps, straight, table, time, took, toShed, toShelf, use, used, waited, waste, wentWrong, worked } from '../entry-words.ts';

// What was wrong with it, and the fall front closed.

const arrived: DemoEntry = {
  key: 'bu01', by: 'restorer', daysAgo: 95, stage: 'Looking and cleaning',
  title: 'What it is, and everything that is wrong with it',
  lead: 'Bought for the figure of its walnut and carried up four flights. Before any mending I wrote down everything that is broken and everything that only looks broken.',
  content: [
    photos({ 'bureau-arrived.jpg': 'In its corner on the first evening. The handle holds by one pin, and the ring on top is from a flowerpot.' }, 'cover'),
    p('Solid pine under saw-cut veneer, oak drawer sides, hand cut dovetails with a scribed line. Nothing says who made it. The saw marks inside are straight and the screws have hand-filed slots, so I call it about 1880 and leave it there.'),
    cost(['Two men and four flights of stairs', 'carriage', '35.00']),
    h('The list'),
    table(
      ['What', 'How bad'],
      ['Fall front', 'split across, veneer lifted, a piece gone'],
      ['Drawers', 'all eight running edges hollow'],
      ['Bottoms', 'two split, one held by a floor tile'],
      ['Cock beading', 'four lengths missing'],
      ['Brasses', 'all there, black'],
      ['Near foot', 'a corner gone, the piece was in a drawer'],
      ['Polish', 'shellac, then wax, then something brown in a hurry'],
    ),
    photos({ 'bureau-fall-split.jpg': 'The split follows the joint in the pine beneath. The wood has shrunk, and the veneer had nowhere to go.' }),
    h('Cleaning, and what not to clean with'),
    p('A pea of soft soap in a litre of lukewarm water, a cloth wrung nearly dry, a hand’s breadth at a time, and dried at once. The brown layer came off on the cloth. Water that stands lifts veneer; a damp cloth that keeps moving does not.'),
    used(use('soap', '40 g', 'opened'), use('cloth', '0.5 m²', 'opened')),
    time(took('marlow', '3 h', 'looking and writing down', 'setup'), took('marlow', '2 h 30 min', 'cleaning', 'setup')),
    bought(
      { supplier: 'Paint shop on the corner', basis: 'memory' },
      toShelf('soap', '1 jar', '7.90'), toShelf('cloth', '1 bundle', '12.00'), toShed('linseed', '1 bottle', '8.40'), notMine('Wall paint for the stairwell', '24.00'),
    ),
    p('I glued the corner back on the foot the same night with the piece from the drawer. It is the only job here that took ten minutes.'),
  ],
};

const glueDay: DemoEntry = {
  key: 'bu02', by: 'restorer', daysAgo: 86, daysAgoTo: 85, stage: 'Fall front',
  title: 'Cooking glue, once too hot and once right',
  lead: 'The lifted veneer is down again with the glue it was laid with. The first pot went to waste because I answered the telephone.',
  work: { amount: '0.42', unit: 'm2', kind: 'veneer laid again' },
  content: [
    h('The pot'),
    p('Pearls soaked over night in cold water, just covered; warmed in the double pot until it runs off the brush in a thread. About 60 degrees and never more than 65. It should smell of a stable, not of a fire.'),
    photos({ 'bureau-glue-pot.jpg': 'The water in the outer pot must never boil. Mine did, once.' }),
    wentWrong('Leaving the pot on the ring for the length of one telephone call.', 'It boiled for some minutes. A drop between finger and thumb no longer pulled threads, and cooked glue does not come back.', 'Take the pot off whenever you leave the room. A cheap thermometer on a string is worth more than a good nose.'),
    h('The cauls'),
    p('Two boards planed flat, warmed by the stove until I could only just hold them. Old glue in the gap was wetted with hot water and worked in with a palette knife: hide glue sticks to hide glue, so it need not be scraped out. Then fresh glue, newspaper, warm cauls, clamps from the middle outwards.'),
    used(use('glue', '90 g'), waste('glue', '60 g')),
    photos({ 'bureau-cauls.jpg': 'Four clamps and two slightly crowned bearers, so that the middle is pressed first.' }, 'cover'),
    steps('Dry run with no glue, and count the clamps.', 'Warm the cauls before the glue, not after.', 'Newspaper between, or the caul joins the furniture.', 'Leave it alone for a night and half a day.'),
    time(took('marlow', '4 h', 'glue and clamps'), took('Tove', '1 h', 'second pair of hands'), took('marlow', '1 h 30 min', 'cauls and dry run', 'setup'), waited('20 h', 'under the cauls')),
    bought({ supplier: 'Polishers’ supplies', delivery: '5.90' }, toShelf('glue', '1 bag', '18.50'), straight('Glue thermometer', '11.00', 'tool')),
    worked('Going over it with a fingernail the next day and listening.', 'One hollow note, the size of a coin, near the lock. A slit along the grain, a little glue, a warm iron through paper, and it was gone.'),
  ],
};

const stringing: DemoEntry = {
  key: 'bu03', by: 'restorer', daysAgo: 74, daysAgoTo: 72, stage: 'Fall front',
  title: 'A sliver of walnut and four metres of box',
  lead: 'The split is closed with a tapered sliver cut from veneer of nearly the same figure, and the missing boxwood line runs right round the fall again.',
  work: { amount: '4.6', unit: 'm', kind: 'stringing let in' },
  content: [
    p('I had three sheets sent to look at, since a photograph does not tell you which way the light runs. Veneer changes colour as you turn it round: it must be laid the way the old one lies or it will always be a patch.'),
    bought(
      { supplier: 'Veneer merchant abroad', daysAgo: 79, currency: 'GBP', rate: '1.17', delivery: '9.80', paperTotal: '73.40' },
      toShelf('veneer', '3 sheets', '42.00'), toShelf('stringing', '12 lengths', '21.60'),
    ),
    h('The sliver'),
    p('The gap was 2 mm at the lock and nothing at the hinge. I cut the new piece as a long wedge with a knife against a steel edge, a shade too wide, and pushed it in from the wide end until it was tight. Glue, paper, a warm block. When it was dry, a scraper took it down level.'),
    used(use('veneer', '0.03 m²', 'whole'), waste('veneer', '0.02 m²', 'whole')),
    photos({ 'bureau-fall-mended.jpg': 'The split ran through here. From the chair you do not see it; with a lamp from the side you do, and so you should.' }, 'cover'),
    h('The line'),
    p('The old groove was full of wax and sawdust. I cleaned it with a scratch stock made from a broken saw blade filed to the width of the line, and cut the last 900 mm new where the veneer had been patched.'),
    photos({ 'bureau-stringing.jpg': 'Let in as far as the corner. The scratch stock wants many light pulls, and the first three decide.' }),
    used(use('stringing', '4.6 m'), waste('stringing', '800 mm'), use('glue', '40 g')),
    wentWrong('Pulling the scratch stock the same way along the whole length.', 'Where the grain rose it dug in and tore the edge of the groove. It cost a patch as long as a finger, and 800 mm of line pulled out and broken.', 'Work from both ends towards the middle, always down the grain.'),
    time(took('marlow', '7 h', 'groove and line'), took('marlow', '3 h 30 min', 'sliver', 'setup'), waited('12 h', 'glue')),
    bullets(
      [bold('Mitres: '), 'cut with a chisel on the piece itself, not on the bench.'],
      [bold('Too thick: '), 'leave it proud and scrape it down when the glue is dry. Sanded flush at once, it sinks.'],
      [bold('Colour: '), 'box goes yellow by itself. ', italic('Do not stain it.')],
    ),
    quote('Nobody ever spoiled a panel by making one pass fewer.'),
  ],
};

export const veneerDays: readonly DemoEntry[] = [arrived, glueDay, stringing];
