/** The caravan's ash frame: what the skin was hiding, and what went back. */
import { block, upright } from "./blocks.ts";
import type { Point } from "./paths.ts";
import { blob, circle, curve, open, poly, ragged, rect } from "./paths.ts";
import { benchTop, boards, floor, heads, shedWall } from "./places.ts";
import type { Plates } from "./plate.ts";
import type { Sheet } from "./sheet.ts";
import { ink } from "./sheet.ts";
import { clamp, crumbs, mallet, rule, screwdriver } from "./tools.ts";

function scarf(s: Sheet): void {
  benchTop(s, "slate", 3);
  const [top, foot, depth] = [430, 610, [46, -54] as Point];
  block(s, [[-40, top], [470, top], [1090, foot], [-40, foot]], depth, s.of("stained", { part: 1 }), { drop: 34 });
  block(s, [[478, top], [1660, top], [1660, foot], [1098, foot]], depth, s.of("ash", { part: 4 }), { drop: 34 });
  s.line(curve([[476, top + 2], [640, 478], [800, 526], [950, 570], [1092, foot - 2]]), "#8b5220", 9);
  for (const [x, y] of [[560, 462], [700, 503], [850, 544], [1000, 588]] as const) {
    s.solid(blob(x, y, 17, 12, x, 0.3), s.of("glue"), { edge: 4, drop: 3 });
  }
  for (const [x, part] of [[560, 1], [790, 2], [1010, 3]] as const) {
    block(s, [[x - 62, foot + 4], [x + 62, foot + 4], [x + 62, foot + 46], [x - 62, foot + 46]], [14, -16], s.of("pine", { part }), { drop: 16 });
    s.solid(rect(x - 40, top - 92, 124, 40), s.of("pine", { part: part + 3 }), { drop: 10 });
    clamp(s, { x: x + 18, y: top - 92 }, foot - top + 138);
  }
  rule(s, { x: 60, y: 930, turn: -3 }, 640);
  s.solid(poly([1230, 860], [1330, 820], [1460, 920], [1360, 962]), s.of("cloth"), { drop: 12 });
  crumbs(s, 1180, 760, [340, 90], 30, 9, "#e3c99f");
}

/** Where water ran: rings of brown, each darker than the last, hanging from a corner. */
function tideMarks(s: Sheet, x: number, y: number, size: number): void {
  const shape = (k: number): string =>
    curve([[x + 40 * k, y - 20], [x + 120 * k, y + 120 * k], [x + 60 * k, y + 300 * k], [x + 130 * k, y + 420 * k], [x - 10 * k, y + 560 * k], [x - 120 * k, y + 470 * k], [x - 210 * k, y + 480 * k], [x - 260 * k, y + 320 * k], [x - 150 * k, y + 220 * k], [x - 170 * k, y + 90 * k], [x - 60 * k, y]], true);
  [1, 0.84, 0.66, 0.46].forEach((part, i) => {
    s.flat(shape(part * size), "#6a4523", 0.2 + i * 0.07);
    s.line(shape(part * size), "#4c2f16", 5 + i, 0.6);
  });
}

function leakStain(s: Sheet): void {
  boards(s, { material: "lining", width: 720, upright: true, seed: 2 });
  s.solid(rect(0, 940, 1600, 70), s.of("aluminium"), { edge: 4 });
  heads(s, [120, 440, 760, 1080, 1400].map((x) => [x, 975] as const), 12, s.of("steel"));
  tideMarks(s, 800, 420, 0.94);
  s.solid(rect(770, -80, 1000, 520, 70) + rect(836, -80, 1000, 454, 44), s.of("aluminium"), { drop: 14, edge: 7 });
  s.solid(rect(826, -80, 1000, 464, 50) + rect(850, -80, 1000, 440, 40), s.of("oldRubber"), { edge: 4 });
  s.flat(rect(850, -80, 1000, 440, 40), s.of("glass"));
  s.flat(poly([1000, 0], [1180, 0], [900, 330], [858, 330], [858, 150]), "#ffffff", 0.22);
  heads(s, [[800, 120], [800, 260], [960, 407], [1140, 407], [1320, 407], [1500, 407]], 12, s.of("rust"));
  for (const k of [0, 7]) s.line(curve([[600, 486 + k], [800, 462 - k], [950, 600], [980, 800 - k], [790, 985], [560, 930], [500, 720], [560, 520], [700, 452 + k]]), "#f3f1e6", 7 - k * 0.5, 0.75);
  s.flat(blob(742, 742, 46, 38, 4), "#1d120a", 0.8);
  s.cord("M744 742L800 690", s.of("steel"), 16, 10);
  s.solid("M788 676L808 704L846 682Q900 660 940 612Q956 582 936 566Q914 552 888 574Q846 622 812 650Z", s.of("oak", { turn: -40 }), { drop: 22, edge: 8 });
  crumbs(s, 730, 900, [90, 40], 22, 3, "#4a3524");
}

