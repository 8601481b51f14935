/** The lathe's headstock bearing: as found, poured and scraped. */
import { turned } from "./blocks.ts";
import { halfShell } from "./lathe-parts.ts";
import { randomFrom } from "./noise.ts";
import { blob, circle, curve, open, placed, poly, ragged, rect } from "./paths.ts";
import { benchEdge, benchTop, shedWall } from "./places.ts";
import type { Plates } from "./plate.ts";
import type { Sheet } from "./sheet.ts";
import { ink } from "./sheet.ts";
import { chisel, crumbs, openTin } from "./tools.ts";

function oilGroove(s: Sheet, dirty: boolean): void {
  const path = curve([[380, 400], [560, 520], [800, 556], [1040, 520], [1220, 400]]);
  s.line(path, ink, 26, 0.75);
  s.line(path, dirty ? "#3a2c1c" : "#7d8584", 18);
  s.solid(circle(800, 556, 24), dirty ? "#20170f" : "#3c4650", { edge: 5 });
}

function bearingBefore(s: Sheet): void {
  benchTop(s, "beech", 11);
  halfShell(s, s.of("darkRust"), s.of("whiteMetal"));
  s.clipped(rect(290, 340, 1020, 420), () => {
    s.flat(rect(290, 340, 1020, 420), "#5a5148", 0.38);
    const random = randomFrom(6);
    for (let i = 0; i < 46; i += 1) {
      const x = 300 + random() * 1000;
      s.line(open(...ragged([x, 340], [x + 6, 760], 8, 3, i)), random() > 0.5 ? "#3c3732" : "#e3e5e0", 1.5 + random() * 5, 0.55);
    }
    for (const [x, wide] of [[470, 40], [720, 22], [980, 60]] as const) s.shade(rect(x, 340, wide, 420), 0.4, 0);
    oilGroove(s, true);
    s.flat(poly([1310, 640], ...ragged([1310, 640], [1120, 760], 7, 18, 3), [1310, 770]), s.of("darkRust", { part: 2 }));
    s.line(open(...ragged([1310, 640], [1120, 760], 7, 18, 3)), ink, 6, 0.7);
    s.line(open(...ragged([1120, 760], [900, 650], 8, 14, 5)), ink, 4, 0.8);
  });
  crumbs(s, 1190, 930, [160, 40], 16, 4, "#c3c7c4", 14);
  s.flat(blob(560, 950, 260, 50, 8), "#3a2c1c", 0.4);
}

function bearingBlue(s: Sheet): void {
  benchTop(s, "beech", 11);
  halfShell(s, s.of("castIron"), s.of("whiteMetal", { part: 2 }));
  s.clipped(rect(290, 340, 1020, 420), () => {
    const random = randomFrom(14);
    for (let i = 0; i < 300; i += 1) {
      const [x, y] = [300 + random() * 1000, 350 + random() * 400];
      s.line(curve([[x, y], [x + 12, y - 7], [x + 26, y - 4]]), random() > 0.5 ? "#e9ece8" : "#8b9291", 3, 0.6);
    }
    for (let i = 0; i < 210; i += 1) {
      const [x, y] = [320 + random() * 960, 356 + random() * 390];
      if (x > 940 && random() > 0.3) continue;
      s.flat(blob(x, y, 8 + random() * 11, 6 + random() * 7, i, 0.35, 8), "#272c8c", 0.62 + random() * 0.3);
    }
    oilGroove(s, false);
  });
  chisel(s, { x: 560, y: 930, turn: 3 }, 38, 300);
  openTin(s, 300, 960, 92, "#272c8c");
  s.solid(blob(430, 1000, 60, 36, 5), s.of("cloth"), { drop: 10, edge: 5 });
}

function pour(s: Sheet): void {
  shedWall(s, 860, "slate", 5);
  s.shade(rect(0, 0, 1600, 860), 0.14);
  benchEdge(s, 860, "beech");
  s.solid("M420 860L450 520Q452 480 500 480L700 480L720 560L880 560L900 480L1100 480Q1150 480 1152 520L1180 860Z", s.of("castIron"), { drop: 36, edge: 12 });
  s.solid("M590 480C590 640 1010 640 1010 480Z", s.of("whiteMetal"), { edge: 8 });
  turned(s, 330, 470, [[0, 56], [950, 56]], s.of("japan"), 20);
  s.line(open([330, 446], [1270, 446]), "#6d6a66", 12, 0.4);
  for (const [x, k] of [[540, 2], [1010, 5]] as const) {
    s.solid(blob(x + 24, 486, 74, 112, k, 0.14), s.of("clay"), { drop: 22, edge: 10 });
    for (const dy of [-40, 4, 44]) s.flat(blob(x + 12, 486 + dy, 24, 13, k + dy, 0.2), ink, 0.2);
  }
  s.solid(blob(800, 520, 178, 32, 9, 0.06), s.of("moltenMetal"), { edge: 5 });
  s.flat(curve([[776, 172], [796, 230], [802, 400], [790, 518], [838, 518], [834, 400], [832, 250], [844, 172]], true), "#f7f3e2");
  s.line(curve([[784, 190], [803, 250], [808, 400], [798, 512]]), "#e0853c", 5, 0.8);
  s.line(curve([[838, 190], [827, 250], [828, 410], [830, 512]]), "#b9bdb9", 5, 0.9);
  ladle(s);
  for (const [x, y] of [[720, 500], [890, 506], [940, 470]] as const) s.solid(circle(x, y, 9), s.of("moltenMetal"), { edge: 3 });
  smoke(s);
}

function ladle(s: Sheet): void {
  const at = { x: 985, y: 160, turn: -18 };
  s.solid(placed(poly([100, -14], [760, -22], [760, 22], [100, 14]), at), s.of("darkSteel", { turn: -18 }), { drop: 30, edge: 7 });
  s.solid(placed(rect(470, -36, 300, 72, 30), at), s.of("oak", { turn: -18 }), { drop: 30, edge: 9 });
  s.solid(placed("M-150 -62L140 -62Q150 60 60 104L-40 104Q-120 80 -136 -20L-190 -50Q-196 -62 -150 -62Z", at), s.of("japan"), { drop: 40, edge: 12 });
  s.flat(placed("M-170 -58L134 -58L130 -20Q0 -34 -128 -22Z", at), "#f0efe6");
  s.line(placed(open([-128, -22], [130, -20]), at), "#e0853c", 6, 0.7);
}

function smoke(s: Sheet): void {
  for (const [x, y, r, k] of [[640, 330, 70, 2], [600, 220, 96, 3], [640, 96, 120, 4]] as const) s.flat(blob(x, y, r, r * 0.8, k, 0.2), "#8fa3a1", 0.2);
}

export const latheBearing: Plates = {
  "lathe-bearing-before": { format: "wide", draw: bearingBefore },
  "lathe-bearing-pour": { format: "wide", draw: pour },
  "lathe-bearing-blue": { format: "wide", draw: bearingBlue },
};
