/** Roof, windows, stove and running gear of the caravan. */
import { block, turned } from "./blocks.ts";
import { randomFrom } from "./noise.ts";
import type { Point } from "./paths.ts";
import { blob, circle, curve, ellipse, open, placed, poly, ragged, rect, ring } from "./paths.ts";
import { benchTop, heads } from "./places.ts";
import type { Plates } from "./plate.ts";
import type { Sheet } from "./sheet.ts";
import { ink } from "./sheet.ts";
import { brush, crumbs, openTin, rule, shavings } from "./tools.ts";

/** A sprung skin pin seen a little from the side. */
function skinPin(s: Sheet, x: number, y: number): void {
  s.shadow(circle(x, y, 17), 26, 0.36);
  s.cord(open([x, y], [x - 10, y - 34]), s.of("brass"), 30, 0);
  s.solid(circle(x - 12, y - 42, 15), s.of("steel"), { edge: 4 });
}

function roofSheet(s: Sheet): void {
  s.flat(rect(0, 0, 1600, 1067), s.of("concrete"));
  s.line(curve([[-10, 930], [400, 960], [900, 940], [1610, 990]]), ink, 3, 0.25);
  for (const x of [300, 1180]) {
    block(s, [[x, 60], [x + 110, 60], [x + 110, 1010], [x, 1010]], [20, -14], s.of("pine", { turn: 90, part: x % 5 }), { drop: 40 });
    heads(s, [[x + 55, 100], [x + 55, 970]], 13, s.of("rust"));
  }
  const sheet = poly([-20, 210], [1620, 190], [1620, 850], [-20, 830]);
  s.solid(sheet, s.of("aluminium", { part: 1 }), { drop: 40, edge: 8 });
  s.line(curve([[-20, 330], [500, 318], [1100, 330], [1620, 316]]), "#eef2ef", 20, 0.3);
  s.flat(poly([-20, 790], [1620, 808], [1620, 850], [-20, 830]), "#8f9a9d", 0.6);
  s.line(open([-20, 726], [1620, 740]), "#272c8c", 5, 0.85, "butt");
  for (let i = 0; i < 20; i += 1) {
    const [x, y] = [50 + i * 80, 727 + i * 0.7];
    s.line(open([x, y - 13], [x, y + 13]), "#272c8c", 4, 0.85, "butt");
    if (i >= 11) continue;
    s.flat(circle(x, y, 10), "#141c26");
    s.line(circle(x, y, 11), "#eef2ef", 2.5, 0.8);
    if (i % 3 === 1) skinPin(s, x, y);
  }
  drill(s, 900, 640);
  shavings(s, 560, 700, 320, 18, 5, ["#f4f6f3", "#dfe4e4"], 0.5, "#6c767a");
  rule(s, { x: 1010, y: 360, turn: 4 }, 480);
}

/** A small drill lying on its side, with no name on it. */
function drill(s: Sheet, x: number, y: number): void {
  const at = { x, y, turn: -34 };
  s.solid(placed(rect(0, -5, 70, 10), at), s.of("steel"), { drop: 8 });
  s.solid(placed(poly([66, -16], [110, -30], [150, -30], [150, 30], [110, 30], [66, 16]), at), s.of("darkSteel"), { drop: 20, edge: 6 });
  s.solid(placed("M150 -50L330 -56Q372 -50 372 -6Q372 40 346 54L330 190Q326 206 308 204L262 198Q248 196 250 180L262 60L150 50Z", at), s.of("sea"), { drop: 30, edge: 9 });
  s.solid(placed(rect(232, 74, 26, 44, 8), at), "#20262c", { drop: 6 });
  for (const k of [0, 1, 2, 3]) s.line(placed(open([290 + k * 16, -34], [290 + k * 16, 20]), at), ink, 6, 0.5);
  s.solid(placed("M244 196L336 204L350 262Q352 280 334 280L250 272Q234 270 236 254Z", at), "#262d36", { drop: 26, edge: 7 });
}

