/** Veneer work on the fall front: the split, the glue, the cauls, the stringing and the mend. */
import { block } from "./blocks.ts";
import { randomFrom } from "./noise.ts";
import type { Point } from "./paths.ts";
import { blob, circle, curve, ellipse, open, placed, poly, ragged, rect, ring } from "./paths.ts";
import { benchEdge, benchTop, shedWall } from "./places.ts";
import type { Plates } from "./plate.ts";
import type { Sheet } from "./sheet.ts";
import { ink } from "./sheet.ts";
import { clamp, crumbs, rule } from "./tools.ts";

const face = rect(216, 226, 1168, 600);
const splitLine = ragged([216, 560], [1180, 470], 26, 12, 31);

/** The fall front flat on the bench: clamped frame, figured face, boxwood line, lock at the top edge. */
function fallFront(s: Sheet, mended: boolean): void {
  benchTop(s, "slate", 16);
  s.solid(rect(150, 160, 1300, 732, 6), s.of("walnut", { part: 3 }), { drop: 40, edge: 12 });
  s.line(rect(182, 192, 1236, 668), ink, 3, 0.3);
  s.solid(face, s.of(mended ? "figured" : "dullFigured", { part: 4 }), { edge: 4 });
  s.line(rect(262, 272, 1076, 508), "#d9b983", 7, mended ? 0.95 : 0.6);
  s.solid(rect(700, 150, 200, 50, 4), s.of(mended ? "brass" : "tarnish"), { edge: 6 });
  s.flat(rect(776, 164, 48, 20, 4), ink, 0.85);
}

function split(s: Sheet): void {
  fallFront(s, false);
  const spread = splitLine.map(([x, y], i): Point => [x, y + 30 * (1 - i / 26) + 4]);
  const gap = poly(...splitLine, ...spread.toReversed());
  s.flat(poly([216, 520], ...ragged([216, 520], [370, 552], 6, 14, 2), [360, 590], ...ragged([360, 590], [216, 640], 6, 14, 3)), s.of("pine", { part: 4 }));
  s.line(open(...ragged([216, 520], [370, 552], 6, 14, 2)), ink, 5, 0.7);
  s.flat(gap, "#120b07");
  s.line(open(...splitLine.map(([x, y]): Point => [x, y - 5])), "#d9c6a8", 5, 0.8);
  s.line(open(...spread.map(([x, y]): Point => [x + 2, y + 9])), ink, 12, 0.34);
  for (const i of [7, 12, 17]) {
    const [x, y] = splitLine[i] ?? [0, 0];
    s.solid(poly([x - 46, y + 2], [x - 12, y - 30], [x + 34, y - 16], [x + 52, y + 2]), s.of("dullFigured", { part: 8 }), { drop: 14, edge: 5 });
  }
  s.line(open(...ragged([700, 530], [820, 720], 8, 10, 8)), ink, 4, 0.7);
  s.solid(poly([1130, 910], [1250, 890], [1290, 930], [1160, 956]), s.of("dullFigured", { part: 2 }), { drop: 10, edge: 5 });
  rule(s, { x: 230, y: 940, turn: 0 }, 620, 54);
}

function fallMended(s: Sheet): void {
  fallFront(s, true);
  const sliver = poly(...splitLine, ...splitLine.map(([x, y], i): Point => [x, y + 26 * (1 - i / 26) + 3]).toReversed());
  s.flat(sliver, s.of("figured", { part: 9 }));
  s.flat(sliver, "#f0cf9a", 0.2);
  s.line(open([262, 540], [262, 620]), "#d9b983", 7);
  s.line(sliver, "#4a2813", 2.4, 0.8);
  s.flat(poly([380, 226], [560, 226], [430, 826], [240, 826]), "#fff1d6", 0.12);
  s.solid(placed(rect(-130, -26, 260, 64, 10), { x: 1180, y: 940, turn: -6 }), s.of("pine"), { drop: 20, edge: 7 });
  s.solid(placed(rect(-134, 34, 268, 14), { x: 1180, y: 940, turn: -6 }), s.of("primer"), { edge: 3 });
  crumbs(s, 520, 940, [260, 24], 40, 5, "#a06a3d", 5);
  s.solid(placed(rect(-110, -30, 220, 60, 4), { x: 560, y: 950, turn: 5 }), s.of("steel"), { drop: 8, edge: 4 });
}

