import { caravanFrame } from "./caravan-frame.ts";
import { caravanGear } from "./caravan-gear.ts";
import { caravanWhole } from "./caravan-whole.ts";
import type { Plates } from "./plate.ts";

/** Every plate of the demo. */
export const plates: Plates = { ...caravanFrame, ...caravanGear, ...caravanWhole };
