import type { DemoEntry } from '../demo-build.ts';
import { bold, bought, bullets, caution, cost, h, italic, link, p, photos, quote, steps, straight, table, time, took, toShelf, use, used, waited, waste, wentWrong, worked } from '../entry-words.ts';

// Getting it home, the rust off, and the headstock to run true.

const found: DemoEntry = {
  key: 'lt01', by: 'crew', daysAgo: 118, daysAgoTo: 115, stage: 'Rescue and rust',
  title: 'Nettles, a seized flywheel and four evenings of oil',
  lead: 'It had a vine through the flywheel and a wasp nest in the headstock. Nothing turned. By the fourth evening one thing did.',
  work: { amount: '1', unit: 'piece', kind: 'flywheel freed' },
  content: [
    photos({ 'lathe-in-the-yard.jpg': 'Where it stood. The treadle hangs by one pin and the belt is long gone.' }, 'cover'),
    p('The man whose yard it was wanted the wall back more than he wanted money, so the price is not in these figures. What is in them is the lift: the bed and legs weigh more than two people should pretend to carry.'),
    cost(['Engine hoist and truck, half a day', 'hire', '65.00']),
    caution('lifting'),
    h('Freeing the wheel'),
    p('The crank runs in two plain bearings with an oil hole on top. Both holes were packed with rust and sawdust. I picked them out with wire, built a little dam of clay round each and kept it full of penetrating oil, morning and night.'),
    photos({ 'lathe-flywheel-seized.jpg': 'The wedge keeps a gentle push on the rim. The dark ring is oil that has found its way through.' }),
    bought({ supplier: 'Farm supply store', tax: '2.04' }, toShelf('penetrating', '1 can', '34.00')),
    used(use('penetrating', '3 US cups')),
    steps(
      'Clear the oil holes, or you are only wetting the paint.',
      'Oil, and a hardwood wedge under a spoke for a steady push. No hammer on cast iron.',
      'Warm the bearing cap with a heat gun until it is too hot to hold, then oil again.',
      'Rock it. Half an inch is a victory. Oil again, and leave it alone until tomorrow.',
    ),
    worked('Warming only the cap, not the shaft.', 'On the fourth evening there was a creak, half an inch of movement, then a quarter turn. Nothing was forced and nothing cracked.'),
    wentWrong('Letting go of the rim once it was free.', 'Ninety pounds of wheel swung back by itself and took the wedge out of my hand.', 'Rope the rim to the leg whenever you are not turning it.'),
    caution('stored-energy'),
    time(took('ines', '3 h 30 min', 'oil holes, wedge and heat'), took('marlow', '2 h', 'lift and truck', 'setup'), took('ines', '2 h', 'lift and truck', 'setup'), waited('72 h', 'soaking')),
  ],
};

