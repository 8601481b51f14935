// The closed lists that cross the wire. Light: no imports, so that readers' pages may show their labels.

export const roles = ['member', 'moderator', 'administrator'] as const;
export type Role = (typeof roles)[number];

export const accessLevels = ['anyone', 'member', 'moderator', 'administrator'] as const;
export type Access = (typeof accessLevels)[number];

export const buildKinds = ['boat', 'caravan', 'motorcycle', 'vehicle', 'machine', 'furniture', 'instrument', 'other'] as const;
export type BuildKind = (typeof buildKinds)[number];
export const buildKindWords: Readonly<Record<BuildKind, { one: string; many: string }>> = {
  boat: { one: 'Boat', many: 'Boats' },
  caravan: { one: 'Caravan', many: 'Caravans and vans' },
  motorcycle: { one: 'Motorcycle', many: 'Motorcycles' },
  vehicle: { one: 'Vehicle', many: 'Cars and vehicles' },
  machine: { one: 'Machine', many: 'Machines and tools' },
  furniture: { one: 'Furniture', many: 'Furniture' },
  instrument: { one: 'Instrument', many: 'Instruments' },
  other: { one: 'Other', many: 'Everything else' },
};

export const standsList = ['working', 'laid-up', 'waiting', 'finished', 'sold'] as const;
export type Stands = (typeof standsList)[number];
export const standsWords: Readonly<Record<Stands, string>> = {
  working: 'Working',
  'laid-up': 'Laid up until',
  waiting: 'Waiting for',
  finished: 'Finished',
  sold: 'Sold',
};

export const visibilities = ['public', 'unlisted', 'private'] as const;
export type Visibility = (typeof visibilities)[number];
export const visibilityWords: Readonly<Record<Visibility, string>> = {
  public: 'Public: anyone can find and read it',
  unlisted: 'Unlisted: only people with its address',
  private: 'Private: you and your crew',
};

export const pricingMethods = ['fifo', 'average'] as const;
export const pricingMethodWords = { fifo: 'First in, first out', average: 'Moving average' } as const;

export const measuresList = ['us', 'imperial'] as const;
export const measuresWords = { us: 'US (a gallon is 3.785 litres)', imperial: 'Imperial (a gallon is 4.546 litres)' } as const;

/** Where a receipt's figures come from. */
export const bases = ['paper', 'memory', 'guess'] as const;
export type Basis = (typeof bases)[number];
export const basisWords: Readonly<Record<Basis, string>> = { paper: 'From paper', memory: 'From memory', guess: 'A guess' };

/** Where a receipt line goes. */
export const lineGoesList = ['shelf', 'shed', 'straight', 'not-mine'] as const;
export type LineGoes = (typeof lineGoesList)[number];
export const lineGoesWords: Readonly<Record<LineGoes, string>> = {
  shelf: "On the build's shelf",
  shed: 'In the shed',
  straight: 'Straight into use',
  'not-mine': 'Not mine',
};

export const costCategories = ['hire', 'carriage', 'service', 'tool', 'consumable', 'other'] as const;
export type CostCategory = (typeof costCategories)[number];
export const costCategoryWords: Readonly<Record<CostCategory, string>> = {
  hire: 'Hire', carriage: 'Carriage', service: 'A service', tool: 'A tool', consumable: 'A consumable', other: 'Something else',
};

/** Whether a Used line counts towards what one takes. */
export const countsList = ['each', 'whole', 'opened'] as const;
export type Counts = (typeof countsList)[number];
export const countsWords: Readonly<Record<Counts, string>> = {
  each: 'For each', whole: 'For the whole job', opened: 'Opened, not counted',
};

export const timeKinds = ['each', 'setup', 'waiting'] as const;
export type TimeKind = (typeof timeKinds)[number];
export const timeKindWords: Readonly<Record<TimeKind, string>> = { each: 'For each', setup: 'Setting up', waiting: 'Waiting' };

export const pictureStates = ['working', 'ready', 'refused'] as const;
export type PictureState = (typeof pictureStates)[number];

export const hazardTags = [
  'solvent', 'catalyst', 'two-pack', 'dust', 'lead-paint', 'asbestos', 'hot-work', 'stored-energy', 'lifting', 'fuel', 'gas',
  'mains', 'oily-rags', 'molten-metal', 'electrolysis', 'corrosive',
] as const;
export type HazardTag = (typeof hazardTags)[number];
