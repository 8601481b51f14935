/** The caravan from the side, as found and as finished, and the corner closed up. */
import { randomFrom } from "./noise.ts";
import { blob, circle, curve, ellipse, open, poly, ragged, rect, ring } from "./paths.ts";
import { floor, heads, shedWall } from "./places.ts";
import type { Plates } from "./plate.ts";
import type { Sheet } from "./sheet.ts";
import { ink } from "./sheet.ts";

/** Ground line of the yard plates. */
const ground = 880;

function yard(s: Sheet, rough: boolean): void {
  shedWall(s, 700, "slate", 7);
  s.flat(rect(0, 700, 1600, 400), s.of("grass"));
  s.shade(rect(0, 700, 1600, 30), 0.3);
  s.flat(poly([0, 860], [1600, 850], [1600, 1067], [0, 1067]), s.of("concrete"));
  s.flat(poly(...ragged([0, 862], [1600, 852], 40, 6, 2), [1600, 900], [0, 900]), s.of("concrete"));
  if (!rough) return;
  grassTufts(s, 40, 866, 1560, 44, 5);
}

export function grassTufts(s: Sheet, from: number, y: number, to: number, count: number, seed: number, tall = 70): void {
  const random = randomFrom(seed);
  for (let i = 0; i < count; i += 1) {
    const x = from + random() * (to - from);
    const high = tall * (0.4 + random() * 0.8);
    for (const lean of [-0.4, -0.1, 0.3]) {
      s.line(curve([[x, y + 6], [x + lean * high * 0.3, y - high * 0.5], [x + lean * high, y - high]]), i % 3 === 0 ? "#8d9c74" : "#57694b", 6);
    }
  }
}

function wheel(s: Sheet, x: number, y: number, flat: boolean): void {
  const tyre = flat ? `M${x - 104} ${y}C${x - 104} ${y - 62} ${x - 60} ${y - 104} ${x} ${y - 104}C${x + 60} ${y - 104} ${x + 104} ${y - 62} ${x + 104} ${y}C${x + 108} ${y + 40} ${x + 128} ${y + 60} ${x + 112} ${y + 80}L${x - 112} ${y + 80}C${x - 128} ${y + 60} ${x - 108} ${y + 40} ${x - 104} ${y}Z` : circle(x, y - 24, 104);
  const hub = flat ? y : y - 24;
  s.solid(tyre, s.of(flat ? "oldRubber" : "rubber"), { drop: 20, edge: 9 });
  s.solid(circle(x, hub, 62), s.of(flat ? "darkRust" : "cream"), { edge: 7, drop: 4 });
  s.solid(circle(x, hub, 26), s.of(flat ? "rust" : "steel"), { edge: 5 });
  for (let i = 0; i < 5; i += 1) s.flat(circle(x + Math.cos(i * 1.257) * 43, hub + Math.sin(i * 1.257) * 43, 7), ink, 0.7);
}

/** Drawbar, coupling and jockey wheel at the front. */
function drawbar(s: Sheet, steel: string): void {
  s.solid(poly([90, 786], [380, 756], [380, 802], [90, 812]), steel, { drop: 16, edge: 6 });
  s.solid("M40 782Q40 770 60 770L150 776L150 818L60 816Q44 814 40 800Z", s.of("darkSteel"), { drop: 14, edge: 6 });
  s.solid(rect(206, 700, 26, 150, 6), s.of("steel", { turn: 90 }), { drop: 10 });
  s.solid(circle(219, 858, 32), s.of("rubber"), { drop: 10, edge: 6 });
  s.solid(circle(219, 858, 12), s.of("steel"));
  s.cord(open([190, 706], [248, 694]), s.of("steel"), 14);
}

const shell = "M352 470L1398 470Q1424 540 1420 640Q1418 720 1400 770Q1394 790 1370 790L380 790Q352 790 346 764Q326 650 330 560Q334 510 352 470Z";

