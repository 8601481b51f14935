/** Drawers of the bureau: runners, bottoms and beading. */
import { block } from "./blocks.ts";
import { drawerFront, escutcheon, escutcheonOutline } from "./bureau-parts.ts";
import type { Point } from "./paths.ts";
import { blob, circle, curve, ellipse, open, placed, poly, ragged, rect } from "./paths.ts";
import { benchTop, boards, heads } from "./places.ts";
import type { Plates } from "./plate.ts";
import type { Sheet } from "./sheet.ts";
import { ink } from "./sheet.ts";
import { bottle, crumbs, openTin, rule, shavings } from "./tools.ts";

/** Dovetails where the drawer side meets the front, at the left end. */
function dovetails(s: Sheet, x: number, top: number, foot: number): void {
  s.solid(rect(x - 70, top, 74, foot - top), s.of("walnut", { turn: 90, part: 2 }), { drop: 16, edge: 8 });
  const step = (foot - top) / 4;
  for (let i = 0; i < 4; i += 1) {
    const y = top + i * step;
    s.flat(poly([x, y + step * 0.22], [x - 46, y + step * 0.08], [x - 46, y + step * 0.92], [x, y + step * 0.78]), s.of("oak", { part: 3 }));
    s.line(open([x, y + step * 0.22], [x - 46, y + step * 0.08], [x - 46, y + step * 0.92], [x, y + step * 0.78]), ink, 4, 0.6);
  }
}

function runner(s: Sheet, isNew: boolean): void {
  benchTop(s, "slate", 22);
  const hollow: Point[] = [[190, 420], [300, 424], [460, 446], [640, 486], [800, 500], [980, 488], [1160, 452], [1330, 430], [1450, 424]];
  const side = isNew ? poly([190, 470], [1450, 470], [1450, 790], [190, 790]) : `${curve(hollow)}L1450 790L190 790Z`;
  s.solid(side, s.of("oak", { part: 5 }), { drop: 40, edge: 11 });
  s.line(open([190, 560], [1450, 560]), ink, 12, 0.5);
  s.line(open([190, 568], [1450, 568]), "#fff6e0", 3, 0.3);
  dovetails(s, 190, isNew ? 440 : 420, 790);
  if (isNew) newStrip(s);
  else {
    s.line(curve(hollow.slice(1, -1).map(([x, y]): Point => [x, y + 11])), "#5a3c1f", 15, 0.55);
    for (let i = 0; i < 12; i += 1) s.line(curve([[420 + i * 60, 480 + Math.sin(i) * 6], [470 + i * 60, 492], [530 + i * 60, 484]].map(([x, y]): Point => [x ?? 0, (y ?? 0) + 14])), "#d9ba8a", 3, 0.4);
    rule(s, { x: 250, y: 362, turn: 0 }, 1150, 58);
    crumbs(s, 820, 900, [300, 40], 26, 4, "#8d6639", 8);
  }
}

function newStrip(s: Sheet): void {
  s.solid(rect(196, 420, 1254, 50), s.of("ash", { part: 7 }), { drop: 6, edge: 8 });
  s.line(open([196, 471], [1450, 471]), "#8b5220", 6, 0.9);
  for (const x of [420, 760, 1180]) s.solid(blob(x, 476, 15, 9, x, 0.3), s.of("glue"), { edge: 3 });
  s.line(open([700, 428], [740, 462], [820, 426]), "#2f3640", 4, 0.6);
  blockPlane(s, 1050, 330);
  shavings(s, 620, 320, 190, 12, 3, ["#e3c99f", "#d9ba8a"]);
  shavings(s, 760, 900, 220, 9, 6, ["#e3c99f", "#d9ba8a", "#c39d69"]);
}

function blockPlane(s: Sheet, x: number, y: number): void {
  s.solid(placed("M-190 86L-190 40Q-180 20 -150 20L-60 20L-20 -20L120 -40Q190 -30 200 30L200 86Z", { x, y }), s.of("japan"), { drop: 22, edge: 9 });
  s.solid(placed(rect(-196, 76, 402, 14), { x, y }), s.of("steel"), { edge: 4 });
  s.solid(placed(poly([-30, 60], [110, -66], [136, -48], [20, 66]), { x, y }), s.of("steel", { turn: -42 }), { drop: 6, edge: 5 });
  s.solid(placed(circle(-130, 8, 28), { x, y }), s.of("brass"), { drop: 8, edge: 6 });
  s.solid(placed("M30 10Q60 -70 150 -50Q190 -30 180 20Q110 40 30 10Z", { x, y }), s.of("oak"), { drop: 8, edge: 8 });
}

