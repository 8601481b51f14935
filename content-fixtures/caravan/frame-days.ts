import type { DemoEntry } from '../demo-build.ts';
import { bold, bought, bullets, caution, cost, h, link, notMine, p, photos, quote, steps, straight, table, time, took, toShed, toShelf, use, used, waited, waste, wentWrong, worked } from '../entry-words.ts';

// Up to the day it was laid up: what the leak had done to the frame and the floor.

const survey: DemoEntry = {
  key: 'cv01', by: 'restorer', daysAgo: 156, stage: 'Survey',
  title: 'Home on a borrowed trailer, and where the water came in',
  lead: 'It came out of a field backwards with one flat tyre and a wren in the gas locker. We spent the afternoon finding out how far the wet had gone before deciding anything.',
  content: [
    photos({ 'caravan-arrived.jpg': 'As it came off the trailer. The moss on the roof rail shows how far the gutter had been full.' }, 'cover'),
    p('What I paid for it is not in these figures: they start when it reached my gate. The paint has gone chalky, there are rust runs under the offside window, and the roof folds down but does not want to come up again. The chassis rings when I hit it, which is the one piece of good news.'),
    cost(['Trailer, one day', 'hire', '45.00']),
    h('Mapping the damp'),
    p('Ines read the meter while I chalked. We went round every 200 mm at three heights, then pushed a bradawl into anything over 25 percent. Everything wet can be traced to one place: the lower rear corner of the offside window, where the rubber has shrunk and left a gap you can post a coin through.'),
    time(took('marlow', '4 h 30 min', 'survey and chalk', 'setup'), took('ines', '3 h', 'meter and notes', 'setup')),
    photos({ 'caravan-leak-stain.jpg': 'The tide marks under the window, ringed. The bradawl went in with one finger.' }),
    table(
      ['Where', 'Reading', 'Bradawl'],
      ['Under offside window', '38 %', 'through to the frame'],
      ['Rear offside corner, foot', 'off the scale', 'soft to the handle'],
      ['Floor edge, offside', '34 %', 'plies come apart'],
      ['Nearside, all of it', '14 to 17 %', 'sound'],
    ),
    caution('lead-paint'),
    p('The cream top coat rubbed clean on the test swab. The grey underneath turned it pink, so the old paint is lead and stays wet from here on. I read ', link('the health and safety pages on lead', 'https://www.hse.gov.uk/lead/'), ' before touching a scraper, and bought proper masks.'),
    bought(
      { supplier: 'Village hardware shop', basis: 'memory' },
      toShelf('mask', '1 box', '16.00'), toShed('grease', '1 tin', '8.40'), straight('Lead test swabs, two', '11.00', 'consumable'),
    ),
    h('What happens next'),
    p('The offside skin has to come off, from the window back to the rear corner. I would rather see all of it now than guess at it for a month.'),
  ],
};

const skinOff: DemoEntry = {
  key: 'cv02', by: 'restorer', daysAgo: 149, stage: 'Frame and floor',
  title: 'The offside comes off like the lid of a tin',
  lead: 'Two hundred and six screws and clench nails, one torn corner, and the frame is in daylight for the first time since it was built.',
  work: { amount: '3.2', unit: 'm2', kind: 'skin lifted' },
  content: [
    p('The skin is one long sheet of soft aluminium, folded over the corner under a trim strip. The trim came first: its screws had slotted heads full of filler, and the quickest way in was to heat each head with a soldering iron for a count of ten and then tap the driver as I turned.'),
    steps(
      'Rake the filler out of the slot and wet it, since some of it is old paint. Lead gives off fume when it is heated, so the slot must be bare.',
      'Warm the head, tap, turn. If it does not move, leave it and come back.',
      'Slide a wide scraper between skin and frame to find the clench nails.',
      'Roll the sheet back slowly over a length of drainpipe, so that it does not crease.',
    ),
    time(took('marlow', '5 h', 'screws and nails'), took('ines', '5 h', 'rolling the sheet'), took('marlow', '40 min', 'drainpipe roller', 'setup')),
    photos({ 'caravan-skin-peeled.jpg': 'Rolled back as far as the door. The half-lap joints nearest us are black, the ones beyond are clean.' }, 'cover'),
    wentWrong('Pulling the last clench nail above the wheel arch with pincers.', 'The sheet tore for 30 mm. It will hide under the trim, but only just.', 'Cut the nail from behind with a hacksaw blade held in a rag, and never lever against the skin.'),
    h('The corner post'),
    p('The foot of the rear offside post is not wood any more. A screwdriver went in to half its length under its own weight. Above the waist rail it is dry, bright and hard, so this is a job for a scarf and a new foot, not for a new post.'),
    photos({ 'caravan-corner-post-soft.jpg': 'The foot of the post. That is a 6 mm screwdriver and I did not push it.' }),
    used(use('mask', '2')),
    h('Wood ordered'),
    p('I measured up while it was all open and rang the timber yard before they shut. Ash because it was ash, and because it holds a screw near an end without splitting.'),
    bought(
      { supplier: 'Timber yard by the canal', delivery: '12.00' },
      toShelf('ash', '4 lengths', '67.20'), toShelf('screw', '1 box', '14.50'), toShelf('glue', '1 tub', '21.00'), toShelf('preservative', '1 tin', '23.40'),
    ),
  ],
};

