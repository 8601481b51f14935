/** Parts of the lathe that come up in more than one plate. */
import { circle, placed, rect, ring } from "./paths.ts";
import type { Sheet } from "./sheet.ts";
import { ink } from "./sheet.ts";

/** A cast wheel with curved spokes, its rim and its boss. */
export function spokedWheel(s: Sheet, x: number, y: number, r: number, fill: string, spokes = 6, drop = 20, turn = 8): void {
  const rim = r * 0.13;
  const spoke = (angle: number): string =>
    placed(`M${-r * 0.07} ${-r * 0.16}C${-r * 0.14} ${-r * 0.4} ${r * 0.06} ${-r * 0.6} ${-r * 0.05} ${-r + rim * 0.7}L${r * 0.05} ${-r + rim * 0.7}C${r * 0.16} ${-r * 0.6} ${-r * 0.03} ${-r * 0.4} ${r * 0.07} ${-r * 0.16}Z`, { x, y, turn: angle });
  for (let i = 0; i < spokes; i += 1) s.solid(spoke((i / spokes) * 360 + turn), fill, { drop: drop * 0.7, edge: Math.max(3, r * 0.02) });
  s.solid(ring(x, y, r, r - rim), fill, { drop, edge: Math.max(4, r * 0.026) });
  s.solid(circle(x, y, r * 0.22), fill, { drop: drop * 0.5, edge: Math.max(4, r * 0.03) });
}

/** Half a bearing shell laid open, bore towards us, running left to right. */
export function halfShell(s: Sheet, iron: string, metal: string): void {
  s.solid(rect(240, 300, 1120, 500, 8), iron, { drop: 44, edge: 12 });
  s.solid(rect(200, 250, 90, 600, 10), iron, { drop: 30, edge: 10 });
  s.solid(rect(1310, 250, 90, 600, 10), iron, { drop: 30, edge: 10 });
  s.flat(rect(290, 340, 1020, 420), metal);
  s.shade(rect(290, 340, 1020, 84), 0.32, 0);
  s.shade(rect(290, 340, 1020, 36), 0.3, 0);
  s.flat(rect(290, 600, 1020, 70), "#ffffff", 0.2);
  s.line(`M290 340L1310 340M290 760L1310 760`, ink, 4, 0.6);
  for (const y of [286, 814]) for (const x of [245, 1355]) {
    s.solid(circle(x, y, 22), iron, { edge: 5 });
    s.flat(circle(x, y, 13), ink, 0.85);
  }
}