function gluePot(s: Sheet): void {
  shedWall(s, 800, "wall", 2);
  benchEdge(s, 800, "beech");
  s.solid(rect(470, 766, 560, 34, 8), s.of("japan"), { drop: 24, edge: 7 });
  for (const x of [520, 980]) s.solid(poly([x - 18, 700], [x + 18, 700], [x + 26, 774], [x - 26, 774]), s.of("japan"), { edge: 5 });
  for (let i = 0; i < 9; i += 1) {
    const x = 590 + i * 40;
    s.flat(curve([[x - 13, 764], [x - 10, 738], [x, 706 - (i % 2) * 12], [x + 10, 738], [x + 13, 764]], true), "#4c57c4", 0.9);
    s.flat(curve([[x - 6, 764], [x - 4, 748], [x, 732], [x + 4, 748], [x + 6, 764]], true), "#d5daf7");
  }
  s.solid("M500 420L1000 420C1024 500 1020 600 980 680Q966 700 930 700L570 700Q534 700 520 680C480 600 476 500 500 420Z", s.of("castIron"), { drop: 40, edge: 14 });
  s.shade("M880 420L1000 420C1024 500 1020 600 980 680Q966 700 930 700L820 700C900 620 900 500 880 420Z", 0.3);
  s.flat(curve([[560, 450], [548, 540], [580, 640], [596, 640], [572, 540], [590, 450]], true), "#fff6e0", 0.2);
  s.solid(ellipse(750, 420, 268, 66), s.of("castIron", { part: 2 }), { edge: 9 });
  s.solid(ellipse(750, 408, 210, 50), s.of("darkSteel"), { drop: 8, edge: 7 });
  s.flat(ellipse(750, 412, 186, 40), s.of("glue"));
  s.flat(ellipse(690, 404, 74, 12), "#d99a4a", 0.7);
  s.line(curve([[486, 430], [520, 200], [750, 120], [980, 200], [1014, 430]]), ink, 17);
  s.line(curve([[486, 430], [520, 200], [750, 120], [980, 200], [1014, 430]]), "#717d86", 11);
  s.solid(poly([628, 410], [566, 150], [588, 146], [656, 412]), "#dfe6e4", { edge: 5 });
  s.line(open([634, 396], [600, 250]), "#b93a16", 6);
  for (let i = 0; i < 12; i += 1) s.line(open([582 + i * 4, 176 + i * 17], [592 + i * 4, 174 + i * 17]), ink, 2.4);
  s.solid(poly([806, 416], [780, 322], [836, 308], [864, 410]), "#3a2c22", { edge: 5 });
  s.solid(poly([774, 330], [762, 282], [826, 266], [840, 314]), s.of("brass"), { edge: 5 });
  s.solid(poly([772, 284], [700, 30], [724, 22], [818, 270]), s.of("ash", { turn: 74 }), { drop: 20, edge: 6 });
  for (const [x, y, r, k] of [[600, 320, 44, 1], [570, 240, 60, 2], [610, 140, 80, 3]] as const) s.flat(blob(x, y, r, r * 0.9, k, 0.2), "#eef2ef", 0.26);
  dish(s);
}

function dish(s: Sheet): void {
  s.solid("M1130 730L1490 730C1480 790 1420 806 1310 806C1200 806 1140 790 1130 730Z", s.of("cream"), { drop: 26, edge: 9 });
  s.flat(ellipse(1310, 730, 180, 30), "#a8956c");
  const random = randomFrom(17);
  for (let i = 0; i < 90; i += 1) {
    const [x, y] = [1310 + (random() + random() - 1) * 160, 726 - (random() * 24) + (random() - 0.5) * 16];
    s.solid(circle(x, y, 7 + random() * 4), i % 3 === 0 ? "#b8772e" : "#a5682c", { edge: 4 });
  }
}