function roofRivets(s: Sheet): void {
  s.flat(rect(0, 0, 1600, 1067), s.of("aluminium", { part: 3 }));
  s.shade(rect(0, 560, 1600, 507), 0.1);
  s.line(open([-20, 900], [1620, 900]), ink, 3, 0.3);
  const lap = poly([-20, -20], [1620, -20], [1620, 612], ...ragged([1620, 612], [-20, 606], 8, 2, 4));
  s.cord(curve(ragged([-20, 620], [1620, 626], 16, 7, 6)), "#6c767a", 40, 8);
  s.solid(lap, s.of("aluminium", { part: 7 }), { drop: 22, edge: 9 });
  s.line(open([-20, 500], [1620, 504]), "#272c8c", 4, 0.45);
  for (const x of [90, 280, 470, 660]) {
    s.shadow(circle(x, 502, 40), 9, 0.34);
    s.solid(circle(x, 502, 40), s.of("steel", { part: x % 5 }), { edge: 12, dark: 0.36, light: 0.5 });
    s.line(circle(x, 502, 12), ink, 3, 0.5);
    s.flat(circle(x, 502, 6), ink, 0.8);
  }
  for (const x of [1040, 1230, 1420]) {
    s.flat(circle(x, 503, 25), ink);
    s.line(circle(x, 503, 26), "#eef2ef", 4, 0.7);
  }
  s.shadow(circle(850, 502, 42), 12);
  s.solid(circle(850, 502, 42), s.of("steel"), { edge: 12 });
  const at = { x: 850, y: 496, turn: -52 };
  s.solid(placed(poly([0, -16], [54, -22], [54, 22], [0, 16]), at), s.of("brass"), { drop: 22, edge: 6 });
  s.solid(placed("M50 -34L210 -50Q240 -50 240 -20L240 40Q236 58 210 54L50 34Z", at), s.of("primer"), { drop: 44, edge: 10 });
  s.solid(placed("M200 -44Q420 -150 760 -170L766 -118Q460 -96 240 10Z", at), s.of("darkSteel", { turn: -52 }), { drop: 40, edge: 8 });
  s.solid(placed("M210 50Q420 130 760 110L760 58Q460 74 240 -6Z", at), s.of("darkSteel", { turn: -52 }), { drop: 40, edge: 8 });
  s.solid(placed(circle(206, 2, 19), at), s.of("steel"), { edge: 6, drop: 4 });
  heads(s, [[200, 960], [600, 960], [1000, 960], [1400, 960]], 17, s.of("steel"), false);
}

function windowSeals(s: Sheet): void {
  s.flat(rect(0, 0, 1600, 1067), s.of("canvas"));
  s.shade(poly([0, 0], [0, 1067], [36, 1067], [36, 0]), 0.1);
  const path = (y: number, to: number): string => curve([[150, y], [420, y - 14], [760, y + 12], [to, y - 6]]);
  s.cord(path(250, 1110), s.of("oldRubber"), 96, 24);
  s.line(path(250, 1110), "#2a2d2d", 22, 0.8, "butt");
  const random = randomFrom(8);
  for (let i = 0; i < 32; i += 1) {
    const x = 130 + i * 31;
    const y = 250 + Math.sin(i / 5) * 8;
    const high = 18 + random() * 24;
    s.line(open(...ragged([x, y - high], [x + (random() - 0.5) * 20, y + high], 4, 5, i)), "#17191a", 3 + random() * 4, 0.9);
  }
  s.flat(blob(560, 214, 26, 20, 3, 0.4), s.of("canvas"));
  s.flat(blob(896, 290, 30, 20, 6, 0.4), s.of("canvas"));
  crumbs(s, 700, 350, [420, 26], 24, 8, "#3a3d3c", 7);
  const coil = Array.from({ length: 60 }, (_, i): Point => {
    const a = i * 0.36;
    const r = 300 - i * 2.9;
    return [1120 + Math.cos(a) * r, 640 + Math.sin(a) * r * 0.98];
  });
  const whole = [[110, 530], [420, 520], [760, 440], [1010, 352], [1220, 348], [1380, 440]].map(([x, y]): Point => [x ?? 0, y ?? 0]);
  s.cord(curve(coil), s.of("rubber"), 58, 22);
  s.line(curve(coil), "#d3d645", 12);
  s.cord(curve(whole), s.of("rubber"), 74, 22);
  s.line(curve(whole.slice(1)), "#d3d645", 15);
  s.cord(curve([[420, 520], [360, 580], [250, 600], [130, 650]]), "#d3d645", 18, 10);
  rule(s, { x: 90, y: 900, turn: -1 }, 760, 70);
}

