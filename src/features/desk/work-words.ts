import type { WorkDone } from '#src/blocks/pure.ts';

/** Units of work as the menu offers them. */
export const workUnitMenu: Readonly<Record<WorkDone['unit'], string>> = { piece: 'pieces', m: 'm', m2: 'm²', ft: 'ft', ft2: 'ft²', h: 'h' };
