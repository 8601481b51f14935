/** The treadle lathe against the yard wall, as found and as it runs. */
import { turned } from "./blocks.ts";
import { grassTufts } from "./caravan-whole.ts";
import { spokedWheel } from "./lathe-parts.ts";
import { blob, curve, ellipse, poly, rect, ring } from "./paths.ts";
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
  s.solid("M340 410L360 300Q362 276 386 276L434 276Q454 276 456 300L462 356L610 356L616 300Q618 276 640 276L690 276Q712 276 714 300L732 410Z", iron, { drop: 16, edge: 7 });
  for (const [x, r] of [[468, 50], [514, 64], [560, 78]] as const) s.solid(rect(x, 306 - r, 46, r * 2), s.of(f.steel, { part: x % 4, turn: 90 }), { edge: 5 });
  turned(s, 296, 306, [[0, 16], [160, 16]], s.of(f.steel));
  turned(s, 612, 306, [[0, 20], [124, 20], [124, 30], [150, 30], [150, 16], [184, 4]], s.of(f.steel));
}

function tailstock(s: Sheet, f: Finish): void {
  s.solid("M1030 410L1050 350Q1056 268 1090 262L1190 262Q1226 268 1226 306L1216 350L1236 410Z", s.of(f.legs, { part: 3 }), { drop: 16, edge: 7 });
  turned(s, 960, 306, [[0, 3], [36, 14], [36, 20], [100, 20]], s.of(f.steel));
  turned(s, 1222, 306, [[0, 12], [60, 12]], s.of(f.steel));
  s.solid(rect(1276, 226, 24, 160, 10), s.of(f.wheel), { drop: 12, edge: 5 });
}

function treadle(s: Sheet, f: Finish, low: boolean): void {
  const y = low ? 850 : 822;
  s.solid(poly([500, y], [1130, y - 6], [1130, y + 22], [500, y + 28]), s.of(f.wood), { drop: 14, edge: 5 });
  for (const x of [430, 1130]) s.solid(poly([x, y - 14], [x + 80, y - 14], [x + 80, y + 34], [x, y + 34]), s.of(f.legs), { drop: 8, edge: 4 });
}

/** The flywheel seen nearly edge on, in line with the pulley above it, on a crankshaft under the bed. */
function drive(s: Sheet, f: Finish, atWork: boolean): void {
  const [x, y] = [540, 660];
  s.solid("M800 480L826 620L826 700L880 700L880 620L850 480Z", s.of(f.legs, { part: 4 }), { drop: 12, edge: 5 });
  turned(s, 380, y, [[0, 15], [446, 15], [446, 26], [500, 26]], s.of(f.steel), 12);
  s.add(`<g transform="translate(${x + 34} 0) scale(.36 1) translate(${-x - 34} 0)">`);
  s.solid(ring(x + 34, y, 186, 156), s.of(f.legs === "japan" ? "darkSteel" : "darkRust"), { drop: 20, edge: 7 });
  s.add("</g>");
  s.add(`<g transform="translate(${x} 0) scale(.36 1) translate(${-x} 0)">`);
  spokedWheel(s, x, y, 190, s.of(f.wheel, { part: 1 }), 6, 14, atWork ? 22 : 4);
  s.add("</g>");
  if (atWork) belt(s);
  turned(s, 520, y, [[0, 22], [64, 22]], s.of(f.steel));
  s.solid(rect(690, y - 20, 22, atWork ? 100 : 66, 6), s.of(f.steel), { drop: 8, edge: 4 });
  s.solid(rect(760, y - 20, 22, atWork ? 100 : 66, 6), s.of(f.steel), { drop: 8, edge: 4 });
  const pin = atWork ? y + 58 : y + 26;
  turned(s, 706, pin, [[0, 13], [62, 13]], s.of(f.steel));
  s.solid(poly([722, pin - 20], [752, pin - 20], [760, atWork ? 860 : 834], [716, atWork ? 860 : 834]), s.of(f.wood, { turn: 90 }), { drop: 10, edge: 5 });
}

/** Both runs of the belt, from the wheel up through the bed. */
function belt(s: Sheet): void {
  s.solid(poly([474, 640], [494, 640], [536, 330], [518, 330]), s.of("leather", { turn: 90 }), { edge: 4, drop: 6 });
  s.solid(poly([606, 640], [588, 640], [550, 330], [564, 330]), s.of("leather", { turn: 90 }), { edge: 4, drop: 6 });
}

function lathe(s: Sheet, f: Finish, atWork: boolean): void {
  s.flat(ellipse(820, 908, 640, 26), ink, 0.4);
  s.solid(rect(420, 760, 800, 24, 6), s.of(f.legs, { part: 4 }), { drop: 14, edge: 5 });
  leg(s, 390, s.of(f.legs));
  leg(s, 1240, s.of(f.legs, { part: 1 }));
  treadle(s, f, atWork);
  drive(s, f, atWork);
  s.solid(rect(290, 410, 1060, 74, 6), s.of(f.legs, { part: 5 }), { drop: 22, edge: 8 });
  s.solid(rect(290, 404, 1060, 26, 3), s.of(f.bed), { drop: 6, edge: 5 });
  headstock(s, f);
  tailstock(s, f);
  s.solid("M810 410L826 362L800 350L800 330L920 330L920 350L886 362L900 410Z", s.of(f.legs, { part: 6 }), { drop: 12, edge: 6 });
  if (!atWork) return;
  for (const x of [516, 548]) s.solid(poly([x - 11, 404], [x + 11, 404], [x + 8, 262], [x - 8, 262]), s.of("leather", { turn: 90 }), { edge: 4, drop: 4 });
  turned(s, 794, 306, [[0, 24], [50, 24], [54, 31], [68, 31], [72, 24], [120, 22], [124, 30], [138, 30], [142, 20], [170, 18]], s.of("ash", { part: 2 }), 12);
  s.solid(rect(790, 326, 140, 12, 3), s.of("steel"), { drop: 6, edge: 3 });
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
  for (const [x, y, wide, high, k] of [[1120, 420, 150, 12, 1], [420, 408, 70, 10, 2], [820, 482, 120, 14, 3]] as const) s.solid(blob(x, y, wide, high, k, 0.4), s.of("moss"), { edge: 3 });
  grassTufts(s, 480, 930, 860, 26, 3, 220);
  grassTufts(s, 200, 930, 1400, 46, 6, 120);
  s.solid(poly([1310, 900], [1330, 560], [1372, 556], [1376, 900]), s.of("rot", { turn: 90 }), { drop: 20, edge: 5 });
}

function underTreadle(s: Sheet): void {
  ground(s, false);
  lathe(s, mended, true);
  shavings(s, 800, 950, 170, 11, 4, ["#e3c99f", "#d9ba8a"], 0.6);
}

export const latheWhole: Plates = {
  "lathe-in-the-yard": { format: "wide", draw: inTheYard },
  "lathe-running": { format: "wide", draw: underTreadle },
};
