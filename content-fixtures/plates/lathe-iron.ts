/** Rust, cracks and cast iron: the lathe's wheel, tub, treadle and bed. */
import { block } from "./blocks.ts";
import { spokedWheel } from "./lathe-parts.ts";
import { randomFrom } from "./noise.ts";
import type { Point } from "./paths.ts";
import { blob, circle, curve, ellipse, open, placed, poly, ragged, rect } from "./paths.ts";
import { benchTop, brickWall, floor, heads, shedWall } from "./places.ts";
import type { Plates } from "./plate.ts";
import type { Sheet } from "./sheet.ts";
import { ink } from "./sheet.ts";
import { crumbs } from "./tools.ts";

function flywheel(s: Sheet): void {
  brickWall(s, 1067);
  s.shade(rect(0, 0, 1600, 1067), 0.2);
  s.solid(poly([-20, 440], [1620, 440], [1620, 580], [-20, 580]), s.of("darkRust", { part: 3 }), { drop: 40, edge: 9 });
  spokedWheel(s, 780, 520, 640, s.of("rust", { part: 2 }), 6, 44, 16);
  s.solid(circle(780, 520, 168), s.of("darkRust", { part: 5 }), { drop: 30, edge: 12 });
  s.flat(blob(790, 534, 150, 142, 6, 0.1, 20), "#2a1a10", 0.7);
  s.flat(curve([[740, 640], [830, 650], [836, 900], [812, 1080], [770, 1080], [752, 840]], true), "#2a1a10", 0.55);
  s.line(curve([[700, 460], [760, 420], [840, 430]]), "#d9b78a", 7, 0.5);
  s.solid(circle(780, 520, 84), s.of("darkRust", { part: 1 }), { drop: 12, edge: 9 });
  s.solid(circle(780, 520, 34), s.of("rust", { part: 4 }), { edge: 6 });
  s.solid(poly([770, 470], [840, 440], [1060, 690], [986, 736]), s.of("darkRust", { part: 2 }), { drop: 30, edge: 10 });
  s.solid(circle(1020, 708, 72), s.of("rust", { part: 6 }), { drop: 26, edge: 10 });
  s.solid(circle(1020, 708, 40), s.of("darkRust"), { edge: 6, drop: 10 });
  s.solid(poly([350, 344], [720, 456], [706, 510], [330, 440]), s.of("oak", { turn: 17 }), { drop: 26, edge: 8 });
  for (let i = 0; i < 5; i += 1) s.line(open([352 + i * 6, 358 + i * 16], [384 + i * 6, 366 + i * 16]), ink, 4, 0.4);
  crumbs(s, 800, 820, [300, 160], 40, 6, "#bf7c3d", 8);
}

function lead(s: Sheet, points: Point[], colour: string): void {
  s.cord(curve(points), colour, 20, 10);
  const [x, y] = points.at(-1) ?? [0, 0];
  s.solid(placed("M-16 -40L16 -40L26 30L8 44L-8 44L-26 30Z", { x, y }), colour, { drop: 8, edge: 5 });
}

function electrolysis(s: Sheet): void {
  shedWall(s, 900, "wall", 3);
  floor(s, 900);
  const tub: Point[] = [[270, 360], [1330, 360], [1270, 980], [330, 980]];
  s.shadow(poly(...tub), 46);
  s.flat(poly([270, 360], [1330, 360], [1320, 470], [280, 470]), "#d5dcda");
  const water: Point[] = [[282, 420], [1318, 420], [1262, 960], [338, 960]];
  s.flat(poly(...water), s.of("soda"));
  for (const [x, k] of [[390, 1], [1080, 4]] as const) {
    s.solid(poly([x, 260], [x + 130, 260], [x + 124, 850], [x + 6, 850]), s.of("rust", { part: k }), { drop: 16, edge: 8 });
    s.flat(poly([x, 424], [x + 130, 424], [x + 124, 850], [x + 6, 850]), "#7f979b", 0.42);
  }
  spokedWheel(s, 800, 660, 210, s.of("darkRust"), 5, 22);
  s.flat(poly([560, 424], [1040, 424], [1040, 900], [560, 900]), "#7f979b", 0.34);
  s.line(open([800, 300], [800, 470]), ink, 9);
  s.line(open([800, 300], [800, 470]), "#c79c46", 5);
  const random = randomFrom(21);
  for (let i = 0; i < 150; i += 1) {
    const a = random() * Math.PI * 2;
    const r = 190 + random() * 40;
    const [x, y] = [800 + Math.cos(a) * r, 650 + Math.sin(a) * r - random() * 90];
    if (y < 440) continue;
    const size = 3 + random() * 9;
    s.line(circle(x, y, size), "#f3f6f4", 2.6, 0.85);
    s.flat(circle(x - size * 0.3, y - size * 0.3, size * 0.3), "#ffffff", 0.8);
  }
  for (let i = 0; i < 60; i += 1) s.flat(ellipse(520 + random() * 560, 424 + random() * 14, 10 + random() * 16, 6 + random() * 5), i % 3 === 0 ? "#c9a77c" : "#eef2ef", 0.85);
  s.line(open([282, 420], [1318, 420]), "#eef2ef", 5, 0.8);
  s.solid(poly([270, 360], [282, 420], [338, 960], [1262, 960], [1318, 420], [1330, 360], [1366, 360], [1300, 1010], [300, 1010], [234, 360]), "#4f6f86", { edge: 10 });
  s.solid(rect(180, 286, 1240, 34, 6), s.of("ash"), { drop: 24, edge: 7 });
  lead(s, [[1620, 90], [1320, 60], [1180, 130], [1145, 236]], "#b93a16");
  lead(s, [[1145, 250], [960, 120], [640, 110], [455, 236]], "#b93a16");
  lead(s, [[-20, 110], [300, 30], [660, 60], [800, 276]], "#20262c");
}

