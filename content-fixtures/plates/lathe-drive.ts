/** Pitman, belt and the first turning. */
import { turned } from "./blocks.ts";
import type { Profile } from "./blocks.ts";
import type { Point } from "./paths.ts";
import { circle, curve, open, placed, poly, ragged, rect, ring } from "./paths.ts";
import { benchTop, heads, shedWall } from "./places.ts";
import type { Plates } from "./plate.ts";
import type { Sheet } from "./sheet.ts";
import { ink } from "./sheet.ts";
import { crumbs, shavings } from "./tools.ts";

function pitmanEnd(s: Sheet, x: number, y: number, clean: boolean): void {
  s.solid(`M${x + 260} ${y - 42}L${x} ${y - 60}C${x - 130} ${y - 66} ${x - 130} ${y + 66} ${x} ${y + 60}L${x + 260} ${y + 42}L${x + 260} ${y + 12}L${x + 60} ${y + 12}L${x + 60} ${y - 12}L${x + 260} ${y - 12}Z`, s.of(clean ? "darkSteel" : "rust"), { drop: 16, edge: 7 });
  s.solid(ring(x - 24, y, 58, 34), s.of(clean ? "brass" : "tarnish"), { drop: 8, edge: 7 });
  s.flat(circle(x - 24, y, 33), ink, 0.9);
  heads(s, [[x + 130, y - 34], [x + 220, y - 30], [x + 130, y + 34], [x + 220, y + 30]], 13, s.of(clean ? "steel" : "darkRust"), false);
}

function pitman(s: Sheet): void {
  benchTop(s, "slate", 12);
  const old: Point[] = [[180, 200], [820, 206], ...ragged([820, 206], [700, 300], 8, 22, 4), [180, 292]];
  s.solid(poly(...old), s.of("stained", { part: 2 }), { drop: 24, edge: 9 });
  s.solid(poly(...ragged([960, 210], [850, 300], 8, 24, 6), [1440, 286], [1440, 214]), s.of("stained", { part: 5 }), { drop: 24, edge: 9 });
  for (const [x, y] of [[796, 236], [770, 262], [905, 262], [930, 240]] as const) s.line(open([x - 60, y], [x + 50, y - 6]), "#e3c99f", 5, 0.8);
  pitmanEnd(s, 190, 246, false);
  s.solid(circle(1420, 250, 24), ink, { edge: 4 });
  s.solid("M180 500L700 474Q820 470 960 474L1460 500Q1490 540 1460 580L960 604Q820 608 700 604L180 580Z", s.of("ash", { part: 3 }), { drop: 30, edge: 10 });
  s.line(curve([[330, 522], [820, 496], [1400, 522]]), "#fff6e0", 7, 0.4);
  pitmanEnd(s, 190, 540, true);
  s.solid(ring(1420, 540, 34, 19), s.of("brass"), { drop: 4, edge: 5 });
  s.flat(circle(1420, 540, 18), ink, 0.9);
  spokeshave(s, 830, 810);
  shavings(s, 1250, 850, 190, 12, 5, ["#e3c99f", "#d9ba8a", "#c39d69"]);
  shavings(s, 380, 860, 150, 7, 9, ["#e3c99f", "#d9ba8a"]);
}

function spokeshave(s: Sheet, x: number, y: number): void {
  s.solid(placed("M-330 -10Q-340 -36 -290 -38Q-180 -40 -110 -18L-96 -50L96 -50L110 -18Q180 -40 290 -38Q340 -36 330 -10Q320 20 280 18Q180 10 110 34L96 46L-96 46L-110 34Q-180 10 -280 18Q-320 20 -330 -10Z", { x, y, turn: -8 }), s.of("beech", { turn: -8, part: 4 }), { drop: 28, edge: 9 });
  s.solid(placed(rect(-80, -44, 160, 84, 4), { x, y, turn: -8 }), s.of("steel"), { drop: 8, edge: 6 });
  s.solid(placed(rect(-64, -30, 128, 40, 14), { x, y, turn: -8 }), s.of("darkSteel"), { edge: 5 });
  heads(s, [[x, y - 12]], 18, s.of("brass"));
  s.solid(placed(circle(-50, 56, 17), { x, y, turn: -8 }), s.of("brass"), { edge: 5 });
  s.solid(placed(circle(50, 56, 17), { x, y, turn: -8 }), s.of("brass"), { edge: 5 });
}