function skinPeeled(s: Sheet): void {
  s.flat(rect(0, 0, 1600, 1067), s.of("lining", { part: 3 }));
  s.shade(rect(0, 0, 1600, 1067), 0.42);
  const rail = (y: number, part: number, material: "ash" | "stained" = "ash"): void => s.solid(rect(-20, y, 1660, 96), s.of(material, { part }), { drop: 22, edge: 6 });
  const stud = (x: number, part: number, material: "ash" | "stained" = "ash"): void => s.solid(rect(x, -20, 92, 1120), s.of(material, { turn: 90, part }), { drop: 22, edge: 6 });
  rail(90, 1);
  rail(490, 2, "stained");
  rail(900, 5, "stained");
  for (const [x, part] of [[760, 1], [1120, 2], [1470, 6]] as const) stud(x, part, part === 2 ? "stained" : "ash");
  for (const x of [760, 1120, 1470]) {
    for (const y of [90, 490, 900]) {
      s.solid(rect(x, y, 92, 96), s.of("ash", { part: x % 7 }), { edge: 4 });
      heads(s, [[x + 28, y + 30], [x + 64, y + 66]], 11, s.of(y === 900 ? "rust" : "brass"));
    }
  }
  const timbers = [...[90, 490, 900].map((y) => rect(-20, y, 1660, 96)), ...[760, 1120, 1470].map((x) => rect(x, -20, 92, 1120))];
  for (const timber of timbers) s.clipped(timber, () => waterStains(s));
  peeledSkin(s);
}

function waterStains(s: Sheet): void {
  for (const [x, y, r] of [[1166, 560, 96], [1130, 930, 150], [1500, 950, 90], [806, 946, 70], [980, 545, 60]] as const) {
    s.flat(blob(x, y, r * 1.5, r * 1.2, x, 0.3, 22), "#1d140e", 0.34);
    s.flat(blob(x, y, r, r * 0.8, x + 1, 0.3, 22), "#1d140e", 0.4);
  }
}

function peeledSkin(s: Sheet): void {
  const skin = rect(-20, -20, 600, 1120);
  s.shadow(rect(560, -20, 170, 1120), 60, 0.4);
  s.flat(skin, s.of("chalkyCream"));
  s.solid(rect(-20, 560, 600, 170), s.of("chalkySea"), { edge: 4 });
  s.line(open([-20, 545], [580, 545]), "#2c7e6e", 8, 0.8, "butt");
  for (const x of [120, 330, 520]) s.flat(rect(x, 640, 14, 380, 6), "#8d4f2c", 0.4);
  heads(s, [60, 200, 340, 480].map((x) => [x, 1020] as const), 12, s.of("rust"), false);
  s.shade(rect(500, -20, 80, 1120), 0.24, 90);
  upright(s, 616, -20, [[0, 96], [1120, 110]], s.of("aluminium", { turn: 90 }));
  s.line(open([676, -20], [690, 1100]), ink, 5, 0.5);
  s.line(open([690, -20], [706, 1100]), "#e9e2c9", 7, 0.9);
  heads(s, [[600, 120], [602, 330], [604, 540], [606, 760], [608, 960]], 8, "#20262c", false);
}