function handwheel(s: Sheet): void {
  benchTop(s, "slate", 2);
  const [x, y, r] = [660, 530, 400];
  spokedWheel(s, x, y, r, s.of("rust"), 5, 44, 0);
  s.clipped(poly(...ragged([x + 20, 0], [x - 20, 1067], 16, 18, 3), [1600, 1067], [1600, 0]), () => {
    spokedWheel(s, x, y, r, s.of("castIron"), 5, 44, 0);
    s.line(`M${x} ${y - r * 0.93}C${x + r * 1.24} ${y - r * 0.93} ${x + r * 1.24} ${y + r * 0.93} ${x} ${y + r * 0.93}`, "#eef2ef", 12, 0.3);
  });
  s.solid(circle(x, y, 44), s.of("darkSteel"), { edge: 6 });
  s.flat(rect(x - 9, y - 56, 18, 30), ink, 0.85);
  s.flat(circle(x, y, 32), ink, 0.85);
  const at = { x: 1180, y: 560, turn: 64 };
  s.solid(placed(rect(-190, -44, 250, 88, 14), at), s.of("beech", { turn: 64 }), { drop: 28, edge: 9 });
  s.solid(placed("M56 -34Q180 -50 330 -26Q356 0 330 26Q180 50 56 34Z", at), s.of("beech", { turn: 64, part: 3 }), { drop: 28, edge: 9 });
  for (let i = 0; i < 16; i += 1) for (const k of [0, 1]) s.line(placed(open([-182 + i * 15, 44], [-188 + i * 15 + k * 12, 92 + k * 8]), at), k ? "#c79c46" : "#d9b363", 4);
  crumbs(s, 330, 980, [260, 50], 70, 7, "#8d4f2c", 8);
  crumbs(s, 1080, 930, [160, 60], 40, 9, "#643520", 7);
}

/** Where the arm has cracked, from its top edge nearly to its foot. */
const crackLine = ragged([850, 318], [960, 668], 12, 9, 8);

/** One arm of the treadle close to, lying on the bench. */
function treadle(s: Sheet, mended: boolean): void {
  benchTop(s, "beech", 14);
  const iron = s.of(mended ? "castIron" : "darkRust");
  if (mended) s.solid(poly([700, 640], [1150, 630], [1150, 850], [700, 858]), s.of("darkSteel"), { drop: 30, edge: 9 });
  s.solid(poly([-20, 330], [1620, 300], [1620, 760], [-20, 790]), iron, { drop: 46, edge: 14 });
  s.solid(poly([-20, 330], [1620, 300], [1620, 366], [-20, 396]), iron, { drop: 14, edge: 8 });
  s.solid(poly([-20, 724], [1620, 694], [1620, 760], [-20, 790]), iron, { drop: 14, edge: 8 });
  for (let i = 0; i < 6; i += 1) s.solid(placed(rect(0, 0, 34, 240, 17), { x: 60 + i * 92, y: 446 - i * 1.6, turn: -1 }), iron, { drop: 10, edge: 8 });
  heads(s, [[1490, 420], [1490, 640]], 44, s.of("darkSteel"), false);
  s.flat(blob(908, 530, 238, 236, 6, 0.08, 18), s.of(mended ? "steel" : "castIron"), mended ? 0.75 : 1);
  if (mended) stitches(s);
  else crack(s);
}

function crack(s: Sheet): void {
  const beside = (off: number): Point[] => crackLine.map(([x, y]): Point => [x + off, y + off * 0.3]);
  s.flat(poly(...beside(-46), ...crackLine.toReversed()), "#c4ccce");
  s.flat(poly(...beside(46), ...crackLine.toReversed()), "#4f5a63");
  for (const off of [-46, 46]) s.line(open(...beside(off)), ink, 3, 0.5);
  s.line(open(...crackLine), ink, 10, 0.95, "butt");
  const [x, y] = crackLine.at(-1) ?? [0, 0];
  s.solid(circle(x, y + 14, 38), "#c4ccce", { edge: 6 });
  s.flat(circle(x, y + 14, 26), ink);
  s.line(open([1040, 420], [1120, 400]), "#f3f1e6", 9, 0.85);
  s.line(open([1080, 380], [1082, 442]), "#f3f1e6", 9, 0.85);
  s.solid(poly([1010, 930], [1290, 890], [1296, 926], [1014, 968]), s.of("darkSteel"), { drop: 18, edge: 6 });
  s.solid(placed(rect(0, -40, 210, 80, 26), { x: 1286, y: 908, turn: -8 }), s.of("oak", { turn: -8 }), { drop: 22, edge: 9 });
  crumbs(s, 760, 900, [240, 50], 90, 3, "#6b757b", 8);
}