function belt(s: Sheet): void {
  benchTop(s, "beech", 21);
  s.solid(rect(240, 250, 1120, 560), s.of("pine", { part: 2 }), { drop: 30, edge: 9 });
  const [top, foot] = [390, 670];
  s.solid(rect(-20, top, 816, foot - top), s.of("leather"), { drop: 22, edge: 10 });
  s.solid(rect(806, top, 820, foot - top), s.of("leather", { part: 3 }), { drop: 22, edge: 10 });
  for (const y of [top + 16, foot - 16]) for (const [a, b] of [[-20, 786], [816, 1620]] as const) s.line(open([a, y], [b, y]), "#4f2f17", 3, 0.7);
  const rows = [432, 530, 628];
  const holes = [...rows.flatMap((y): Point[] => [[740, y], [862, y]]), ...rows.flatMap((y): Point[] => [[664, y], [938, y]])];
  for (const [x, y] of holes) {
    s.flat(circle(x, y, 17), "#1d120a");
    s.line(circle(x, y, 17), "#b98454", 3, 0.6);
  }
  const lace = (points: Point[]): void => s.cord(curve(points), "#d9c29a", 24, 7);
  lace([[664, 432], [938, 432]]);
  lace([[740, 432], [862, 432]]);
  lace([[740, 432], [862, 530]]);
  lace([[664, 530], [938, 530]]);
  lace([[740, 530], [862, 530]]);
  lace([[862, 530], [960, 600], [1010, 760], [1130, 850], [1010, 930], [1180, 980], [1420, 930]]);
  lace([[740, 530], [640, 700], [520, 790], [560, 900], [380, 950]]);
  awl(s, 1240, 330);
  s.solid(placed(rect(-60, -8, 260, 130, 60), { x: 150, y: 880, turn: 12 }), s.of("card"), { drop: 20, edge: 8 });
  crumbs(s, 420, 880, [120, 30], 12, 7, "#6f4526", 12);
}

function awl(s: Sheet, x: number, y: number): void {
  const at = { x, y, turn: -24 };
  s.solid(placed(poly([-190, 0], [-20, -9], [-20, 9]), at), s.of("steel"), { drop: 12, edge: 4 });
  s.solid(placed(rect(-30, -17, 28, 34, 4), at), s.of("brass"), { drop: 12 });
  s.solid(placed("M-4 -20Q50 -58 140 -52Q206 -40 206 0Q206 40 140 52Q50 58 -4 20Z", at), s.of("oak", { turn: -24 }), { drop: 26, edge: 10 });
}

/** A half-round bead this far along, standing out from a cylinder. */
const bead = (along: number): Point[] => Array.from({ length: 13 }, (_, i): Point => [along + i * 7, 66 + Math.sin((i / 12) * Math.PI) * 30]);

const piece: Profile = [[0, 78], [116, 78], [122, 66], ...bead(134), [226, 66], ...bead(232), [324, 66], ...bead(330), [422, 66], [428, 78], [700, 76]];

function testPiece(s: Sheet): void {
  shedWall(s, 1067, "wall", 11);
  s.shade(rect(0, 640, 1600, 500), 0.2);
  s.solid(rect(-20, 800, 1660, 60), s.of("steel"), { drop: 24, edge: 9 });
  s.solid(rect(-20, 860, 1660, 220), s.of("japan"), { edge: 9 });
  s.solid("M-20 800L-20 250Q120 240 190 300L226 380L226 640L290 800Z", s.of("japan", { part: 2 }), { drop: 30, edge: 12 });
  turned(s, 150, 470, [[0, 70], [130, 70], [130, 92], [200, 92], [200, 50], [270, 50], [292, 26], [316, 0]], s.of("steel"), 20);
  s.solid("M1620 800L1620 260Q1440 250 1400 330L1384 400L1384 620L1330 800Z", s.of("japan", { part: 4 }), { drop: 30, edge: 12 });
  turned(s, 1120, 470, [[0, 0], [56, 40], [56, 54], [320, 54]], s.of("steel", { part: 2 }), 20);
  turned(s, 440, 470, piece, s.of("ash", { part: 5 }), 34);
  for (const x of [566, 669, 767, 865]) s.line(open([x, 405], [x, 535]), "#8d6639", 3, 0.5);
  s.solid("M640 800L700 640L620 612L600 566L1090 566L1080 612L880 640L940 800Z", s.of("castIron"), { drop: 30, edge: 10 });
  s.solid(rect(590, 552, 510, 26, 6), s.of("steel"), { drop: 8, edge: 5 });
  const at = { x: 960, y: 520, turn: 38 };
  s.solid(placed("M0 -4Q20 -24 70 -24L360 -24L360 24L70 24Q20 18 0 -4Z", at), s.of("steel", { turn: 38 }), { drop: 30, edge: 6 });
  s.line(placed(open([60, 0], [350, 0]), at), ink, 9, 0.4);
  s.solid(placed(rect(354, -34, 40, 68, 4), at), s.of("brass"), { drop: 26 });
  s.solid(placed("M390 -34Q480 -62 620 -46L800 -50L800 50L620 46Q480 62 390 34Z", at), s.of("oak", { turn: 38 }), { drop: 34, edge: 10 });
  shavings(s, 500, 786, 240, 18, 3, ["#e3c99f", "#d9ba8a", "#c39d69"]);
  shavings(s, 1240, 800, 150, 8, 8, ["#e3c99f", "#d9ba8a"]);
  s.line(curve([[960, 516], [920, 440], [850, 330], [760, 310], [720, 360], [760, 390]]), "#6d4c2b", 14);
  s.line(curve([[960, 516], [920, 440], [850, 330], [760, 310], [720, 360], [760, 390]]), "#e3c99f", 10);
}

export const latheDrive: Plates = {
  "lathe-pitman": { format: "wide", draw: pitman },
  "lathe-belt-laced": { format: "wide", draw: belt },
  "lathe-test-piece": { format: "wide", draw: testPiece },
};