function burner(s: Sheet, x: number, y: number, r: number, clean: boolean): void {
  s.solid(circle(x, y, r), s.of(clean ? "brass" : "darkRust"), { drop: 26, edge: 9 });
  s.solid(circle(x, y, r * 0.7), s.of(clean ? "brass" : "rust", { part: 2 }), { edge: 6, drop: 5 });
  for (let i = 0; i < 24; i += 1) {
    const a = (i / 24) * Math.PI * 2;
    s.flat(circle(x + Math.cos(a) * r * 0.85, y + Math.sin(a) * r * 0.85, r * 0.055), ink, clean ? 0.9 : 0.5);
  }
  s.solid(circle(x, y, r * 0.2), s.of("steel"), { edge: 5 });
  if (!clean) for (const [dx, dy, k] of [[-0.5, 0.5, 1], [0.6, -0.2, 2], [-0.2, -0.7, 3]] as const) s.flat(blob(x + dx * r, y + dy * r, r * 0.3, r * 0.24, k, 0.4), "#b9b3a0", 0.75);
}

function panSupport(s: Sheet, x: number, y: number, r: number): void {
  for (let i = 0; i < 4; i += 1) {
    const a = (i * Math.PI) / 2 + 0.4;
    s.cord(open([x + Math.cos(a) * r * 0.3, y + Math.sin(a) * r * 0.3], [x + Math.cos(a) * r, y + Math.sin(a) * r]), s.of("darkSteel"), 20, 16);
  }
  s.add(`<path d="${circle(x, y, r * 0.8)}" fill="none" stroke="${ink}" stroke-width="20"/>`);
  s.line(circle(x, y, r * 0.8), "#717d86", 14);
}

function stove(s: Sheet): void {
  benchTop(s, "beech", 5);
  const tray = rect(110, 110, 900, 560, 60);
  s.solid(tray, s.of("cream"), { drop: 44, edge: 12 });
  s.solid(rect(160, 160, 800, 400, 40), s.of("cream", { part: 4 }), { edge: 9, dark: 0.2, light: 0 });
  for (const [x, clean] of [[360, true], [760, false]] as const) {
    s.solid(circle(x, 360, 150), s.of(clean ? "steel" : "darkRust"), { edge: 9 });
    s.flat(circle(x, 360, 60), ink, 0.85);
  }
  s.flat(blob(860, 470, 130, 80, 5), "#6a4523", 0.5);
  for (const x of [420, 700]) {
    s.solid(circle(x, 614, 34), s.of("japan"), { drop: 12, edge: 6 });
    s.line(open([x, 614], [x - 10, 586]), "#eef2ef", 6);
  }
  burner(s, 360, 360, 112, true);
  burner(s, 1240, 330, 130, false);
  panSupport(s, 1300, 760, 170);
  panSupport(s, 760, 930, 170);
  s.cord(curve([[120, 900], [220, 830], [340, 880], [330, 1010], [200, 1050], [120, 970], [200, 900], [420, 900], [500, 1060]]), s.of("canvas"), 36, 14);
  for (let i = 0; i < 4; i += 1) s.cord(open([1040 + i * 50, 1060], [1060 + i * 50, 1120]), s.of("brass"), 24, 8);
  brush(s, { x: 1520, y: 985, turn: 168 }, "#6d6f6a");
}

function chassis(s: Sheet): void {
  s.flat(rect(0, 0, 1600, 1067), s.of("concrete", { part: 2 }));
  s.flat(blob(520, 860, 300, 90, 4), "#7f878b", 0.6);
  s.solid(rect(-20, 60, 190, 960), s.of("darkRust"), { drop: 30, edge: 8 });
  const arm = (y: number, fill: string): void => {
    const far = 540 + (y < 540 ? -34 : 34);
    s.solid(poly([60, y - 54], [60, y + 54], [1250, far + 30], [1250, far - 30]), fill, { drop: 30, edge: 10 });
    s.line(open([60, y - 20], [1250, far - 10]), ink, 4, 0.35);
    s.line(open([60, y + 20], [1250, far + 10]), ink, 4, 0.35);
  };
  arm(170, s.of("steel", { turn: 17, part: 2 }));
  arm(910, s.of("primer"));
  s.flat(poly([60, 124], [340, 206], [300, 280], [60, 218]), s.of("rust"));
  s.flat(poly(...ragged([330, 206], [300, 286], 6, 12, 4), [250, 270], [250, 170]), s.of("rust"));
  s.solid(poly([560, 330], [640, 350], [640, 750], [560, 770]), s.of("primer"), { drop: 24, edge: 7 });
  s.solid(poly([1140, 470], [1290, 500], [1290, 590], [1140, 610]), s.of("darkSteel"), { drop: 26, edge: 8 });
  s.solid("M1270 500L1420 506Q1530 510 1530 545Q1530 584 1420 586L1270 590Z", s.of("greyPrimer"), { drop: 34, edge: 11 });
  s.solid(rect(1330, 524, 120, 40, 18), s.of("steel"), { drop: 10, edge: 6 });
  heads(s, [[1180, 510], [1180, 570], [1250, 520], [1250, 570]], 16, s.of("steel"), false);
  s.solid(circle(1000, 690, 66), s.of("rubber"), { drop: 26, edge: 9 });
  s.solid(circle(1000, 690, 34), s.of("steel"), { edge: 6 });
  const wire = { x: 560, y: 120, turn: 18 };
  s.solid(placed(rect(0, -34, 190, 68, 10), wire), s.of("ash"), { drop: 20, edge: 7 });
  s.solid(placed("M186 -22Q300 -30 420 -18Q440 0 420 18Q300 30 186 22Z", wire), s.of("ash", { part: 3 }), { drop: 20, edge: 7 });
  for (let i = 0; i < 11; i += 1) s.line(placed(open([8 + i * 17, 36], [2 + i * 17, 58]), wire), "#b3bec4", 6);
  openTin(s, 880, 910, 92, s.of("primer"));
  brush(s, { x: 700, y: 824, turn: 152 }, "#9c3f24");
  crumbs(s, 330, 330, [180, 60], 46, 2, "#643520", 7);
}

