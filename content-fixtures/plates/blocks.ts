/** Bodies with depth, drawn in one oblique projection: a true front face, and depth running up and to the right. */
import type { Point } from "./paths.ts";
import { poly } from "./paths.ts";
import type { Sheet } from "./sheet.ts";
import { ink } from "./sheet.ts";

export interface BlockOptions {
  readonly side?: string;
  readonly drop?: number;
  readonly edge?: number;
}

/** A face pushed back along `depth`; the sides seen are toned by how they stand to the light. */
export function block(s: Sheet, face: readonly Point[], depth: Point, fill: string, { side = fill, drop = 0, edge = 4 }: BlockOptions = {}): void {
  const back = face.map(([x, y]): Point => [x + depth[0], y + depth[1]]);
  if (drop > 0) {
    s.shadow(poly(...face), drop);
    s.shadow(poly(...back), drop);
  }
  const area = face.reduce((sum, [x, y], i) => {
    const [nx, ny] = face[(i + 1) % face.length] ?? [0, 0];
    return sum + x * ny - nx * y;
  }, 0);
  face.forEach((from, i) => {
    const to = face[(i + 1) % face.length] ?? from;
    const backFrom = back[i] ?? from;
    const backTo = back[(i + 1) % face.length] ?? to;
    const outward: Point = area > 0 ? [to[1] - from[1], from[0] - to[0]] : [from[1] - to[1], to[0] - from[0]];
    if (outward[0] * depth[0] + outward[1] * depth[1] <= 0) return;
    const quad = poly(from, to, backTo, backFrom);
    s.flat(quad, side);
    const length = Math.hypot(outward[0], outward[1]) || 1;
    const facing = (-outward[0] - outward[1]) / length;
    if (facing > 0) s.flat(quad, "#fff6e0", 0.2 * facing);
    else s.shade(quad, 0.16 - facing * 0.16);
    s.line(quad, ink, 1.6, 0.4);
  });
  s.solid(poly(...face), fill, { edge });
}

/** How far out from the axis a turned part is, along it. */
export type Profile = readonly Point[];

/** A turned or round part lying left to right: bands of tone, never a gradient. */
export function turned(s: Sheet, x: number, y: number, profile: Profile, fill: string, drop = 0): void {
  const band = (top: number, foot: number): string =>
    poly(...profile.map(([along, r]): Point => [x + along, y + r * top]), ...profile.toReversed().map(([along, r]): Point => [x + along, y + r * foot]));
  if (drop > 0) s.shadow(band(-1, 1), drop);
  s.solid(band(-1, 1), fill, { edge: 3 });
  s.flat(band(-0.72, -0.42), "#fff6e0", 0.32);
  s.shade(band(0.3, 1), 0.2, 0);
  s.shade(band(0.68, 1), 0.24, 0);
}

/** A round part standing upright. */
export function upright(s: Sheet, x: number, y: number, profile: Profile, fill: string, drop = 0): void {
  const band = (left: number, right: number): string =>
    poly(...profile.map(([along, r]): Point => [x + r * left, y + along]), ...profile.toReversed().map(([along, r]): Point => [x + r * right, y + along]));
  if (drop > 0) s.shadow(band(-1, 1), drop);
  s.solid(band(-1, 1), fill, { edge: 3 });
  s.flat(band(-0.72, -0.44), "#fff6e0", 0.32);
  s.shade(band(0.3, 1), 0.2, 90);
  s.shade(band(0.68, 1), 0.24, 90);
}
