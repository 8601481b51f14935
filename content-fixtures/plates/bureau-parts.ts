/** Brass, drawer fronts and beading of the bureau. */
import type { Place } from "./paths.ts";
import { circle, placed, rect } from "./paths.ts";
import type { Sheet } from "./sheet.ts";
import { ink } from "./sheet.ts";

const shield = "M-44 -62C-30 -74 -12 -62 0 -76C12 -62 30 -74 44 -62C56 -44 42 -26 50 -4C56 26 24 40 0 80C-24 40 -56 26 -50 -4C-42 -26 -56 -44 -44 -62Z";
const keyhole = "M0 -22C16 -22 20 0 8 8L14 40L-14 40L-8 8C-20 0 -16 -22 0 -22Z";

export function escutcheon(s: Sheet, place: Place, fill: string, drop = 6): void {
  const size = place.size ?? 1;
  s.solid(placed(shield, place), fill, { drop, edge: Math.max(2.5, 7 * size) });
  s.flat(placed(keyhole, place), "#120b07");
  for (const [x, y] of [[0, -56], [0, 60], [-36, -10], [36, -10]] as const) s.flat(placed(circle(x, y, 5), place), ink, 0.7);
}

export const escutcheonOutline = (place: Place): string => placed(shield, place);

/** A plate handle: back plate and hanging bail; one end down when it has let go. */
export function handle(s: Sheet, place: Place, fill: string, loose = false): void {
  const size = place.size ?? 1;
  const put = (path: string, drop: number): void => s.solid(placed(path, place), fill, { drop, edge: Math.max(2, 5 * size) });
  put("M-92 -10C-84 -34 -60 -20 -44 -30C-24 -44 24 -44 44 -30C60 -20 84 -34 92 -10C96 8 74 16 58 14C40 26 18 34 0 34C-18 34 -40 26 -58 14C-74 16 -96 8 -92 -10Z", 5);
  const bail = placed("M-56 0C-60 46 -30 58 0 58C30 58 60 46 56 0", loose ? { ...place, turn: 68, x: place.x + 26 * size, y: place.y + 40 * size } : place);
  s.cord(bail, fill, 15 * size, 5 * size);
  for (const x of loose ? [56] : [-56, 56]) s.solid(placed(circle(x, 0, 14), place), fill, { edge: 3, drop: 3 });
  if (loose) s.flat(placed(circle(-56, 0, 9), place), ink, 0.8);
}

export interface DrawerFront {
  readonly x: number;
  readonly y: number;
  readonly wide: number;
  readonly high: number;
  readonly veneer: string;
  readonly bead: string;
  /** Sides that have lost their bead. */
  readonly gaps?: readonly ("top" | "left" | "right" | "foot")[];
}

export function drawerFront(s: Sheet, { x, y, wide, high, veneer, bead, gaps = [] }: DrawerFront): void {
  s.solid(rect(x, y, wide, high), veneer, { edge: 4 });
  const t = 9;
  const strips = { top: rect(x, y, wide, t), foot: rect(x, y + high - t, wide, t), left: rect(x, y, t, high), right: rect(x + wide - t, y, t, high) };
  for (const side of ["top", "left", "right", "foot"] as const) {
    if (gaps.includes(side)) s.flat(strips[side], "#b8946a", 0.8);
    else s.solid(strips[side], bead, { edge: 3, drop: 2 });
  }
}
