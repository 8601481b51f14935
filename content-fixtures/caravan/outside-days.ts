import type { DemoEntry } from '../demo-build.ts';
import { bold, bought, bullets, caution, cost, fromShed, h, italic, notMine, onOrder, ownCaution, p, photos, quote, steps, straight, table, time, took, toShelf, use, used, waited, waste, wentWrong, worked } from '../entry-words.ts';

// From the day the barn was free again: wheels, roof, windows, stove, paint.

const runningGear: DemoEntry = {
  key: 'cv05', by: 'restorer', daysAgo: 68, daysAgoTo: 67, stage: 'Running gear',
  title: 'Back in the barn: hubs, grease and red oxide',
  lead: 'Eight weeks later it is where we left it and no wetter. We started at the bottom: both hubs apart, one bearing blue from heat, and the A-frame brushed and primed.',
  work: { amount: '2', unit: 'piece', kind: 'hub rebuilt' },
  content: [
    caution('lifting'),
    p('Four stands on planks, wheels chocked, and a shove from the side before either of us put a hand under it.'),
    h('Bearings'),
    p('The nearside hub had been run dry. The outer race was straw coloured on one side and blue on the other, and the grease behind it had turned to something like toffee. The offside would have lasted, but a kit costs less than a day at the side of a road, so both were done.'),
    photos({ 'caravan-wheel-bearing.jpg': 'The nearside hub. Blue means it has been hotter than any grease will stand.' }),
    steps(
      'Drift the old races out evenly, a tap each side in turn.',
      'Leave the new races in the freezer over night; they drop in.',
      'Pack each taper by hand until grease comes out at the far end of the rollers.',
      'Tighten while turning, back off, then nip up until there is just a trace of rock at the rim.',
    ),
    used(use('bearings', '2'), fromShed(use('grease', '120 g')), use('seal', '2'), waste('seal', '1')),
    wentWrong('Driving the first grease seal home with a hammer and a block.', 'It went in crooked and the lip folded under.', 'Use a socket of nearly the full diameter and press it in with the vice.'),
    time(took('marlow', '5 h', 'hubs and brakes'), took('ines', '3 h', 'packing bearings')),
    h('Frame'),
    p('The rust on the A-frame was honest surface rust. Ines went along it with the wire cup while I did the corners by hand, then one coat of oxide the same evening and one the next morning, and chassis black on the top faces where stones do not reach.'),
    photos({ 'caravan-chassis-primed.jpg': 'One arm brushed, one arm primed. The coupling has been taped, not painted.' }, 'cover'),
    used(use('oxide', '1.4 l', 'whole'), use('chassisBlack', '600 ml', 'whole')),
    caution('solvent'),
    time(took('ines', '4 h', 'wire cup and primer', 'setup'), waited('16 h', 'between coats')),
    bought(
      { supplier: 'Trailer parts by post', delivery: '11.90' },
      toShelf('bearings', '2', '63.00'), toShelf('seal', '3', '12.60'), toShelf('oxide', '1 tin', '34.00'), toShelf('chassisBlack', '1 tin', '18.75'),
    ),
    bought({ supplier: 'Tyre depot', daysAgo: 67 }, toShelf('tyre', '2', '112.00'), straight('Fitting and balancing', '24.00', 'service'), straight('Wire cup brush', '9.80', 'tool')),
    used(use('tyre', '2', 'whole')),
    p('The old tyres had tread enough but were made before I could drive. They went to the depot and did not come back.'),
  ],
};

