import type { HazardTag } from '#contracts/words.ts';

/** A usual caution. `source` names what was published, its country and date; nothing where it is common practice without one. */
export interface ListedCaution {
  readonly title: string;
  readonly words: string;
  readonly source: string | null;
}

const deferral = 'Local rules and licensed trades come first.';

// Sources: figures are workplace limits of the named country, shown as information. Where `source` is null the words are common practice, no source.
const cautions: Readonly<Record<HazardTag, ListedCaution>> = {
  solvent: {
    title: 'Solvent vapour burns and harms',
    words: `Work with the doors open and nothing that sparks. Acetone flashes at −18 °C, and its vapour burns between 2.1 and 13 % in air. ${deferral}`,
    source: 'Fire Engineering data sheet, 1987; ICSC 0087, ILO, April 2024',
  },
  catalyst: {
    title: 'Catalyst blinds',
    words: `Wear goggles before the bottle is opened. If it reaches an eye, rinse with water at once for at least 15 minutes and get medical help. Stay inside the band the maker prints. ${deferral}`,
    source: 'NIOSH PEL-88, 54 FR 2332 (US, 1989); US Navy 14003, first aid',
  },
  'two-pack': {
    title: 'Two-pack spray needs fed air',
    words: `Isocyanate mist is the most common cause of occupational asthma. A filter mask does not protect: only air-fed breathing apparatus does, and the mist hangs unseen after spraying. ${deferral}`,
    source: 'HSE, vehicle paint spraying and asthma (UK)',
  },
  dust: {
    title: 'Fine dust stays in the lungs',
    words: `Wet it or draw it off at the tool, and wear a mask that fits. Respirable crystalline silica at work is limited to 50 µg/m³ over eight hours. ${deferral}`,
    source: '29 CFR 1926.1153 (US)',
  },
  'lead-paint': {
    title: 'Old paint may hold lead',
    words: `Test before sanding or heating anything painted long ago. Keep children away, work wet, and bag the waste. At work, lead in air is limited to 50 µg/m³, with action from 30. ${deferral}`,
    source: '40 CFR 745, 73 FR 21692 (US, 2008); OSHA lead in construction (US)',
  },
  asbestos: {
    title: 'It may hold asbestos',
    words: 'Leave old lagging, brake linings and boards alone until a laboratory has looked at a sample. Do not sand, drill or break them. Removal is licensed work in many places.',
    source: null,
  },
  'hot-work': {
    title: 'Hot work starts fires hours later',
    words: `Clear what burns, keep water or an extinguisher at hand, and look again an hour after the last spark. ${deferral}`,
    source: null,
  },
  'stored-energy': {
    title: 'It holds energy when it is still',
    words: `Let springs, pressure and flywheels down in a controlled way, block what can move, and keep hands out of the line. ${deferral}`,
    source: null,
  },
  lifting: {
    title: 'Never work under a jack alone',
    words: `Block it as soon as it is lifted, on firm ground, within the load marked on the jack. ${deferral}`,
    source: '29 CFR 1926.305; WAC 296-307-22509 (US)',
  },
  fuel: {
    title: 'Fuel vapour finds a flame',
    words: `Drain it outdoors into a proper can, disconnect the battery, and air the place before any heat or spark. ${deferral}`,
    source: null,
  },
  gas: {
    title: 'Gas fitting is licensed work',
    words: 'Turn it off at the bottle, and have a registered fitter make and test the joints. Fit an alarm for gas and one for carbon monoxide.',
    source: null,
  },
  mains: {
    title: 'Mains wiring kills',
    words: 'Isolate, lock off and prove dead. In many places the work, or its test, must be done by a registered electrician.',
    source: null,
  },
  'oily-rags': {
    title: 'Oily rags can catch fire by themselves',
    words: `Rags with drying oils heat as they dry. Spread them flat outdoors, or keep them in a closed metal tin with water. ${deferral}`,
    source: null,
  },
  'molten-metal': {
    title: 'Water and molten metal explode',
    words: `Dry and warm every mould, ladle and tool first. Leather, a face shield and boots that come off quickly; a dry sand bed underneath; fresh air for the fume. ${deferral}`,
    source: null,
  },
  electrolysis: {
    title: 'The bath gives off hydrogen',
    words: `Ventilate it, keep sparks away and switch off before you touch the leads. Use plain iron anodes: stainless ones can put hexavalent chromium in the bath. ${deferral}`,
    source: 'Texas A&M Conservation Manual, file 10b (hydrogen); the rest is common practice',
  },
  corrosive: {
    title: 'It burns skin and eyes',
    words: `Gloves, goggles and long sleeves. Add it to water, never water to it, and keep running water within reach. ${deferral}`,
    source: null,
  },
};

export function cautionFor(hazard: HazardTag): ListedCaution {
  return cautions[hazard];
}