function cauls(s: Sheet): void {
  fallFront(s, true);
  s.solid(poly([190, 400], [1410, 380], [1420, 660], [180, 670]), "#d9d3c2", { drop: 4, edge: 3 });
  block(s, [[170, 430], [1430, 430], [1430, 640], [170, 640]], [26, -30], s.of("pine", { part: 6 }), { drop: 24 });
  for (const [x, y, k] of [[220, 660, 1], [520, 664, 2], [760, 658, 3], [850, 664, 6], [1150, 662, 4], [1390, 660, 5]] as const) s.solid(blob(x, y, 22, 13, k, 0.3), s.of("glue"), { edge: 4, drop: 3 });
  for (const [x, part] of [[330, 1], [640, 2], [960, 3], [1270, 4]] as const) {
    block(s, [[x - 46, 120], [x + 46, 120], [x + 46, 900], [x - 46, 900]], [16, -18], s.of("beech", { turn: 90, part }), { drop: 26 });
    clamp(s, { x: x + 4, y: 128 }, 740);
  }
}

function stringing(s: Sheet): void {
  benchTop(s, "beech", 31);
  s.solid(rect(-40, -40, 1180, 900, 4), s.of("walnut", { part: 8 }), { drop: 44, edge: 12 });
  s.flat(rect(-40, -40, 1040, 760), s.of("figured", { part: 3 }));
  s.line("M-20 720L1000 720L1000 -20", "#120b07", 20, 1, "butt");
  s.line("M-20 725L1005 725L1005 -20", "#8b6a48", 4, 0.7, "butt");
  s.line("M-20 720L560 720", "#ead6a6", 18, 1, "butt");
  s.line("M-20 714L560 714", "#fff6e0", 4, 0.6, "butt");
  s.cord(curve([[556, 720], [640, 716], [720, 690], [800, 620], [900, 590], [1060, 640], [1240, 600], [1420, 660], [1620, 620]]), "#ead6a6", 17, 12);
  const at = { x: 1000, y: 260, turn: 6 };
  s.solid(placed("M-70 -170L20 -170L20 -30L330 -30Q350 -30 350 -10L350 50Q350 70 330 70L20 70L20 150Q20 170 0 170L-50 170Q-70 170 -70 150Z", at), s.of("beech", { part: 3 }), { drop: 30, edge: 11 });
  s.solid(placed(poly([-8, -40], [14, -40], [14, 90], [6, 104], [-8, 90]), at), s.of("steel", { turn: 90 }), { edge: 4 });
  for (const y of [-110, 120]) s.solid(placed(circle(-24, y, 17), at), s.of("brass"), { edge: 5, drop: 4 });
  crumbs(s, 1000, 500, [30, 120], 40, 6, "#b98f58", 6);
  crumbs(s, 760, 770, [200, 18], 20, 4, "#b98f58", 6);
  s.solid(placed("M-190 -26Q-150 -50 -60 -40L60 -40Q150 -50 190 -26Q210 0 190 26Q150 50 60 40L-60 40Q-150 50 -190 26Q-210 0 -190 -26Z", { x: 400, y: 950, turn: -8 }), s.of("oak", { turn: -8 }), { drop: 24, edge: 9 });
  s.solid(placed(rect(180, -16, 190, 32, 4), { x: 400, y: 950, turn: -8 }), s.of("steel"), { drop: 14, edge: 4 });
  s.cord(ring(1300, 890, 120, 119), "#ead6a6", 14, 10);
  s.cord(curve([[1180, 890], [1210, 960], [1300, 996], [1400, 960], [1412, 880], [1340, 800], [1240, 800], [1170, 850], [1110, 930]]), "#ead6a6", 14, 8);
}

export const bureauVeneer: Plates = {
  "bureau-fall-split": { format: "wide", draw: split },
  "bureau-glue-pot": { format: "wide", draw: gluePot },
  "bureau-cauls": { format: "wide", draw: cauls },
  "bureau-fall-mended": { format: "wide", draw: fallMended },
  "bureau-stringing": { format: "wide", draw: stringing },
};