const electrolysis: DemoEntry = {
  key: 'lt02', by: 'crew', daysAgo: 104, daysAgoTo: 101, stage: 'Rescue and rust',
  title: 'Thirty gallons of washing soda',
  lead: 'Seven parts went through the tub in three days and came out grey and clean. The first thirty gallons went through a split in the tub and into the flower bed.',
  work: { amount: '7', unit: 'piece', kind: 'part derusted' },
  content: [
    p('A plastic tub, water, a cup of washing soda to every five gallons, the part on the minus and plain steel on the plus. It lifts rust and leaves iron, which no grinder can say. The method is as the ', link('conservation file on electrolytic cleaning', 'https://nautarch.tamu.edu/CRL/conservationmanual/'), ' tells it, only with a battery charger.'),
    bought(
      { supplier: 'Farm supply store', tax: '3.00' },
      toShelf('soda', '2 x 55 oz', '10.96'), toShelf('anode', '1 bar', '7.80'), toShelf('spindleOil', '1 jug', '31.50'),
    ),
    caution('electrolysis'),
    photos({ 'lathe-electrolysis.jpg': 'The handwheel between its plates. Fizz all over means the connection is good.' }, 'cover'),
    used(use('soda', '6 US cups'), waste('soda', '6 US cups'), use('anode', '6 ft')),
    wentWrong('Filling the tub before looking at the bottom of it.', 'It had a split along one foot. Thirty gallons and six cups of soda were gone by breakfast.', 'Fill with plain water, leave it an hour on dry cardboard, and only then add the soda.'),
    h('What each part took'),
    table(
      ['Part', 'In the tub', 'Scrubbing'],
      ['Tailstock handwheel', '14 h', '20 min'],
      ['Tool rest and banjo', '16 h', '25 min'],
      ['Tailstock body', '20 h', '40 min'],
      ['Four clamp plates, together', '10 h', '35 min'],
    ),
    photos({ 'lathe-handwheel.jpg': 'Half scrubbed, so that you can see what the tub leaves behind: black powder that a brush takes off.' }),
    p('Bare iron out of the tub starts to rust while you watch, so each part was rinsed, dried in a warm oven and wiped with spindle oil within the half hour. I did not do that with the first clamp plate, and by supper it was orange again. It went back in for an hour and nobody was told.'),
    used(use('spindleOil', '1/2 US cup')),
    time(took('ines', '2 h', 'scrubbing and oiling'), took('ines', '2 h 15 min', 'tub, anodes and leads', 'setup'), waited('60 h', 'in the tub')),
    worked('Turning the part over half way through.', 'It works in line of sight: the side facing the anode cleans first. Turned at half time, both sides came out alike.', 'Use four anodes, one in each corner, and leave the part alone.'),
    p('The water is as it was on the first day, only browner. I have left the tub standing for the lathe’s other tool rest, if that ever turns up.'),
  ],
};

const headstock: DemoEntry = {
  key: 'lt03', by: 'crew', daysAgo: 90, stage: 'Bearings',
  title: 'Headstock apart: roofing lead, and a bed that is better than it looks',
  lead: 'The bearing had been patched with something soft and grey that was never meant to carry a spindle. The bed, which I had been afraid of, is within four thousandths over most of its length.',
  content: [
    photos({ 'lathe-bearing-before.jpg': 'The lower half as it came out. The bright patch at the edge is roofing lead; a thumbnail marks it.' }, 'cover'),
    p('Two caps, four bolts, and the spindle lifts out with its pulley. The white metal is scored in rings all the way round, a piece has gone from the front edge, and the oil groove was full of something like felt. It cannot be scraped true, since there is not enough left, so it has to be poured again.'),
    h('The bed'),
    p('I scrubbed the ways with kerosene, laid the long straight edge on and worked along with feelers. Chalk where they went in.'),
    photos({ 'lathe-bed-straightedge.jpg': 'Chalk where it is low. The worst is just where you would expect, under forty years of tool rest.' }),
    table(
      ['Inches from the headstock', 'Front way', 'Back way'],
      ['6', '0.002', '0.001'],
      ['12', '0.006', '0.003'],
      ['18', '0.004', '0.002'],
      ['24 to 40', '0.001', 'will not go in'],
    ),
    p('For turning wood that is as good as new. I will leave it alone, and ', bold('leaving it alone'), ' is the best decision of the month.'),
    used(use('blue', '1 tsp', 'opened')),
    time(took('ines', '4 h', 'stripping and measuring', 'setup'), took('marlow', '1 h 30 min', 'straight edge', 'setup')),
    bought(
      { supplier: 'Bearing metal by mail', daysAgo: 93, delivery: '18.40', tax: '8.79' },
      toShelf('whiteMetal', '2 ingots', '118.00'), toShelf('clay', '1 tub', '19.50'), toShelf('blue', '1 tube', '8.95'),
    ),
    quote('If you can see that it is low, it is not low enough to matter. If you can feel it through the gouge, then it is.'),
  ],
};

