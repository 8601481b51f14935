import type { DemoEntry } from '../demo-build.ts';
import { bought, bullets, caution, cost, h, p, photos, quote, steps, table, time, took, toShelf, use, used, waited, waste, wentWrong, worked } from '../entry-words.ts';

// What the foot moves: treadle, pitman, belt; and the first turning.

const treadle: DemoEntry = {
  key: 'lt06', by: 'restorer', daysAgo: 45, daysAgoTo: 43, stage: 'Treadle and drive',
  title: 'Sewing cast iron: fourteen pins and three keys',
  lead: 'The treadle was cracked two thirds of the way across. Welding would have been quicker, and then it would have cracked beside the weld. So it is stitched, cold.',
  work: { amount: '14', unit: 'piece', kind: 'stitch pin set' },
  content: [
    p('Marlow writing, since it was my drill. Cast iron pulls itself apart as a weld cools, unless the whole casting is brought up to red heat in a furnace, which neither of us has. Stitching puts no heat in at all: overlapping threaded pins along the crack, keys across it, all peened and filed flush.'),
    photos({ 'lathe-treadle-crack.jpg': 'Ground to a V so that we could see the end of it, with a hole drilled just past the end to stop it there.' }),
    steps(
      'Find the true end of the crack with chalk and a wipe of thin oil, and drill it.',
      'Drill, tap and screw in a pin; cut it off proud; drill the next so that it bites a third into the last.',
      'Mill the slots for the keys across the crack and drive them in.',
      'Peen everything, file flush, and bolt a plate over the back.',
    ),
    used(use('pin', '14'), waste('pin', '2'), use('key', '3'), use('plate', '0.4 ft²', 'whole'), use('bolt', '4', 'whole')),
    wentWrong('Screwing the pins in until they would go no further.', 'Two twisted off at the nick before they had bottomed, and each had to be drilled out again.', 'Oil the thread, stop at firm, and let the nick break when you bend it, not when you turn it.'),
    photos({ 'lathe-treadle-stitched.jpg': 'Filed flush. The plate is on the back, where a foot does not see it.' }, 'cover'),
    time(took('marlow', '6 h 30 min', 'drilling, tapping, peening'), took('ines', '3 h', 'filing'), took('marlow', '1 h', 'drill jig', 'setup')),
    cost(['Magnetic drill, one day', 'hire', '38.00']),
    bought(
      { supplier: 'Casting repair supplies', daysAgo: 52, delivery: '9.60', tax: '7.81' },
      toShelf('pin', '1 bag', '62.00'), toShelf('key', '1 card', '46.25'), toShelf('plate', '1 ft²', '14.60'), toShelf('bolt', '4', '7.40'),
    ),
    h('Does it hold'),
    p('We hung it by its pivots and stood on it, one after the other and then both. It gave a sixteenth and came back. Tapped, it rings like one piece, which is more than it did when it was two thirds of one.'),
  ],
};