const roof: DemoEntry = {
  key: 'cv06', by: 'crew', daysAgo: 47, daysAgoTo: 46, stage: 'Skin and roof',
  title: 'Two hundred and twenty-four rivets',
  lead: 'The roof sheet is on. Drilling took a day, riveting took less, and the part worth writing down is how we kept a long sheet from creeping.',
  work: { amount: '11.2', unit: 'm', kind: 'roof seam sealed' },
  content: [
    p('Ines writing. The old roof had been patched with bitumen, so there was nothing to copy the holes from: two new sheets, lapped across the middle where the bow is. We marked the new line 12 mm in from the edge in blue, pricked it at 50 mm and drilled every fourth hole first.'),
    photos({ 'caravan-roof-sheet.jpg': 'Across two trestles, half drilled. The pins sit in every fourth hole and nothing moves.' }, 'cover'),
    worked('Skin pins in every fourth hole before any other hole was drilled through the frame.', 'The last hole met its mark within half a millimetre. On the old side panel, drilled from one end to the other, the sheet had crept 9 mm.', 'Start from the middle and pin outwards.'),
    time(took('ines', '7 h', 'drilling and riveting'), took('marlow', '7 h', 'drilling and riveting'), took('marlow', '2 h', 'marking out', 'setup')),
    h('Sealing the seam'),
    p('Mastic strip under the lap, one rivet at a time from the middle, then a bead of polyurethane along the edge, smoothed with a spoon dipped in soapy water. Non-setting mastic under and setting sealant outside: the first follows the sheet when it warms, the second keeps the rain from reaching the first.'),
    photos({ 'caravan-roof-rivets.jpg': 'Three to go. If mastic comes out of the hole with the rivet, there was enough under it.' }),
    used(
      use('mastic', '11.5 m'), use('rivet', '224'), waste('rivet', '14'), use('sealant', '2 1/2 cartridges'), use('sheet', '4.6 m²', 'whole'), waste('sheet', '0.35 m²', 'whole'),
    ),
    wentWrong('Riveting over a burr that had not been dressed off.', 'Fourteen rivets stood proud and had to be drilled out, each one with its swarf.', 'Run a larger drill over every hole by hand, both sides, before the mastic goes on.'),
    bought(
      { supplier: 'Sheet metal counter', daysAgo: 50, delivery: '28.00', discount: '15.00', paperTotal: '300.40' },
      toShelf('sheet', '2 sheets', '148.00'), toShelf('rivet', '1 box', '27.40'), toShelf('sealant', '6 cartridges', '51.60'), toShelf('mastic', '3 rolls', '27.60'),
      straight('Skin pins and pliers', '26.00', 'tool'), notMine('Masking tape for the neighbour’s boat', '6.80'),
    ),
    p('One of those cartridges goes back to me for the floor. Marlow says it is the most expensive loan he ever took. The rest of the second sheet is standing behind the stove, waiting for the nearside corner, which will want the same in a year or two.'),
  ],
};

const windows: DemoEntry = {
  key: 'cv07', by: 'restorer', daysAgo: 31, stage: 'Skin and roof',
  title: 'Window rubbers, and the corner closed',
  lead: 'The leak that started all this is shut. Thirteen metres of rubber went in, nearly a metre of it twice, and the rear corner has its skin and its lamp back.',
  work: { amount: '13.2', unit: 'm', kind: 'window rubber fitted' },
  content: [
    p('Old rubber does not only crack, it shrinks. The one from the leaking window was 46 mm shorter than the hole it had sat in, and every millimetre of that was at the lower rear corner, where the joint was.'),
    photos({ 'caravan-window-seals.jpg': 'Fifty years beside none. The rule is there because I did not believe the difference either.' }),
    h('Fitting'),
    bullets(
      'Put the joint at the top, in the middle, where water has no reason to wait.',
      'Cut it 1 percent too long and push the ends together: it will shrink as well, only later.',
      'Warm it in a bucket. Soft soap on the lip, never oil.',
      'Filler strip last, with the proper hooked tool or a bent spoon handle.',
    ),
    used(use('rubber', '13.2 m'), waste('rubber', '900 mm')),
    wentWrong('Cutting the first length to the exact round of the opening.', 'It went in beautifully and had a 3 mm gap by the time we had drunk our tea.', 'One percent over, and leave it lying loose for an hour before it is cut.'),
    time(took('marlow', '4 h 30 min', 'rubbers and glass'), took('ines', '3 h', 'filler strip'), took('marlow', '30 min', 'cleaning the openings', 'setup')),
    h('The corner'),
    p('The old skin unrolled as if it had only been waiting. Fresh mastic under the trim, new screws, and the tear I made above the wheel arch is 4 mm inside the edge of the strip. Nobody will ever know, apart from everybody who reads this.'),
    used(use('trim', '2.1 m', 'whole'), use('mastic', '2.1 m', 'whole'), use('screw', '22', 'whole')),
    photos({ 'caravan-corner-finished.jpg': 'The corner that was compost. Slots all in line, because once you have seen that you cannot unsee it.' }, 'cover'),
    bought(
      { supplier: 'Caravan trimmings by post', delivery: '6.50' },
      toShelf('rubber', '15 m', '67.50'), toShelf('trim', '2 lengths', '22.40'),
    ),
    time(took('marlow', '3 h', 'skin, trim and lamp', 'setup')),
    quote('A hose on it for twenty minutes. Dry inside.'),
  ],
};