/** The rear corner from outside with the skin off; the camera does not move between the two plates. */
function corner(s: Sheet, mended: boolean): void {
  shedWall(s, 1400, "wall", 6);
  floor(s, 1400);
  s.shadow(rect(0, 0, 690, 1300), 40, 0.3);
  s.flat(rect(0, 0, 500, 1290), s.of(mended ? "ply" : "lining", { part: 2, turn: 90 }));
  s.shade(rect(0, 0, 500, 1290), 0.36);
  if (!mended) s.flat(blob(420, 1020, 210, 300, 8, 0.3), "#1d120a", 0.5);
  s.solid(rect(-20, 1290, 820, 66), s.of(mended ? "primer" : "rust"), { drop: 26, edge: 6 });
  block(s, [[-20, 360], [500, 360], [500, 480], [-20, 480]], [26, -22], s.of(mended ? "ash" : "stained", { part: 7 }));
  block(s, [[-20, 1150], [500, 1150], [500, 1280], [-20, 1280]], [26, -22], s.of(mended ? "ash" : "rot", { part: 3 }));
  const sound = s.of("stained", { turn: 90, part: 5 });
  const depth: Point = [84, -60];
  if (mended) {
    block(s, [[480, 600], [670, 800], [670, 1284], [480, 1284]], depth, s.of("ash", { turn: 90, part: 2 }), { drop: 20 });
    block(s, [[480, -20], [670, -20], [670, 790], [480, 590]], depth, sound, { drop: 20 });
    s.line(open([480, 595], [670, 795], [754, 735]), "#8b5220", 9);
    s.solid(blob(540, 662, 14, 22, 2), s.of("glue"), { edge: 4 });
    s.solid(blob(620, 752, 16, 26, 5), s.of("glue"), { edge: 4 });
    heads(s, [[530, 1190], [620, 1240], [530, 700], [620, 880], [524, 400], [524, 448]], 15, s.of("brass"));
    s.line(open([480, 960], [670, 960], [754, 900]), "#2f3640", 3, 0.6);
  } else {
    block(s, [[480, -20], [670, -20], [670, 1284], [480, 1284]], depth, sound, { drop: 20 });
    const foot = poly(...ragged([480, 800], [670, 860], 12, 30, 3), [754, 800], [754, 1224], [670, 1284], [480, 1284]);
    s.flat(foot, s.of("rot", { turn: 90 }));
    s.shade(poly([670, 860], [754, 800], [754, 1224], [670, 1284]), 0.34);
    s.flat(poly(...ragged([480, 1130], [600, 1284], 10, 26, 5), [480, 1284]), "#140d08", 0.9);
    for (const [x, y, to] of [[520, 850, 1120], [560, 900, 1210], [606, 880, 1150], [640, 930, 1250]] as const) s.line(open(...ragged([x, y], [x + 10, to], 9, 9, x)), "#120b07", 7, 0.8);
    heads(s, [[524, 400], [524, 448]], 14, s.of("rust"));
    s.flat(blob(612, 1016, 40, 26, 7), "#0e0805");
    screwdriver(s, { x: 606, y: 1014, turn: 14 }, 150);
    crumbs(s, 600, 1440, [250, 40], 60, 5, "#4a3524", 11);
    crumbs(s, 560, 1320, [120, 12], 18, 8, "#6d5034", 8);
  }
  skinEdge(s, mended);
}

function skinEdge(s: Sheet, mended: boolean): void {
  const edge = mended ? [[210, -20], [210, 1300]] as Point[] : ragged([230, -20], [200, 1300], 40, 8, 9);
  const skin = poly([-20, -20], ...edge, [-20, 1300]);
  s.solid(skin, s.of(mended ? "cream" : "chalkyCream"), { drop: 24, edge: 9 });
  s.clipped(skin, () => {
    s.flat(rect(-20, 640, 300, 170), s.of(mended ? "sea" : "chalkySea"));
    if (!mended) s.flat(blob(190, 1180, 130, 110, 3), "#8d4f2c", 0.5);
  });
}

function floorRotten(s: Sheet): void {
  benchTop(s, "slate", 8);
  const top: Point[] = [[-20, 470], [1620, 400], [1620, 110], [-20, 110]];
  s.flat(poly(...top), s.of("lining", { part: 4 }));
  s.clipped(poly(...top), () => {
    for (const [k, tone] of [[1, 0.34], [0.76, 0.3], [0.5, 0.44]] as const) s.flat(curve([[300, 520], [560 - 60 * k, 430 - 150 * k], [820, 440 - 90 * k], [1040, 430 - 260 * k], [1400, 420 - 200 * k], [1700, 400 - 240 * k], [1700, 520]], true), "#2a1b10", tone);
  });
  const span = (i: number): Point[] => Array.from({ length: 9 }, (_, k): Point => {
    const t = Math.max(0, (k - 2) / 6);
    return [k * 205 - 20, 470 - k * 8.6 + i * 44 + t * t * (i - 0.6) * 46 + Math.sin(k * 1.7 + i * 2) * 12 * t];
  });
  for (let i = 0; i < 5; i += 1) {
    const upper = span(i);
    const lower = span(i).map(([x, y], k): Point => [x, y + 44 - k * 1.6]);
    const band = `${curve(upper)}L${curve(lower.toReversed()).slice(1)}Z`;
    s.solid(band, s.of(i % 2 === 0 ? "stained" : "rot", { part: i, size: 0.8 }), { drop: i === 0 ? 0 : 16, edge: 6 });
  }
  for (const [x, y, tilt] of [[330, 380, -6], [640, 330, 10], [980, 350, -12], [1330, 300, 8]] as const) {
    s.flat(blob(x, y + 6, 44, 20, x), "#1d120a", 0.75);
    s.shadow(rect(x - 9, y - 100, 18, 100), 26, 0.4);
    s.solid(poly([x - 9 + tilt, y - 100], [x + 9 + tilt, y - 100], [x + 9, y], [x - 9, y + 2]), s.of("rust"), { edge: 4 });
    for (let k = 0; k < 6; k += 1) s.line(open([x - 10 + tilt * (1 - k / 6), y - 90 + k * 15], [x + 10 + tilt * (1 - k / 6), y - 83 + k * 15]), ink, 3, 0.5);
    s.solid(poly([x - 28 + tilt, y - 122], [x + 28 + tilt, y - 122], [x + 10 + tilt, y - 98], [x - 10 + tilt, y - 98]), s.of("darkRust"), { edge: 4, drop: 4 });
  }
  rule(s, { x: 90, y: 950, turn: 1 }, 560);
  crumbs(s, 800, 850, [420, 60], 80, 4, "#5b4229", 11);
  mallet(s, { x: 980, y: 900, turn: 12 });
}