/** A taper roller bearing in its cage, seen from its small end. */
function taperBearing(s: Sheet, x: number, y: number, r: number): void {
  s.solid(ring(x, y, r, r * 0.5), s.of("darkSteel"), { drop: 30, edge: 7 });
  for (let i = 0; i < 18; i += 1) {
    const a = (i / 18) * 360;
    s.solid(placed(rect(-r * 0.07, -r * 0.94, r * 0.14, r * 0.26, 5), { x, y, turn: a }), s.of("steel"), { edge: 3, drop: 2 });
  }
  s.solid(ring(x, y, r * 0.62, r * 0.44), s.of("steel"), { edge: 5 });
}

function wheelBearing(s: Sheet): void {
  s.flat(rect(0, 0, 1600, 1067), s.of("slate"));
  s.solid(poly([70, 60], [1530, 40], [1550, 1010], [50, 1030]), s.of("card"), { drop: 12, edge: 5 });
  s.solid(circle(480, 540, 400), s.of("castIron"), { drop: 50, edge: 12 });
  s.solid(ring(480, 540, 386, 330), s.of("darkRust"), { edge: 6 });
  s.solid(circle(480, 540, 206), s.of("castIron", { part: 3 }), { drop: 16, edge: 10 });
  s.solid(circle(480, 540, 108), s.of("steel"), { edge: 8 });
  s.flat(circle(480, 540, 74), ink, 0.9);
  s.flat(blob(446, 576, 46, 30, 3), s.of("grease"));
  for (let i = 0; i < 5; i += 1) {
    const a = (i / 5) * Math.PI * 2 - 0.6;
    const [x, y] = [480 + Math.cos(a) * 156, 540 + Math.sin(a) * 156];
    s.solid(circle(x, y, 27), s.of("steel"), { edge: 6, drop: 9 });
    s.flat(circle(x, y, 13), ink, 0.75);
  }
  taperBearing(s, 1070, 300, 150);
  s.solid(ring(1350, 470, 132, 98), s.of("steel"), { drop: 26, edge: 9 });
  s.clipped(ring(1350, 470, 132, 98), () => {
    s.flat(blob(1420, 540, 110, 80, 3), "#39406f", 0.8);
    s.flat(blob(1440, 530, 70, 60, 6), "#6b4a6a", 0.6);
  });
  taperBearing(s, 1040, 640, 112);
  openTin(s, 1310, 820, 130, s.of("grease"));
  s.flat(blob(1290, 800, 60, 40, 9, 0.35), "#9a955a");
  turned(s, 900, 890, [[0, 17], [46, 17], [46, 27], [66, 27], [66, 17], [180, 17]], s.of("steel"), 12);
  s.solid(ring(960, 800, 44, 20), s.of("steel"), { drop: 9, edge: 5 });
  s.flat(ellipse(1080, 800, 60, 24), "#817d4a", 0.3);
}

export const caravanGear: Plates = {
  "caravan-roof-sheet": { format: "wide", draw: roofSheet },
  "caravan-roof-rivets": { format: "wide", draw: roofRivets },
  "caravan-window-seals": { format: "wide", draw: windowSeals },
  "caravan-stove": { format: "full", draw: stove },
  "caravan-chassis-primed": { format: "wide", draw: chassis },
  "caravan-wheel-bearing": { format: "wide", draw: wheelBearing },
};
