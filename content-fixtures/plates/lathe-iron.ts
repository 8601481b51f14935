/** Rust, cracks and cast iron: the lathe's wheel, tub, treadle and bed. */
import { block } from "./blocks.ts";
import { spokedWheel, treadleFrame } from "./lathe-parts.ts";
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

const crackEnd: Point = [1010, 806];

function treadle(s: Sheet, mended: boolean): void {
  benchTop(s, "beech", 14);
  s.add('<g transform="translate(-640 -420) scale(1.52)">');
  treadleOnBench(s, mended);
  s.add("</g>");
}

function treadleOnBench(s: Sheet, mended: boolean): void {
  s.solid(rect(20, 470, 1520, 60, 20), s.of("steel"), { drop: 30, edge: 8 });
  s.solid(treadleFrame(), s.of(mended ? "castIron" : "darkRust"), { drop: 40, edge: 13 });
  for (const y of [300, 770]) s.line(open([220, y], [1160, y]), ink, 4, 0.3);
  for (let i = 0; i < 9; i += 1) s.solid(rect(664, 378 + i * 36, 72, 16, 8), s.of(mended ? "castIron" : "rust"), { edge: 4 });
  heads(s, [[236, 306], [236, 764]], 24, s.of("darkSteel"), false);
  s.flat(ellipse(960, 766, 190, 60), mended ? s.of("steel") : s.of("castIron"), 0.9);
  if (mended) stitches(s);
  else crack(s);
  if (!mended) {
    s.solid(poly([1090, 890], [1300, 876], [1303, 904], [1093, 920]), s.of("darkSteel"), { drop: 14, edge: 5 });
    s.solid(rect(1296, 860, 130, 58, 20), s.of("oak"), { drop: 16, edge: 7 });
    crumbs(s, 930, 880, [160, 30], 60, 3, "#6b757b", 6);
  }
}

function crack(s: Sheet): void {
  const line = ragged([900, 720], crackEnd, 6, 12, 8);
  s.line(open(...line), "#dfe4e4", 46, 1, "butt");
  s.line(open(...line), "#808d95", 30, 1, "butt");
  s.line(open(...line), ink, 10, 0.95, "butt");
  s.solid(circle(crackEnd[0] + 4, crackEnd[1] - 6, 17), "#c4ccce", { edge: 4 });
  s.flat(circle(crackEnd[0] + 4, crackEnd[1] - 6, 11), ink);
  for (const [x, y] of [[850, 742], [1096, 790]] as const) s.line(open([x - 24, y - 10], [x + 24, y + 10]), "#f3f1e6", 7, 0.8);
}

function stitches(s: Sheet): void {
  const line = ragged([900, 720], crackEnd, 6, 12, 8);
  for (const [x, y] of line) {
    s.solid(circle(x, y, 17), s.of("steel"), { edge: 3 });
    s.line(circle(x, y, 17), ink, 2.4, 0.6);
  }
  for (const i of [1, 3, 5]) {
    const [x, y] = line[i] ?? [0, 0];
    const key = [0, 1, 2, 3].map((k) => circle(-42 + k * 28, 0, 15)).map((path) => placed(path, { x, y, turn: -38 }));
    for (const path of key) s.solid(path, s.of("darkSteel"), { edge: 3 });
  }
  s.solid(rect(820, 640, 330, 64, 8), s.of("steel", { part: 4 }), { drop: 16, edge: 7 });
  heads(s, [[856, 672], [950, 672], [1030, 672], [1114, 672]], 19, s.of("darkSteel"), false);
  s.solid(placed(rect(-210, -15, 420, 30, 3), { x: 1110, y: 896, turn: -5 }), s.of("darkSteel", { turn: -5 }), { drop: 14, edge: 5 });
  for (let i = 0; i < 40; i += 1) s.line(placed(open([-200 + i * 8, 12], [-192 + i * 8, -12]), { x: 1110, y: 896, turn: -5 }), ink, 2, 0.5);
  s.solid(placed("M205 -24Q300 -44 380 -20Q400 0 380 20Q300 44 205 24Z", { x: 1110, y: 896, turn: -5 }), s.of("ash"), { drop: 20, edge: 8 });
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