function body(s: Sheet, found: boolean): void {
  s.flat(ellipse(900, ground + 14, 620, 34), ink, 0.45);
  s.flat(rect(400, 780, 960, 60), "#10161e");
  drawbar(s, s.of(found ? "rust" : "primer"));
  for (const x of [470, 1290]) s.solid(poly([x, 786], [x + 26, 786], [x + 40, ground], [x - 30, ground], [x - 30, ground - 14], [x - 4, ground - 14]), s.of(found ? "rust" : "darkSteel"), { edge: 4 });
  s.solid(shell, s.of(found ? "chalkyCream" : "cream"), { drop: 26, edge: 12 });
  s.clipped(shell, () => {
    s.solid(rect(300, 640, 1200, 84), s.of(found ? "chalkySea" : "sea"), { edge: 3 });
    s.line(open([300, 622], [1500, 622]), found ? "#66857c" : "#2c7e6e", 8);
    s.shade(rect(300, 750, 1200, 60), 0.22, 0);
    s.shade(rect(1350, 440, 100, 400), 0.2, 90);
  });
  s.flat("M736 792Q736 676 870 676Q1004 676 1004 792Z", "#10161e");
  s.line("M736 792Q736 676 870 676Q1004 676 1004 792", found ? "#8d4f2c" : "#c9d0cf", 11);
  wheel(s, 870, 800, found);
  s.solid(rect(1110, 490, 190, 286, 18), s.of(found ? "chalkyCream" : "cream", { part: 3 }), { edge: 5 });
  s.clipped(rect(1110, 490, 190, 286, 18), () => s.flat(rect(1100, 640, 220, 84), s.of(found ? "chalkySea" : "sea")));
  s.line(rect(1110, 490, 190, 286, 18), ink, 4, 0.55);
  s.solid(rect(1128, 606, 44, 16, 6), s.of("steel"), { drop: 5 });
  sideWindow(s, 440, found);
  sideWindow(s, 770, found);
  s.solid(rect(1374, 676, 26, 56, 8), "#b93a16", { edge: 5, drop: 4 });
}

function sideWindow(s: Sheet, x: number, found: boolean): void {
  s.solid(rect(x, 500, 250, 104, 26), s.of(found ? "oldRubber" : "rubber"), { drop: 6, edge: 4 });
  const pane = rect(x + 13, 512, 224, 80, 18);
  s.flat(pane, found ? "#7d8f92" : s.of("glass"));
  s.clipped(pane, () => {
    if (found) {
      s.flat(rect(x, 500, 84, 110), "#a5a08c", 0.8);
      s.shade(rect(x + 90, 500, 170, 110), 0.36);
    } else {
      s.flat(rect(x, 500, 60, 110), s.of("cloth", { turn: 90 }));
      s.flat(rect(x + 196, 500, 60, 110), s.of("cloth", { turn: 90 }));
      s.flat(rect(x + 60, 500, 136, 110), "#e9e3a0", 0.75);
      s.flat(poly([x + 150, 500], [x + 200, 500], [x + 110, 610], [x + 60, 610]), "#ffffff", 0.35);
    }
  });
}

function lid(s: Sheet, y: number, found: boolean): void {
  const path = `M330 ${y}Q340 ${y - 66} 400 ${y - 70}L1360 ${y - 70}Q1416 ${y - 66} 1424 ${y}Z`;
  s.solid(path, s.of(found ? "aluminium" : "aluminium", { part: 4 }), { drop: 14, edge: 9 });
  s.clipped(path, () => s.flat(rect(300, y - 20, 1200, 30), found ? "#8f9a9d" : s.of("cream")));
  for (let x = 380; x < 1400; x += 64) s.flat(circle(x, y - 10, 4.5), ink, 0.6);
  if (found) {
    for (const [x, wide, k] of [[470, 90, 1], [660, 60, 2], [1010, 130, 3], [1280, 70, 4]] as const) s.solid(blob(x, y - 66, wide, 13, k, 0.4), s.of("moss"), { edge: 4 });
    s.flat(blob(1180, y - 36, 160, 26, 9, 0.4), "#6d7568", 0.6);
  }
}

/** Canvas sides and the two lift arms that hold the roof up. */
function canvasSides(s: Sheet): void {
  s.solid(poly([360, 470], [1396, 470], [1372, 226], [384, 226]), s.of("canvas"), { drop: 20, edge: 6 });
  for (const x of [560, 900, 1230]) s.line(open([x, 470], [x * 0.96 + 36, 226]), "#a89c80", 5);
  s.shade(poly([384, 226], [1372, 226], [1374, 252], [380, 252]), 0.34);
  for (const x of [616, 952]) {
    s.solid(rect(x, 290, 220, 116, 12), s.of("sea"), { edge: 4 });
    s.flat(rect(x + 14, 304, 192, 88, 8), "#e9e3a0", 0.9);
    for (let k = 1; k < 8; k += 1) s.line(open([x + 14 + k * 24, 304], [x + 14 + k * 24, 392]), "#56616a", 2, 0.5);
    s.line(open([x + 14, 348], [x + 206, 348]), "#56616a", 2, 0.5);
  }
  for (const [a, b] of [[420, 470], [1340, 1290]] as const) s.cord(open([a, 464], [b, 232]), s.of("steel"), 16, 8);
}