function floorNew(s: Sheet): void {
  shedWall(s, 300, "wall", 9);
  s.shade(rect(0, 0, 1600, 300), 0.2);
  const deck = poly([-20, 560], [1620, 560], [1620, 250], [-20, 250]);
  s.flat(deck, s.of("ply", { part: 3 }));
  s.line(open([-20, 252], [1620, 252]), ink, 6, 0.6);
  s.solid(rect(-20, 180, 1660, 92), s.of("ash", { part: 6 }), { drop: 22, edge: 6 });
  heads(s, [140, 520, 900, 1280].map((x) => [x, 226] as const), 14, s.of("brass"));
  s.line(open([-20, 558], [1620, 558]), "#fff6e0", 5, 0.5);
  for (let i = 0; i < 5; i += 1) {
    const ply = rect(-20, 562 + i * 42, 1660, 42);
    s.flat(ply, s.of(i % 2 === 0 ? "ply" : "oak", { part: i + 1, size: 0.8 }));
    if (i % 2 === 1) s.shade(ply, 0.16, 90);
    s.line(open([-20, 562 + i * 42], [1620, 562 + i * 42]), ink, 4, 0.6, "butt");
  }
  s.shade(rect(-20, 740, 1660, 30), 0.3);
  s.solid(rect(-20, 770, 1660, 84), s.of("primer"), { edge: 7 });
  s.flat(rect(-20, 854, 1660, 230), s.of("concrete"));
  s.shade(rect(-20, 854, 1660, 110), 0.44);
  heads(s, [200, 620, 1040, 1460].map((x) => [x, 812] as const), 20, s.of("steel"), false);
  const bead = curve([[-20, 478], [120, 484], [260, 474], [400, 482], [540, 476], [680, 483], [820, 476], [960, 480]]);
  s.cord(bead, "#9ba5a8", 38, 8);
  heads(s, [160, 500, 840, 1180, 1500].map((x) => [x, 380] as const), 15, s.of("brass"));
  const gun = (points: Point[]): string => poly(...points);
  s.solid(gun([[952, 484], [966, 460], [1170, 354], [1200, 400]]), "#c9d0cf", { drop: 26, edge: 7 });
  s.solid(gun([[1164, 330], [1216, 420], [1660, 180], [1610, 90]]), s.of("greyPrimer", { turn: -28 }), { drop: 34, edge: 10 });
  s.solid(gun([[1150, 324], [1172, 312], [1234, 420], [1212, 434]]), s.of("primer"), { drop: 14, edge: 5 });
  s.line(open([1226, 414], [1640, 190]), ink, 10, 0.5);
  s.flat(circle(952, 484, 12), ink, 0.5);
  rule(s, { x: 60, y: 330, turn: 0 }, 300, 44);
}

export const caravanFrame: Plates = {
  "caravan-leak-stain": { format: "wide", draw: leakStain },
  "caravan-skin-peeled": { format: "wide", draw: skinPeeled },
  "caravan-corner-post-soft": { format: "tall", draw: (s) => corner(s, false) },
  "caravan-corner-post-new": { format: "tall", draw: (s) => corner(s, true) },
  "caravan-scarf-joint": { format: "wide", draw: scarf },
  "caravan-floor-edge-rotten": { format: "wide", draw: floorRotten },
  "caravan-floor-edge-new": { format: "wide", draw: floorNew },
};
