import { bureauDrawers } from "./bureau-drawers.ts";
import { bureauVeneer } from "./bureau-veneer.ts";
import { bureauWhole } from "./bureau-whole.ts";
import { caravanFrame } from "./caravan-frame.ts";
import { caravanGear } from "./caravan-gear.ts";
import { caravanWhole } from "./caravan-whole.ts";
import { latheBearing } from "./lathe-bearing.ts";
import { latheDrive } from "./lathe-drive.ts";
import { latheIron } from "./lathe-iron.ts";
import { latheWhole } from "./lathe-whole.ts";
import type { Plates } from "./plate.ts";

/** Every plate of the demo. */
export const plates: Plates = { ...caravanFrame, ...caravanGear, ...caravanWhole, ...latheWhole, ...latheBearing, ...latheIron, ...latheDrive, ...bureauWhole, ...bureauVeneer, ...bureauDrawers };