function arrived(s: Sheet): void {
  yard(s, true);
  body(s, true);
  for (const [x, long] of [[470, 120], [560, 190], [650, 90], [800, 150], [960, 210], [1130, 80]] as const) {
    s.flat(curve([[x - 5, 600], [x + 8, 604], [x + 4, 600 + long], [x - 2, 600 + long], [x - 9, 640]], true), "#7a3c1a", 0.6);
  }
  s.flat(blob(1360, 720, 50, 70, 4), "#7a3c1a", 0.4);
  lid(s, 474, true);
  s.solid(blob(760, 792, 90, 12, 3, 0.4), s.of("moss"), { edge: 3 });
  grassTufts(s, 60, 886, 1540, 70, 11, 90);
  grassTufts(s, 780, 896, 960, 14, 4, 110);
}

function finished(s: Sheet): void {
  yard(s, false);
  body(s, false);
  canvasSides(s);
  lid(s, 240, false);
  s.solid(rect(1120, 836, 180, 50, 6), s.of("pine"), { drop: 18, edge: 6 });
  s.line(open([1120, 850], [1300, 850]), ink, 3, 0.4);
  s.solid(poly([572, ground], [556, 838], [676, 838], [660, ground]), s.of("primer"), { drop: 14, edge: 5 });
  s.line(curve([[558, 838], [616, 790], [674, 838]]), "#5f6b74", 5);
}

function cornerFinished(s: Sheet): void {
  shedWall(s, 1400, "wall", 6);
  floor(s, 1400);
  const side = rect(-20, -20, 700, 1310);
  s.shadow(rect(0, 0, 770, 1300), 44, 0.36);
  s.flat(side, s.of("cream"));
  s.flat(poly([680, -20], [754, -80], [754, 1230], [680, 1290]), s.of("cream", { part: 5 }));
  s.flat(rect(-20, 640, 700, 170), s.of("sea"));
  s.flat(poly([680, 640], [754, 580], [754, 750], [680, 810]), s.of("sea"));
  s.line(open([-20, 610], [680, 610], [754, 550]), "#2c7e6e", 12);
  s.shade(poly([680, -20], [754, -80], [754, 1230], [680, 1290]), 0.26);
  s.solid(rect(628, -20, 62, 1312), s.of("aluminium", { turn: 90 }), { drop: 10, edge: 8 });
  s.flat(rect(650, -20, 18, 1312), s.of("rubber"));
  heads(s, Array.from({ length: 11 }, (_, i) => [640, 40 + i * 122] as const), 9, s.of("steel"));
  s.solid(rect(-20, 1258, 712, 40), s.of("aluminium"), { drop: 12, edge: 6 });
  heads(s, Array.from({ length: 6 }, (_, i) => [50 + i * 110, 1278] as const), 9, s.of("steel"));
  s.solid(rect(-20, 1310, 780, 50), s.of("primer"), { drop: 26, edge: 6 });
  s.solid(rect(380, 900, 190, 260, 30), s.of("steel"), { drop: 20, edge: 9 });
  s.solid(rect(398, 918, 154, 130, 16), "#b93a16", { edge: 8 });
  s.solid(rect(398, 1052, 154, 90, 16), "#c98a2e", { edge: 8 });
  for (let k = 1; k < 7; k += 1) s.line(open([398 + k * 22, 922], [398 + k * 22, 1138]), ink, 3, 0.28);
  s.flat(poly([410, 930], [440, 930], [420, 1030], [408, 1030]), "#ffffff", 0.4);
  s.solid(ring(190, 1020, 74, 50), s.of("steel"), { drop: 8, edge: 6 });
  s.solid(circle(190, 1020, 50), "#b93a16", { edge: 9 });
  s.solid(rect(-20, 120, 420, 330, 50), s.of("rubber"), { drop: 10, edge: 5 });
  s.flat(rect(-20, 144, 396, 282, 36), s.of("glass"));
  s.flat(poly([190, 144], [290, 144], [140, 426], [40, 426]), "#ffffff", 0.24);
  s.line(curve([[-10, 425], [340, 425], [375, 390], [375, 150]]), "#d3d645", 7, 0.8);
}

export const caravanWhole: Plates = {
  "caravan-arrived": { format: "wide", draw: arrived },
  "caravan-corner-finished": { format: "tall", draw: cornerFinished },
  "caravan-finished": { format: "wide", draw: finished },
};
