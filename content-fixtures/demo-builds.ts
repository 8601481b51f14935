import { caravan } from './caravan/caravan.ts';
import type { DemoBuild } from './demo-build.ts';

/** The builds of the demo, the earliest begun first. */
export const demoBuilds: readonly DemoBuild[] = [caravan];