const stove: DemoEntry = {
  key: 'cv08', by: 'crew', daysAgo: 19, stage: 'Gas, water and stove',
  title: 'The stove in pieces, and where we stop',
  lead: 'Two burners, one of them furred solid. We cleaned and sealed what is a stove and left alone everything that is gas.',
  work: { amount: '2', unit: 'piece', kind: 'burner cleaned' },
  content: [
    caution('gas'),
    p('Ines again. This is the line we drew: the burners, the pan supports and the cord under the hotplate are ironmongery, and we did those. The hose, the regulator, the joints and the test belong to a registered fitter, who has them in the diary. Until then the bottle is not even in the locker.'),
    cost(['Gas fitter, deposit on fitting and test', 'service', '40.00']),
    h('Cleaning'),
    p('The left burner came up with a brass brush in ten minutes. The right one had been boiled over for years. Degreaser for an hour, hot water, and a piece of copper wire through each port. Never steel: it opens the hole, and then the flame lifts.'),
    photos({ 'caravan-stove.jpg': 'One done, one not. The new cord is under the hotplate already.' }, 'cover'),
    used(use('cord', '1.3 m'), use('cleaner', '250 ml', 'opened')),
    caution('corrosive'),
    time(took('ines', '2 h 20 min', 'burners'), took('ines', '40 min', 'hotplate and cord', 'setup'), waited('1 h', 'degreaser soaking')),
    worked('Counting the ports before and after, with a torch behind the burner.', 'Forty-eight points of light on each. Before, the right one had twenty-nine.'),
    bought(
      { supplier: 'Caravan trimmings by post', delivery: '4.90' },
      toShelf('cord', '1 roll', '9.60'), toShelf('cleaner', '1 bottle', '7.20'), onOrder(toShelf('catch', '2', '38.00')),
    ),
    p('The roof catches are on order from somebody who casts them ', italic('when there are enough people asking'), '. Until they come, the roof is held down with a lorry strap.'),
  ],
};

const paint: DemoEntry = {
  key: 'cv09', by: 'restorer', daysAgo: 8, daysAgoTo: 3, stage: 'Skin and roof',
  title: 'Cream and sea green, and the first night away',
  lead: 'Two coats with a brush over four still days, and then we could not wait for the fitter: supper was cooked outside on a borrowed ring, and it did not rain in.',
  work: { amount: '9.5', unit: 'm2', kind: 'skin painted' },
  content: [
    ownCaution('The grey under the cream is lead.', 'Every bit of flatting was done wet, the slurry was wiped up with paper while it was still slurry, and the paper went to the council in a sealed bag.'),
    h('Brush, not gun'),
    p('I thought about spraying for a week and then looked at what it was built as: a cheap, cheerful thing painted by somebody with a four inch brush and a radio. Flatted with 320 wet, wiped, two coats, a day and a night between them. Working a panel at a time and keeping a wet edge, one of us laying on and the other laying off.'),
    used(use('cream', '1.6 l'), use('green', '700 ml'), use('wetPaper', '9'), use('thinners', '300 ml', 'whole'), waste('cream', '150 ml')),
    caution('solvent'),
    time(took('marlow', '9 h', 'flatting and laying on'), took('ines', '7 h 30 min', 'laying off'), took('ines', '2 h', 'masking', 'setup'), waited('48 h', 'between coats and hardening')),
    wentWrong('Starting the second coat on the sunny side at noon.', 'It skinned before it could be laid off and had to come off with a rag, a good cupful of it.', 'Follow the shade round. Paint the side the sun has left.'),
    bought(
      { supplier: 'Coach paint supplier', daysAgo: 10, delivery: '8.50', discount: '5.00' },
      toShelf('cream', '2 tins', '59.00'), toShelf('green', '1 tin', '29.50'), toShelf('thinners', '1 bottle', '9.80'), toShelf('wetPaper', '1 pack', '13.50'),
    ),
    h('One night'),
    p('Down to the marsh, 14 miles at 40 miles an hour. I stopped twice to feel the hubs. Cold, both times.'),
    photos({ 'caravan-finished.jpg': 'The same spot by the gate as the first picture, the morning after.' }, 'cover'),
    table(['What', 'How it did'], ['Roof, up and down', 'one person, if the person is Ines'], ['Window', 'dry through a shower at four in the morning'], ['Corner', 'dry'], ['Door', 'sticks, and must have its edge planed']),
    bullets([bold('Left to do: '), 'gas fitter, roof catches, curtains, the nearside locker.']),
  ],
};

const locker: DemoEntry = {
  key: 'cv10', by: 'restorer', daysAgo: 1, stage: 'Gas, water and stove', draft: true,
  title: 'Curtain track and the nearside locker',
  lead: '',
  content: [
    p('Track up over the nearside window. The old screw holes were in the right place for once, though the ply behind them took two tries.'),
    used(use('curtain', '1.6 m', 'whole'), use('screw', '10', 'whole')),
    time(took('marlow', '1 h 10 min', 'track and plugs')),
    p('Still to write up: the locker lid, once the hinge has been found.'),
  ],
};

export const outsideDays: readonly DemoEntry[] = [runningGear, roof, windows, stove, paint, locker];