/** Pins run into one another down the crack, keys across it, all filed flush. */
function stitches(s: Sheet): void {
  for (let i = 0; i < 26; i += 1) s.line(open([720 + i * 15, 690], [760 + i * 15, 400]), i % 2 === 0 ? "#eef2ef" : "#5f6b74", 2, 0.3);
  for (const [i, [x, y]] of crackLine.entries()) {
    s.flat(circle(x, y, 24), s.of(i % 2 === 0 ? "darkSteel" : "castIron", { part: i }));
    s.line(circle(x, y, 24), ink, 3, 0.7);
  }
  for (const i of [2, 6, 10]) {
    const [x, y] = crackLine[i] ?? [0, 0];
    const lobes = [-2, -1, 0, 1, 2].map((k) => circle(x + k * 42, y, 27));
    for (const lobe of lobes) s.line(lobe, ink, 7, 0.75);
    for (const lobe of lobes) s.flat(lobe, s.of("steel", { part: i }));
    s.flat(rect(x - 84, y - 12, 168, 24), s.of("steel", { part: i }));
  }
  heads(s, [[740, 820], [1110, 812]], 30, s.of("steel"), false);
  const at = { x: 960, y: 960, turn: -4 };
  s.solid(placed(rect(-330, -22, 520, 44, 3), at), s.of("darkSteel", { turn: -4 }), { drop: 16, edge: 6 });
  for (let i = 0; i < 62; i += 1) s.line(placed(open([-320 + i * 8, 18], [-310 + i * 8, -18]), at), ink, 2.4, 0.5);
  s.solid(placed("M186 -12L240 -34Q340 -52 430 -26Q456 0 430 26Q340 52 240 34L186 12Z", at), s.of("ash", { turn: -4 }), { drop: 24, edge: 9 });
}

function bed(s: Sheet): void {
  s.flat(rect(0, 0, 1600, 1067), s.of("slate"));
  const way = (y: number, part: number): void => {
    block(s, [[-20, y], [1620, y], [1620, y + 130], [-20, y + 130]], [60, -90], s.of("castIron", { part }), { drop: 40 });
    s.flat(poly([-20, y], [1620, y], [1680, y - 90], [40, y - 90]), s.of("steel", { part }));
  };
  way(360, 1);
  s.flat(rect(-20, 490, 1660, 140), "#12181f");
  way(720, 3);
  for (const x of [120, 680, 1240]) s.solid(rect(x, 496, 90, 136), s.of("castIron"), { edge: 6 });
  for (const [x, count] of [[820, 1], [910, 2], [1010, 3], [1110, 2], [1200, 1]] as const) {
    for (let i = 0; i < count; i += 1) s.line(open([x + i * 18, 676], [x + i * 18 + 8, 714]), "#f6f4ea", 7, 0.85);
  }
  const edge: Point[] = [[90, 560], [1500, 590], [1500, 650], [90, 620]].map(([x, y]): Point => [x ?? 0, (y ?? 0) + 40]);
  s.solid(poly([90, 540], [420, 540], [700, 480], [1100, 486], [1300, 560], [1500, 566], [1500, 668], [90, 660]) + ellipse(900, 560, 130, 34), s.of("darkSteel"), { drop: 34, edge: 9 });
  s.flat(poly(...edge.slice(2), [90, 640], [1500, 650]), "#eef2ef", 0.4);
  const at = { x: 1060, y: 690, turn: 52 };
  for (const [k, turn] of [[0, 52], [1, 72], [2, 88], [3, 100]] as const) s.solid(placed("M-30 -16L240 -18L240 18L-30 16Q-44 0 -30 -16Z", { ...at, x: 1060 + (k > 0 ? 150 : 0), y: 690 + (k > 0 ? 190 : 0), turn: k > 0 ? turn + 80 : 52 }), s.of("steel", { turn, part: k }), { drop: 10, edge: 4 });
  s.solid(placed(rect(190, -26, 240, 52, 12), at), s.of("brass", { turn: 52 }), { drop: 22, edge: 7 });
  s.solid(placed(circle(226, 0, 14), at), s.of("steel"), { edge: 4 });
  s.solid(rect(110, 960, 170, 40, 8), "#f3f1e6", { drop: 10, edge: 6 });
}

export const latheIron: Plates = {
  "lathe-flywheel-seized": { format: "wide", draw: flywheel },
  "lathe-electrolysis": { format: "full", draw: electrolysis },
  "lathe-handwheel": { format: "wide", draw: handwheel },
  "lathe-treadle-crack": { format: "wide", draw: (s) => treadle(s, false) },
  "lathe-treadle-stitched": { format: "wide", draw: (s) => treadle(s, true) },
  "lathe-bed-straightedge": { format: "wide", draw: bed },
};