function drawerBottom(s: Sheet): void {
  benchTop(s, "beech", 26);
  s.solid(rect(150, 120, 1300, 800), s.of("oak", { part: 2 }), { drop: 46, edge: 12 });
  s.solid(rect(196, 166, 1208, 700), s.of("pine", { part: 1 }), { edge: 6, dark: 0.2, light: 0 });
  s.shade(rect(196, 166, 1208, 18), 0.34, 0);
  s.shade(rect(196, 166, 18, 700), 0.34, 0);
  s.solid(rect(150, 866, 1300, 80), s.of("walnut", { part: 4 }), { drop: 30, edge: 10 });
  s.flat(blob(1080, 340, 170, 100, 4, 0.2), "#7d5a34", 0.3);
  s.flat(rect(196, 500, 1208, 20), s.of("ash", { part: 6 }));
  s.line(open([196, 500], [1404, 500]), "#8b5220", 3, 0.8);
  s.line(open([196, 520], [1404, 520]), "#8b5220", 3, 0.8);
  for (const [x, tilt] of [[330, 2], [640, -2], [960, 3], [1240, -1]] as const) {
    const strip = placed(rect(-58, -120, 116, 240), { x, y: 510, turn: tilt });
    s.flat(placed(rect(-66, -128, 132, 256, 14), { x, y: 510, turn: tilt }), "#8b5220", 0.4);
    s.solid(strip, s.of("canvas", { turn: tilt, part: x % 5 }), { drop: 4, edge: 4 });
    for (const k of [-50, -20, 20, 46]) s.line(placed(open([k, 118], [k + 3, 132]), { x, y: 510, turn: tilt }), "#d8d0bc", 3);
  }
  for (const [i, x] of [240, 500, 760, 1020, 1270].entries()) block(s, [[x, 812], [x + 110, 812], [x + 110, 862], [x, 862]], [14, -40], s.of("pine", { part: i + 3 }), { drop: 12 });
  heads(s, [[300, 146], [620, 146], [940, 146], [1260, 146]], 11, s.of("rust"));
}

function cockBead(s: Sheet): void {
  benchTop(s, "slate", 29);
  s.solid(rect(150, 200, 1300, 470), s.of("walnutDark"), { drop: 44, edge: 10 });
  drawerFront(s, { x: 170, y: 220, wide: 1260, high: 430, veneer: s.of("figured", { part: 6 }), bead: s.of("walnutDark", { part: 2 }), gaps: ["foot"] });
  for (const path of [poly([150, 200], [1450, 200], [1422, 228], [178, 228]), poly([150, 200], [178, 228], [178, 670], [150, 670]), poly([1450, 200], [1450, 670], [1422, 670], [1422, 228])]) s.solid(path, s.of("walnut", { part: 7 }), { edge: 6, drop: 4 });
  s.flat(rect(178, 644, 1244, 26), s.of("pine"));
  s.line(open([178, 644], [1422, 644]), ink, 4, 0.6);
  for (const x of [320, 620, 980, 1260]) s.flat(placed(rect(-26, -60, 52, 130), { x, y: 222, turn: (x % 7) - 3 }), "#e3dcbf", 0.94);
  for (const [x, y] of [[170, 360], [170, 540], [1430, 370], [1430, 560]] as const) s.flat(placed(rect(-66, -24, 132, 48), { x, y, turn: (y % 5) - 2 }), "#e3dcbf", 0.94);
  for (const x of [500, 1100]) for (const dx of [-56, 56]) s.flat(circle(x + dx, 430, 14), "#120b07");
  s.flat("M800 400C816 400 820 422 808 430L814 462L786 462L792 430C780 422 784 400 800 400Z", "#120b07");
  s.solid(poly([170, 770], [1430, 756], [1404, 784], [196, 798]), s.of("walnut", { part: 9 }), { drop: 12, edge: 6 });
  backSaw(s);
  crumbs(s, 420, 900, [200, 34], 40, 3, "#a06a3d", 5);
}

function backSaw(s: Sheet): void {
  const at = { x: 560, y: 900, turn: 3 };
  const teeth = Array.from({ length: 61 }, (_, i): Point => [i * 9, 108 + (i % 2) * 9]);
  s.solid(placed(poly([0, 20], ...teeth, [540, 20]), at), s.of("steel"), { drop: 12, edge: 4 });
  s.solid(placed(rect(-4, 0, 548, 30, 4), at), s.of("brass"), { drop: 14, edge: 6 });
  s.solid(placed("M530 -14L610 -22Q660 -40 720 -24Q760 -6 744 40Q720 110 660 120Q600 124 570 104L530 96Z M610 30Q600 76 640 84Q684 78 690 36Q660 14 610 30Z", at), s.of("oak"), { drop: 26, edge: 9 });
}

