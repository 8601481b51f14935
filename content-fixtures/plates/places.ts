/** Where the work is done: bench tops, the shed wall, concrete, the yard. */
import { randomFrom } from "./noise.ts";
import { circle, open, rect } from "./paths.ts";
import type { Material } from "./recipes.ts";
import type { Sheet } from "./sheet.ts";
import { ink } from "./sheet.ts";

export interface Boards {
  readonly material: Material;
  readonly width: number;
  readonly upright?: boolean;
  readonly from?: number;
  readonly to?: number;
  readonly seed?: number;
}

/** Boards side by side across the plate, each with its own grain, tone and joint. */
export function boards(s: Sheet, { material, width, upright = false, from = 0, to = upright ? s.height : s.height, seed = 1 }: Boards): void {
  const random = randomFrom(seed);
  const end = upright ? s.width : to;
  let place = upright ? 0 : from;
  let part = seed * 3;
  while (place < end) {
    const size = Math.min(end - place, width * (0.86 + random() * 0.28));
    const path = upright ? rect(place, from, size, to - from) : rect(0, place, s.width, size);
    s.flat(path, s.of(material, { turn: upright ? 90 : 0, part }));
    s.flat(path, random() > 0.5 ? ink : "#ffffff", random() * 0.07);
    const [a, b]: [[number, number], [number, number]] = upright ? [[place, from], [place, to]] : [[0, place], [s.width, place]];
    s.line(open(a, b), ink, 5, 0.55, "butt");
    s.line(upright ? open([place + 4, from], [place + 4, to]) : open([0, place + 4], [s.width, place + 4]), "#fff6e0", 2, 0.2, "butt");
    place += size;
    part += 1;
  }
}

/** A bench top seen from above, with what years of work leave on one. */
export function benchTop(s: Sheet, material: Material = "beech", seed = 1): void {
  boards(s, { material, width: 250, seed });
  const random = randomFrom(seed + 50);
  for (let i = 0; i < 5; i += 1) {
    const [x, y, reach] = [random() * s.width, random() * s.height, 40 + random() * 120];
    s.line(open([x, y], [x + reach, y + (random() - 0.5) * reach]), ink, 2.4, 0.22);
  }
  for (let i = 0; i < 2; i += 1) {
    const [x, y] = [random() * s.width, random() * s.height];
    s.line(circle(x, y, 44), ink, 4, 0.12);
    s.line(circle(x + 5, y + 3, 43), ink, 2, 0.1);
  }
}

/** The shed wall behind something that stands up. */
export function shedWall(s: Sheet, to: number, material: Material = "wall", seed = 4): void {
  boards(s, { material, width: 190, upright: true, to, seed });
}

/** A floor running to the foot of the plate, with the wall's foot in shadow on it. */
export function floor(s: Sheet, from: number, material: Material = "concrete"): void {
  s.flat(rect(0, from, s.width, s.height - from), s.of(material, { size: 0.9 }));
  s.shade(rect(0, from, s.width, 26), 0.22);
  s.line(open([0, from], [s.width, from]), ink, 5, 0.7, "butt");
}

/** The front edge of a bench with something standing on it. */
export function benchEdge(s: Sheet, from: number, material: Material = "beech"): void {
  s.flat(rect(0, from, s.width, s.height - from), s.of(material, { part: 5 }));
  s.line(open([0, from], [s.width, from]), "#fff6e0", 4, 0.35, "butt");
  s.shade(rect(0, from + 64, s.width, s.height - from), 0.34);
  s.line(open([0, from + 64], [s.width, from + 64]), ink, 5, 0.7, "butt");
}

/** A brick wall in the yard, in stretcher bond. */
export function brickWall(s: Sheet, to: number): void {
  s.flat(rect(0, 0, s.width, to), "#9fa19b");
  const random = randomFrom(12);
  const [long, high] = [128, 44];
  for (let row = 0; row * high < to; row += 1) {
    for (let x = row % 2 === 0 ? -long / 2 : 0; x < s.width; x += long) {
      const path = rect(x + 3, row * high + 3, long - 6, high - 6, 3);
      s.flat(path, s.of("brick", { part: Math.floor(random() * 4) }));
      s.flat(path, random() > 0.6 ? ink : "#d9cdbb", random() * 0.2);
    }
  }
  s.flat(rect(0, 0, s.width, to), "#6d8087", 0.34);
}

/** Nail or screw heads. */
export function heads(s: Sheet, points: readonly (readonly [number, number])[], r: number, fill: string, slot = true): void {
  for (const [x, y] of points) {
    s.shadow(circle(x, y, r), 3, 0.3);
    s.solid(circle(x, y, r), fill, { edge: r * 0.5 });
    if (slot) s.line(open([x - r * 0.6, y - r * 0.35], [x + r * 0.6, y + r * 0.35]), ink, Math.max(1.6, r * 0.22), 0.7);
  }
}