const pitmanAndBelt: DemoEntry = {
  key: 'lt07', by: 'crew', daysAgo: 24, daysAgoTo: 23, stage: 'Treadle and drive',
  title: 'A pitman of ash, and seven feet of leather',
  lead: 'The rod between treadle and crank had been mended with fence wire. The new one is ash, with the old iron straps and a bronze bush, and the belt is laced by hand.',
  work: { amount: '1', unit: 'piece', kind: 'pitman made' },
  content: [
    p('It is only a stick with a hole in each end, but it is pulled and pushed fifty times a minute, so the grain has to run the whole way. I split the blank instead of sawing it to find out where the grain wanted to go.'),
    photos({ 'lathe-pitman.jpg': 'The old one had broken at the strap, where the wire was. The new one is a little fuller there.' }, 'cover'),
    used(use('ash', '1.5 board feet'), waste('ash', '1.5 board feet'), use('bronze', '1 3/4 in'), use('linseed', '3 fl oz', 'whole')),
    wentWrong('Taking the first blank from the clear end of the board because it was the pretty end.', 'It split with a twist of half an inch over its length. It is now two tool handles and some kindling.', 'Look at the end grain and at how the bark ran, not at the face.'),
    caution('oily-rags'),
    h('The belt'),
    p('Flat leather, one inch, run with the smooth side on the pulleys. Six holes in each end, butted, never lapped: a lap thumps at every turn, and you feel it in your knee.'),
    photos({ 'lathe-belt-laced.jpg': 'Half way across. The lace runs straight on the pulley side and crosses on the outside.' }),
    used(use('belt', '7 ft', 'whole'), use('lace', '40 in', 'whole')),
    bullets('Cut the ends with a square, or it will walk off the pulley.', 'Punch the holes smaller than the lace.', 'Make it an inch short for every four feet, and stretch it on.'),
    time(took('ines', '4 h 30 min', 'pitman'), took('marlow', '1 h 30 min', 'bronze bush'), took('ines', '1 h 30 min', 'belt', 'setup'), waited('24 h', 'oil drying in')),
    bought(
      { supplier: 'Sawmill on the hill' }, toShelf('ash', '5 board feet', '43.75'),
    ),
    bought(
      { supplier: 'Mill supply house', daysAgo: 27, delivery: '12.60', tax: '6.10' },
      toShelf('bronze', '1 piece', '34.00'), toShelf('belt', '8 ft', '47.20'), toShelf('lace', '1 coil', '7.50'), toShelf('linseed', '1 can', '12.99'),
    ),
    quote('Leather remembers. Leave it slack over night or it will be slack for good.'),
  ],
};

const running: DemoEntry = {
  key: 'lt08', by: 'crew', daysAgo: 6, daysAgoTo: 5, stage: 'Paint and proving',
  title: 'Black paint, and then it runs',
  lead: 'Legs and treadle are painted, the bearings are filled with oil, and the first three beads have been cut. It makes a sound like somebody breathing.',
  work: { amount: '26', unit: 'ft2', kind: 'casting painted' },
  content: [
    p('Plain black, two coats, by brush. The casting marks stay visible under enamel as they never would under filler, and I like to see where the sand was. The bed and the spindle stay bright and get oil.'),
    used(use('enamel', '2 1/2 US cups'), waste('enamel', '1/4 US cup')),
    caution('solvent'),
    time(took('ines', '3 h', 'two coats'), took('marlow', '1 h 30 min', 'legs'), took('ines', '1 h', 'masking', 'setup'), waited('16 h', 'between coats')),
    wentWrong('Painting the treadle where it hung.', 'The last quarter cup ran to the low corner and dried as a bag of skin. Scraped off, done again.', 'Lay every part so that the face you paint is level, and be patient about the other side.'),
    bought({ supplier: 'Farm supply store', daysAgo: 9, tax: '1.67' }, toShelf('enamel', '1 can', '27.80')),
    h('First turning'),
    p('A cup of oil between the two bearings, belt on, and a push of the rim with the hand to get it over the top. After that the foot finds the time by itself. A length of ash, roughed down, a cylinder, three beads, and not a trace of chatter.'),
    used(use('spindleOil', '1 US cup', 'whole')),
    photos({ 'lathe-test-piece.jpg': 'Three beads. The middle one is the good one.' }),
    table(['What', 'Found'], ['Spindle, end play', '0.002 in'], ['Spindle, lift under a pry bar', '0.003 in'], ['Turns for one tread', '9'], ['Bearings after half an hour', 'warm as a hand']),
    worked('Running it for ten minutes with no work in it, twice, and changing the oil in between.', 'The first oil came out grey with white metal, the second clean.'),
    photos({ 'lathe-running.jpg': 'The same wall. The nettles have been asked to leave.' }, 'cover'),
    p('Still to do: the tool rest wants a new wedge, and the wall wants a coat hook for my apron.'),
    time(took('ines', '1 h 20 min', 'running in and first turning', 'setup')),
  ],
};

export const driveDays: readonly DemoEntry[] = [treadle, pitmanAndBelt, running];
