/** The treadle lathe against the yard wall, as found and as it runs. */
import { turned } from "./blocks.ts";
import { grassTufts } from "./caravan-whole.ts";
import { spokedWheel } from "./lathe-parts.ts";
import { blob, circle, curve, ellipse, poly, rect, ring } from "./paths.ts";
import { brickWall } from "./places.ts";
import type { Plates } from "./plate.ts";
import type { Material } from "./recipes.ts";
import type { Sheet } from "./sheet.ts";
import { ink } from "./sheet.ts";
import { shavings } from "./tools.ts";

interface Finish {
  readonly legs: Material;
  readonly bed: Material;
  readonly wheel: Material;
  readonly steel: Material;
  readonly wood: Material;
}

const found: Finish = { legs: "darkRust", bed: "rust", wheel: "rust", steel: "darkRust", wood: "rot" };
const mended: Finish = { legs: "japan", bed: "steel", wheel: "castIron", steel: "steel", wood: "ash" };

function leg(s: Sheet, x: number, fill: string): void {
  const half = (flip: 1 | -1): string => `L${x + flip * 44} 470C${x + flip * 36} 600 ${x + flip * 50} 700 ${x + flip * 110} 800C${x + flip * 130} 836 ${x + flip * 140} 860 ${x + flip * 140} 900`;
  s.solid(`M${x - 44} 470${half(1)}L${x + 96} 900C${x + 92} 850 ${x + 60} 800 ${x} 780C${x - 60} 800 ${x - 92} 850 ${x - 96} 900L${x - 140} 900C${x - 140} 860 ${x - 130} 836 ${x - 110} 800C${x - 50} 700 ${x - 36} 600 ${x - 44} 470Z`, fill, { drop: 18, edge: 7 });
}

function headstock(s: Sheet, f: Finish): void {
  const iron = s.of(f.legs, { part: 2 });
  s.solid("M330 410L350 300Q352 276 376 276L424 276Q444 276 446 300L452 350L560 350L566 300Q568 276 590 276L640 276Q662 276 664 300L682 410Z", iron, { drop: 16, edge: 7 });
  const steps = [[452, 48], [486, 62], [520, 76]] as const;
  for (const [x, r] of steps) s.solid(rect(x, 306 - r, 34, r * 2), s.of(f.steel, { part: x % 4 }), { edge: 4 });
  turned(s, 286, 306, [[0, 16], [160, 16]], s.of(f.steel));
  turned(s, 560, 306, [[0, 20], [130, 20], [130, 30], [156, 30], [156, 16], [190, 4]], s.of(f.steel));
}

function tailstock(s: Sheet, f: Finish): void {
  s.solid("M1030 410L1050 350Q1056 268 1090 262L1190 262Q1226 268 1226 306L1216 350L1236 410Z", s.of(f.legs, { part: 3 }), { drop: 16, edge: 7 });
  turned(s, 960, 306, [[0, 3], [36, 14], [36, 20], [100, 20]], s.of(f.steel));
  turned(s, 1222, 306, [[0, 12], [60, 12]], s.of(f.steel));
  s.solid(rect(1276, 226, 24, 160, 10), s.of(f.wheel), { drop: 12, edge: 5 });
}

function treadle(s: Sheet, f: Finish, low: boolean): void {
  const y = low ? 842 : 812;
  s.solid(poly([480, y], [1180, y - (low ? 14 : -44)], [1180, y + 20 - (low ? 14 : -44)], [480, y + 24]), s.of(f.wood), { drop: 14, edge: 5 });
  s.solid(poly([460, y - 10], [540, y - 12], [540, y + 30], [460, y + 30]), s.of(f.legs), { edge: 4 });
}

function lathe(s: Sheet, f: Finish, running: boolean): void {
  s.flat(ellipse(820, 908, 620, 26), ink, 0.4);
  leg(s, 470, s.of(f.legs));
  leg(s, 1190, s.of(f.legs, { part: 1 }));
  s.solid(rect(520, 640, 630, 30, 6), s.of(f.legs, { part: 4 }), { drop: 14, edge: 5 });
  treadle(s, f, running);
  spokedWheel(s, 640, 656, 196, s.of(f.wheel, { part: 1 }), 6, 26, running ? 22 : 4);
  s.solid(ring(640, 656, 150, 138), s.of(f.wheel), { edge: 4 });
  s.solid(circle(640, 656, 20), s.of(f.steel), { edge: 4 });
  s.solid(running ? poly([654, 700], [690, 706], [776, 838], [750, 846]) : poly([700, 636], [724, 656], [760, 832], [736, 834]), s.of(f.wood, { turn: 60 }), { drop: 12, edge: 5 });
  if (running) {
    s.solid(poly([452, 640], [478, 640], [524, 306], [498, 306]), s.of("leather", { turn: 90 }), { edge: 4, drop: 8 });
    s.solid(poly([812, 640], [836, 640], [556, 290], [530, 290]), s.of("leather", { turn: 60 }), { edge: 4, drop: 8 });
  }
  s.solid(rect(290, 410, 1060, 74, 6), s.of(f.legs, { part: 5 }), { drop: 22, edge: 8 });
  s.solid(rect(290, 404, 1060, 26, 3), s.of(f.bed), { drop: 6, edge: 5 });
  headstock(s, f);
  tailstock(s, f);
  s.solid("M790 410L806 362L780 350L780 330L900 330L900 350L866 362L880 410Z", s.of(f.legs, { part: 6 }), { drop: 12, edge: 6 });
  if (running) {
    s.solid(poly([486, 404], [512, 404], [516, 312], [492, 312]), s.of("leather", { turn: 90 }), { edge: 4, drop: 4 });
    turned(s, 752, 306, [[0, 24], [60, 24], [64, 31], [78, 31], [82, 24], [150, 22], [154, 30], [168, 30], [172, 20], [208, 18]], s.of("ash", { part: 2 }), 12);
    s.solid(rect(770, 326, 140, 12, 3), s.of("steel"), { drop: 6, edge: 3 });
  }
}

function ground(s: Sheet, rough: boolean): void {
  brickWall(s, 800);
  s.flat(rect(0, 800, 1600, 300), s.of("concrete", { part: 4 }));
  s.shade(rect(0, 800, 1600, 24), 0.3);
  s.line(curve([[-10, 990], [380, 960], [700, 1010], [1610, 970]]), ink, 4, 0.3);
  if (rough) {
    s.flat(blob(820, 960, 520, 70, 5), "#6d4328", 0.34);
    grassTufts(s, 20, 818, 1580, 40, 9, 90);
  }
}

function inTheYard(s: Sheet): void {
  ground(s, true);
  lathe(s, found, false);
  for (const [x, y, wide, high, k] of [[1120, 420, 150, 12, 1], [420, 408, 70, 10, 2], [620, 482, 120, 14, 3]] as const) s.solid(blob(x, y, wide, high, k, 0.4), s.of("moss"), { edge: 3 });
  grassTufts(s, 480, 930, 860, 26, 3, 220);
  grassTufts(s, 200, 930, 1400, 46, 6, 120);
  s.solid(poly([1310, 900], [1330, 560], [1372, 556], [1376, 900]), s.of("rot", { turn: 90 }), { drop: 20, edge: 5 });
}

function atWork(s: Sheet): void {
  ground(s, false);
  lathe(s, mended, true);
  shavings(s, 800, 950, 170, 11, 4, ["#e3c99f", "#d9ba8a"], 0.6);
}

export const latheWhole: Plates = {
  "lathe-in-the-yard": { format: "wide", draw: inTheYard },
  "lathe-running": { format: "wide", draw: atWork },
};