const pour: DemoEntry = {
  key: 'lt04', by: 'crew', daysAgo: 74, stage: 'Bearings',
  title: 'Pouring the bearings, the second time properly',
  lead: 'The first pour froze in ripples before it had filled. The second was one clean stream, and it rang when I tapped it.',
  work: { amount: '2', unit: 'piece', kind: 'bearing poured' },
  content: [
    caution('molten-metal'),
    p('Everything that would meet the metal was dried on the stove for two hours first: ladle, mandrel, headstock, even the stick I skim with. We stood on sand, in leather, with the doors open and nothing wet inside ten feet.'),
    steps(
      'Melt the old metal out and save it apart: nobody knows what is in it.',
      'Scrub the shells, smoke the mandrel with a candle so that nothing sticks to it, and set it on shims.',
      'Dam both ends with clay. Leave a spout twice as wide as seems needed.',
      'Heat until a pine splinter chars at once in the ladle, 800 °F by the thermometer, and pour without stopping.',
    ),
    photos({ 'lathe-bearing-pour.jpg': 'The second pour. One stream, no pause, and past the top so that it can shrink.' }, 'cover'),
    wentWrong('Pouring with the mandrel only hand warm.', 'The metal froze in ripples half way round, what is called a cold shut. It all had to come out, and 0.6 lb went off as dross in melting it again.', 'Warm mandrel and headstock until a 250 °F marking crayon melts on both, and check again just before the pour.'),
    used(use('whiteMetal', '5.4 lb'), waste('whiteMetal', '0.6 lb'), use('clay', '2 lb'), use('fuelGas', '2', 'whole')),
    time(took('ines', '3 h', 'heating and pouring'), took('marlow', '2 h', 'ladle'), took('ines', '3 h 30 min', 'drying, smoke and dams', 'setup'), waited('4 h', 'cooling')),
    cost(['Mandrel turned to size', 'service', '45.00']),
    bought({ supplier: 'Hardware store', tax: '0.84' }, toShelf('fuelGas', '2', '13.94')),
    p('Broken out of the clay the surface is the colour of a nickel and closed all over. It is eight thousandths tight on the spindle, as it should be. Next comes the scraper.'),
    caution('hot-work'),
  ],
};

const scraping: DemoEntry = {
  key: 'lt05', by: 'crew', daysAgo: 66, daysAgoTo: 64, stage: 'Bearings',
  title: 'Blue, scrape, blue, scrape',
  lead: 'Three evenings to take eight thousandths off by hand. Two thirds of each half carries now, and the spindle turns with one finger.',
  work: { amount: '2', unit: 'piece', kind: 'bearing scraped' },
  content: [
    p('A smear of blue on the spindle, lay it in, a quarter turn each way, lift it out. What is blue is high. Scrape the blue off, wipe, and do it again. There is no way to hurry it, and after an hour there is no wish to. I counted thirty-one rounds for the front half and twenty-six for the back, and the last five took off next to nothing.'),
    photos({ 'lathe-bearing-blue.jpg': 'The last but one round. Small even spots over two thirds is what you want: one big patch is a spindle riding on a hump.' }, 'cover'),
    bullets(
      ['Cross the direction of the scraper each round, or you make a washboard.'],
      ['Less blue than you think. If it fills the low places, it tells lies.'],
      ['Stop at ', italic('two thirds'), '. The rest is where the oil lives.'],
    ),
    used(use('blue', '1/2 tsp', 'opened'), use('spindleOil', '1/4 US cup')),
    time(took('ines', '8 h', 'scraping'), took('ines', '1 h', 'grinding the scraper', 'setup')),
    worked('Cutting the oil groove before the last three rounds, not after.', 'The edge it raised was scraped away with everything else, and nothing caught.'),
    bought({ supplier: 'Tool dealer at the swap meet', basis: 'memory' }, straight('Curved bearing scraper', '28.00', 'tool')),
    p('With a paper shim under each cap and the bolts down, the spindle runs on for eleven seconds after a spin with the hand. Before, it did not get once round.'),
  ],
};

export const ironDays: readonly DemoEntry[] = [found, electrolysis, headstock, pour, scraping];