const cornerPost: DemoEntry = {
  key: 'cv03', by: 'restorer', daysAgo: 140, daysAgoTo: 139, stage: 'Frame and floor',
  title: 'A new foot for the corner post, and a rail I cut twice',
  lead: 'Six joints in two days: one long scarf in the waist rail, one in the post, and four half-laps round the foot. One of the scarfs was cut to the wrong hand and is now a very good paint stirrer.',
  work: { amount: '6', unit: 'piece', kind: 'frame joint' },
  content: [
    p('I made the scarfs eight times as long as the wood is thick. It looks wasteful on the bench and it is the whole point: at 45 mm that is 360 mm of slope, and nearly all of the glue line runs along the grain where it is strong.'),
    time(took('marlow', '1 h 30 min', 'sled for planing the slopes', 'setup')),
    photos({ 'caravan-scarf-joint.jpg': 'The waist rail in the clamps. The squeeze-out should be even along the slope, and this was.' }, 'cover'),
    wentWrong('Marking the second rail from the first one lying on the bench.', 'It came out as a mirror image, since I had turned the first over to plane it. 600 mm of good ash wasted.', 'Mark the show face of every piece before the first cut, and hold it in place on the caravan before the second.'),
    h('The post'),
    p('The old foot came away with a chisel. I cut the post back to where a fresh shaving came off whole, which was 310 mm up, planed the slope in place with a block plane and offered the new foot to it with chalk on the face until it marked all over. Preservative on every cut end, left a night, then glue.'),
    used(
      use('ash', '2.9 m'), waste('ash', '600 mm'), use('glue', '180 g'), use('screw', '18'), use('preservative', '400 ml', 'whole'),
    ),
    caution('solvent'),
    photos({ 'caravan-corner-post-new.jpg': 'New ash on to the sound top of the post, screwed at the foot into a new bottom rail.' }),
    time(took('marlow', '8 h 30 min', 'cutting and fitting'), took('ines', '4 h', 'clamps and glue'), waited('18 h', 'glue setting at 11 degrees')),
    worked('Resin glue mixed two parts of powder to one of water by weight, in a barn at 11 °C.', 'It took a night and most of a morning before I could knock the clamps off, and a test piece broke in the wood, not in the joint.', 'Bring the pieces into the house the night before, so that at least the wood is warm.'),
    p('With the foot in, the corner stands 4 mm higher than the other one did when we measured it. That is the 4 mm it had sunk. Next is the floor edge, which is what the bottom rail sits on.'),
  ],
};

const floorEdge: DemoEntry = {
  key: 'cv04', by: 'restorer', daysAgo: 128, stage: 'Frame and floor',
  title: 'Three metres of floor edge, then the barn is needed',
  lead: 'The outer 280 mm of the floor had opened like a book. It is out, and a new edge is bedded in. Then everything stops, because the barn has been promised to somebody with a boat.',
  work: { amount: '3.4', unit: 'm', kind: 'floor edge renewed' },
  content: [
    h('Out with the old'),
    p('I set the saw to 9 mm and ran it along a straight batten one joist in from the edge. The old ply lifted in leaves. Every screw had rusted to a point, so most of the time went on pulling stubs out of the steel outrigger with locking pliers.'),
    photos({ 'caravan-floor-edge-rotten.jpg': 'The old edge turned over on the bench. You can count the plies without a knife.' }),
    cost(['Plunge saw and rail, one day', 'hire', '24.00']),
    h('In with the new'),
    p('New birch ply, two coats of preservative on the edges, laid on a bed of sealant and screwed at every 150 mm. I ran a second bead along the outside so that water off the skin cannot creep back under.'),
    used(
      use('ply', '0.95 m²'), waste('ply', '0.2 m²'), use('screw', '44'), use('sealant', '3 cartridges'), use('preservative', '600 ml', 'whole'),
    ),
    photos({ 'caravan-floor-edge-new.jpg': 'Five plies and a bead of grey. The gun has to keep moving or it makes a lump.' }, 'cover'),
    wentWrong('Cutting the new strip to the line I had drawn on the old floor.', 'The batten had been on the waste side, so the strip was a saw cut too narrow for the last 700 mm and had to be made again.', 'Measure the hole, not the line.'),
    time(took('marlow', '7 h', 'cutting out and laying'), took('ines', '4 h 30 min', 'stubs and sealant'), took('marlow', '45 min', 'saw rail', 'setup')),
    bought(
      { supplier: 'Builders’ merchant', delivery: '9.50', paperTotal: '97.30' },
      toShelf('ply', '1 sheet', '64.00'), toShelf('sealant', '2 cartridges', '17.00'), notMine('Two bags of mortar for the neighbour', '6.80'),
    ),
    p('The third cartridge was Ines’s own; I owe her one and will settle it with the next order.'),
    h('Laid up'),
    quote('You may have it back when she is in the water, and not a day before.'),
    bullets([bold('Done: '), 'post, rails, floor edge.'], [bold('Open: '), 'skin off on one side, so it is sheeted down with battens, not with string.'], [bold('Back: '), 'in about eight weeks.']),
  ],
};

export const frameDays: readonly DemoEntry[] = [survey, skinOff, cornerPost, floorEdge];
