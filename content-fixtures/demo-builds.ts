import { bureau } from './bureau/bureau.ts';
import { caravan } from './caravan/caravan.ts';
import type { DemoBuild } from './demo-build.ts';
import { lamp } from './lamp.ts';
import { lathe } from './lathe/lathe.ts';

/** The builds of the demo, the earliest begun first. */
export const demoBuilds: readonly DemoBuild[] = [caravan, lathe, bureau, lamp];
