/** The bureau in its corner, as it came and as it left, and the inside fitted out. */
import { block } from "./blocks.ts";
import { drawerFront, escutcheon, handle } from "./bureau-parts.ts";
import { circle, curve, ellipse, open, poly, ragged, rect } from "./paths.ts";
import { boards } from "./places.ts";
import type { Plates } from "./plate.ts";
import type { Material } from "./recipes.ts";
import type { Sheet } from "./sheet.ts";
import { ink } from "./sheet.ts";

function room(s: Sheet, from: number): void {
  boards(s, { material: "blueBoard", width: 200, upright: true, to: from - 90, seed: 3 });
  s.solid(rect(-20, from - 96, 1660, 96), s.of("wall", { part: 2 }), { edge: 7 });
  s.line(open([0, from - 70], [1600, from - 70]), ink, 4, 0.4);
  boards(s, { material: "oak", width: 70, from, to: s.height, seed: 8 });
  s.flat(rect(0, from, 1600, s.height - from), ink, 0.36);
  s.shade(rect(0, from, 1600, 24), 0.3);
}

interface Finish {
  readonly veneer: Material;
  readonly carcase: Material;
  readonly brass: Material;
}

function foot(s: Sheet, x: number, flip: 1 | -1, fill: string, broken: boolean): void {
  const shape = broken
    ? poly([x, 890], [x + flip * 150, 890], [x + flip * 120, 912], ...ragged([x + flip * 80, 930], [x + flip * 10, 966], 5, 10, 4), [x, 960])
    : `M${x} 890L${x + flip * 150} 890C${x + flip * 130} 930 ${x + flip * 96} 916 ${x + flip * 86} 940C${x + flip * 80} 966 ${x + flip * 70} 984 ${x + flip * 64} 990L${x} 990Z`;
  s.solid(shape, fill, { drop: 12, edge: 6 });
}

function standing(s: Sheet, f: Finish, worn: boolean): void {
  s.flat(ellipse(840, 990, 460, 28), ink, 0.5);
  s.solid(poly([1130, 120], [1236, 100], [1236, 962], [1180, 982], [1180, 430]), s.of(f.carcase, { turn: 90, part: 4 }), { drop: 20, edge: 5 });
  s.shade(poly([1130, 120], [1236, 100], [1236, 962], [1180, 982], [1180, 430]), 0.34);
  foot(s, 420, 1, s.of(f.carcase), false);
  foot(s, 1180, -1, s.of(f.carcase), worn);
  s.solid(rect(420, 430, 760, 470), s.of(f.carcase, { turn: 90, part: 1 }), { edge: 8 });
  const rows = [[452, 116], [580, 138], [730, 158]] as const;
  rows.forEach(([y, high], i) => {
    drawerFront(s, { x: 448, y, wide: 704, high, veneer: s.of(f.veneer, { part: i + 2, size: 0.7 }), bead: s.of("walnutDark"), ...(worn && i < 2 ? { gaps: i === 0 ? ["top", "right"] as const : ["foot"] as const } : {}) });
    for (const x of [600, 1000]) handle(s, { x, y: y + high / 2 - 8, size: 0.62 }, s.of(f.brass), worn && i === 1 && x === 1000);
    escutcheon(s, { x: 800, y: y + high / 2 - 4, size: 0.42 }, s.of(f.brass), 3);
  });
  s.solid(poly([452, 152], [1148, 152], [1180, 430], [420, 430]), s.of(f.carcase, { part: 3 }), { drop: 10, edge: 8 });
  const fall = poly([474, 170], [1126, 170], [1152, 412], [448, 412]);
  s.solid(fall, s.of(f.veneer, { part: 6, size: 0.9 }), { edge: 6 });
  s.line(poly([500, 192], [1102, 192], [1124, 390], [476, 390]), "#d9b983", 4, worn ? 0.5 : 0.95);
  escutcheon(s, { x: 800, y: 216, size: 0.42 }, s.of(f.brass), 3);
  s.solid(poly([440, 112], [1196, 112], [1160, 154], [440, 154]), s.of(f.carcase, { part: 7 }), { drop: 8, edge: 6 });
  s.flat(poly([1180, 112], [1238, 87], [1238, 132], [1160, 156]), s.of("walnutDark", { part: 6 }));
  s.solid(poly([440, 112], [1180, 112], [1236, 88], [500, 88]), s.of(worn ? "dullFigured" : "polished", { part: 1 }), { edge: 5 });
}

function arrived(s: Sheet): void {
  room(s, 900);
  standing(s, { veneer: "dullFigured", carcase: "walnutDark", brass: "tarnish" }, true);
  const split = ragged([458, 318], [1040, 284], 16, 9, 6);
  s.line(open(...split), "#140c06", 11, 0.95);
  s.line(open(...split.map(([x, y]): [number, number] => [x, y + 7])), "#c9a77c", 3, 0.8);
  s.clipped(poly([474, 170], [1126, 170], [1152, 412], [448, 412]), () => s.solid(poly([440, 286], ...ragged([456, 290], [548, 318], 5, 10, 2), ...ragged([540, 330], [440, 362], 4, 10, 4)), s.of("oak"), { edge: 4 }));
  s.add(`<g transform="translate(690 100) scale(1 .3)">`);
  s.line(circle(0, 0, 34), "#d8cdb8", 7, 0.8);
  s.line(circle(60, 12, 30), "#d8cdb8", 5, 0.5);
  s.add("</g>");
}