function escutcheons(s: Sheet): void {
  s.flat(rect(0, 0, 1600, 1067), s.of("beech", { part: 9 }));
  const cloth = curve([[60, 120], [500, 60], [1100, 90], [1520, 70], [1560, 520], [1500, 960], [1000, 1000], [520, 970], [90, 1010], [40, 560]], true);
  s.solid(cloth, s.of("cloth"), { drop: 22, edge: 8 });
  s.line(curve([[120, 240], [520, 200], [900, 260], [1480, 200]]), ink, 5, 0.16);
  s.line(curve([[120, 870], [560, 900], [980, 850], [1460, 890]]), "#fff6e0", 5, 0.16);
  const places = [{ x: 380, y: 440, size: 3.1 }, { x: 800, y: 440, size: 3.1 }, { x: 1220, y: 440, size: 3.1 }];
  const [first, second, third] = places;
  if (!first || !second || !third) return;
  escutcheon(s, first, s.of("tarnish"), 22);
  escutcheon(s, second, s.of("tarnish", { part: 3 }), 22);
  s.clipped(escutcheonOutline(second), () => s.clipped(poly(...ragged([806, 200], [796, 700], 8, 8, 3), [1000, 700], [1000, 200]), () => escutcheon(s, second, s.of("brass"), 0)));
  escutcheon(s, third, s.of("brass", { part: 2 }), 22);
  s.flat(curve([[1130, 300], [1160, 290], [1140, 420], [1120, 400]], true), "#fff6e0", 0.55);
  openTin(s, 1180, 860, 110, s.of("steel", { part: 4 }));
  for (const [dx, dy, turn] of [[-30, -10, 20], [20, 20, 80], [10, -34, -40], [-10, 36, 10], [44, -14, 120]] as const) {
    const at = { x: 1180 + dx, y: 860 + dy, turn };
    s.line(placed(open([-30, 0], [30, 0]), at), ink, 12);
    s.line(placed(open([-30, 0], [30, 0]), at), "#d9b363", 8);
    s.solid(placed(circle(-32, 0, 12), at), s.of("brass"), { edge: 4 });
  }
  s.solid(blob(520, 830, 130, 84, 7, 0.2), s.of("canvas"), { drop: 20, edge: 8 });
  s.flat(blob(560, 820, 60, 44, 3, 0.3), "#39352c", 0.7);
}

function polishing(s: Sheet): void {
  boards(s, { material: "blueBoard", width: 200, upright: true, to: 330, seed: 3 });
  s.flat(rect(0, 320, 1600, 640), s.of("polished", { part: 2 }));
  const dull = poly(...ragged([980, 310], [1180, 970], 6, 30, 5), [1620, 970], [1620, 310]);
  s.flat(dull, s.of("dullFigured", { part: 2 }));
  s.clipped(rect(0, 320, 1600, 640), () => {
    for (const [x, wide] of [[140, 120], [330, 34], [560, 160]] as const) s.flat(poly([x, 320], [x + wide, 320], [x + wide - 180, 960], [x - 180, 960]), "#fff1d6", 0.16);
    for (let i = 0; i < 9; i += 1) s.line(curve([[620 + i * 46, 560], [700 + i * 46, 500], [760 + i * 46, 560], [700 + i * 46, 640], [640 + i * 46, 590]]), "#fff1d6", 5, 0.14);
    s.flat(poly([232, 320], [430, 320], [400, 560], [250, 560]), "#c3d0cf", 0.16);
  });
  s.solid(rect(-20, 956, 1660, 60), s.of("polished", { part: 5 }), { edge: 12 });
  s.flat(rect(-20, 1016, 1660, 60), "#171014");
  bottle(s, 330, 420, 190, 380, "#a85f22", 0.48);
  s.solid("M470 420L486 350L640 350L656 420Q640 436 562 436Q486 436 470 420Z", s.of("cream"), { drop: 20, edge: 8 });
  s.solid(ellipse(563, 352, 78, 17), s.of("cream"), { edge: 4 });
  s.flat(ellipse(563, 354, 66, 12), "#a85f22");
  rubberPad(s);
}

function rubberPad(s: Sheet): void {
  s.solid(blob(1030, 690, 190, 120, 9, 0.08, 18), s.of("canvas"), { drop: 40, edge: 14 });
  s.flat(curve([[850, 720], [920, 790], [1040, 812], [1160, 780], [1206, 720], [1140, 760], [1030, 780], [920, 762]], true), "#a85f22", 0.6);
  for (const [a, b] of [[890, 640], [960, 600], [1040, 590], [1120, 610], [1180, 660]] as const) s.line(curve([[a, b + 40], [a * 0.5 + 515, b + 10], [1034, 610]]), ink, 5, 0.4);
  s.solid(curve([[980, 620], [970, 540], [1000, 470], [1050, 500], [1100, 460], [1110, 540], [1090, 620], [1030, 640]], true), s.of("canvas", { part: 3 }), { drop: 24, edge: 10 });
  s.line(curve([[984, 606], [1034, 622], [1090, 604]]), "#8a5a35", 12);
  for (const x of [1000, 1036, 1070]) s.line(curve([[x + 6, 600], [x, 550], [x + (x - 1030) * 0.3, 500]]), ink, 4, 0.35);
}

export const bureauDrawers: Plates = {
  "bureau-runner-worn": { format: "wide", draw: (s) => runner(s, false) },
  "bureau-runner-new": { format: "wide", draw: (s) => runner(s, true) },
  "bureau-drawer-bottom": { format: "wide", draw: drawerBottom },
  "bureau-cock-bead": { format: "wide", draw: cockBead },
  "bureau-escutcheons": { format: "wide", draw: escutcheons },
  "bureau-polish": { format: "wide", draw: polishing },
};