function finished(s: Sheet): void {
  room(s, 900);
  standing(s, { veneer: "figured", carcase: "walnut", brass: "brass" }, false);
  s.clipped(poly([474, 170], [1126, 170], [1152, 412], [448, 412]), () => {
    s.flat(poly([560, 160], [700, 160], [600, 420], [440, 420]), "#fff1d6", 0.16);
    s.flat(poly([740, 160], [770, 160], [670, 420], [636, 420]), "#fff1d6", 0.16);
  });
  for (const y of [452, 580, 730]) s.flat(poly([470, y + 10], [560, y + 10], [510, y + 104], [464, y + 104]), "#fff1d6", 0.12);
}

function smallDrawer(s: Sheet, x: number, y: number, wide: number, high: number, part: number): void {
  s.solid(rect(x, y, wide, high), s.of("ash", { part }), { edge: 6 });
  s.line(rect(x + 10, y + 10, wide - 20, high - 20), "#74492c", 4, 0.8);
  s.solid(circle(x + wide / 2, y + high / 2, 13), s.of("brass"), { drop: 7, edge: 4 });
}

function pigeonhole(s: Sheet, x: number, wide: number, papers: number): void {
  const [top, low] = [190, 420];
  s.flat(rect(x, top, wide, low - top), s.of("walnutDark", { part: 2 }));
  s.shade(rect(x, top, wide, low - top), 0.5);
  for (let i = 0; i < papers; i += 1) {
    s.solid(poly([x + 14 + i * 26, low], [x + 24 + i * 28, top + 70 + i * 14], [x + 44 + i * 28, top + 66 + i * 14], [x + 34 + i * 26, low]), i % 2 === 0 ? "#e6dfcb" : s.of("card"), { edge: 4 });
  }
  const arch = `M${x} ${top}L${x + wide} ${top}L${x + wide} ${top + 70}C${x + wide * 0.9} ${top + 20} ${x + wide * 0.62} ${top + 50} ${x + wide / 2} ${top + 24}C${x + wide * 0.38} ${top + 50} ${x + wide * 0.1} ${top + 20} ${x} ${top + 70}Z`;
  s.solid(arch, s.of("ash", { part: 3 }), { drop: 10, edge: 5 });
}

function opened(s: Sheet): void {
  boards(s, { material: "blueBoard", width: 200, upright: true, seed: 3 });
  s.solid(poly([240, 110], [1360, 110], [1410, 660], [1410, 1220], [190, 1220], [190, 660]), s.of("walnut", { turn: 90, part: 2 }), { drop: 40, edge: 12 });
  s.solid(poly([220, 60], [1380, 60], [1396, 116], [204, 116]), s.of("polished"), { drop: 16, edge: 9 });
  s.flat(rect(290, 150, 1020, 500), s.of("walnut", { part: 5 }));
  s.shade(rect(290, 150, 1020, 36), 0.4);
  for (const [x, papers] of [[306, 3], [484, 2], [944, 0], [1122, 4]] as const) pigeonhole(s, x, 168, papers);
  s.solid(rect(662, 180, 270, 340), s.of("figured", { part: 4, size: 0.7 }), { drop: 12, edge: 8 });
  s.line(rect(686, 204, 222, 292), "#d9b983", 5);
  escutcheon(s, { x: 797, y: 350, size: 0.6 }, s.of("brass"), 5);
  [306, 484, 944, 1122].forEach((x, i) => {
    smallDrawer(s, x, 430, 168, 90, i);
    smallDrawer(s, x, 530, 168, 96, i + 4);
  });
  smallDrawer(s, 662, 530, 270, 96, 9);
  s.shade(rect(290, 626, 1020, 26), 0.4);
  const fall = poly([280, 650], [1320, 650], [1500, 930], [100, 930]);
  s.solid(fall, s.of("walnut", { part: 7 }), { drop: 20, edge: 9 });
  s.solid(poly([370, 680], [1230, 680], [1366, 900], [234, 900]), s.of("greenLeather"), { edge: 7, dark: 0.3, light: 0 });
  s.line(poly([392, 692], [1208, 692], [1336, 888], [264, 888]), "#c79c46", 5, 0.9);
  for (const x of [330, 1270]) s.solid(poly([x - 22, 656], [x + 22, 656], [x + 24, 690], [x - 24, 690]), s.of("brass"), { edge: 4 });
  s.solid(rect(100, 930, 1400, 46), s.of("walnutDark", { part: 3 }), { drop: 30, edge: 8 });
  for (const x of [230, 1290]) block(s, [[x, 976], [x + 80, 976], [x + 80, 1130], [x, 1130]], [10, -8], s.of("walnut", { turn: 90, part: x % 4 }), { drop: 24 });
  drawerFront(s, { x: 340, y: 1010, wide: 920, high: 240, veneer: s.of("figured", { part: 2 }), bead: s.of("walnutDark") });
  for (const x of [520, 1080]) handle(s, { x, y: 1110, size: 1.1 }, s.of("brass"));
  s.solid(poly([560, 760], [830, 744], [856, 850], [566, 868]), "#e6dfcb", { drop: 8, edge: 5 });
  s.cord(open([900, 860], [1080, 770]), s.of("walnutDark"), 16, 8);
  s.line(curve([[300, 200], [310, 400], [306, 620]]), ink, 3, 0.2);
}

export const bureauWhole: Plates = {
  "bureau-arrived": { format: "wide", draw: arrived },
  "bureau-open": { format: "full", draw: opened },
  "bureau-finished": { format: "wide", draw: finished },
};
