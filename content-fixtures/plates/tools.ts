/** The tools that come back from plate to plate, each drawn once about its own nought and put where it lies. */
import { randomFrom } from "./noise.ts";
import type { Place, Point } from "./paths.ts";
import { circle, curve, ellipse, open, placed, poly, rect } from "./paths.ts";
import type { Material } from "./recipes.ts";
import type { Sheet, SolidOptions } from "./sheet.ts";
import { ink } from "./sheet.ts";

type Put = (path: string, material: Material | `#${string}`, options?: SolidOptions, part?: number) => void;

/** Puts parts of one tool down at one place, their grain turned with it. */
function putter(s: Sheet, place: Place): Put {
  return (path, material, options = {}, part = 0) => {
    const known = material.startsWith("#") ? material : s.of(material as Material, { turn: place.turn ?? 0, part });
    s.solid(placed(path, place), known, options);
  };
}

/** A steel rule, its ticks taller at fives and tens. Lies along x from its own nought. */
export function rule(s: Sheet, place: Place, length = 900, wide = 62): void {
  const put = putter(s, place);
  put(rect(0, 0, length, wide, 3), "steel", { drop: 7, edge: 4 });
  for (let i = 1; i * 12 < length - 10; i += 1) {
    const tall = i % 10 === 0 ? 0.62 : i % 5 === 0 ? 0.44 : 0.26;
    s.line(placed(open([i * 12, 2], [i * 12, wide * tall]), place), ink, i % 10 === 0 ? 3 : 2, 0.85, "butt");
  }
  s.flat(placed(circle(length - 26, wide / 2, 9), place), ink, 0.7);
}

/** A sash clamp head or quick clamp in plan: bar along y, jaws biting at nought and at `reach`. */
export function clamp(s: Sheet, place: Place, reach: number): void {
  const put = putter(s, place);
  put(rect(-13, -120, 26, reach + 250), "darkSteel", { drop: 18 });
  put(poly([-30, -64], [30, -64], [30, -6], [20, 0], [-20, 0], [-30, -6]), "primer", { drop: 14 });
  put(poly([-34, reach + 6], [-20, reach], [20, reach], [34, reach + 6], [34, reach + 74], [-34, reach + 74]), "primer", { drop: 14 });
  put(rect(-10, reach + 74, 20, 64), "steel", { drop: 8 });
  put(rect(-24, reach + 134, 48, 128, 20), "ash", { drop: 16 }, 3);
  for (const x of [-8, 8]) s.line(placed(open([x, reach + 150], [x, reach + 246]), place), ink, 2.4, 0.3);
}

/** A screwdriver lying along x, its tip at nought, handle to the right. */
export function screwdriver(s: Sheet, place: Place, blade = 230): void {
  const put = putter(s, place);
  put(poly([0, -10], [40, -8], [blade, -8], [blade, 8], [40, 8], [0, 10]), "steel", { drop: 10 });
  put(rect(blade - 4, -17, 26, 34, 3), "brass", { drop: 12 });
  put(`M${blade + 22} -20Q${blade + 60} -44 ${blade + 120} -34L${blade + 190} -34Q${blade + 222} -30 ${blade + 222} 0Q${blade + 222} 30 ${blade + 190} 34L${blade + 120} 34Q${blade + 60} 44 ${blade + 22} 20Z`, "oak", { drop: 18, edge: 8 }, 2);
}

/** A chisel, gouge or scraper: cutting edge at nought, handle to the right. */
export function chisel(s: Sheet, place: Place, wide = 44, blade = 240): void {
  const put = putter(s, place);
  const h = wide / 2;
  put(poly([0, -h], [blade - 60, -h], [blade, -10], [blade, 10], [blade - 60, h], [0, h]), "steel", { drop: 9 });
  s.flat(placed(poly([0, -h], [26, -h], [26, h], [0, h]), place), "#eef2ef", 0.5);
  put(rect(blade, -20, 26, 40, 4), "brass", { drop: 12 });
  put(`M${blade + 26} -20Q${blade + 100} -38 ${blade + 200} -30Q${blade + 240} -26 ${blade + 240} 0Q${blade + 240} 26 ${blade + 200} 30Q${blade + 100} 38 ${blade + 26} 20Z`, "ash", { drop: 18, edge: 8 }, 4);
}

/** A joiner's mallet in plan: head across, handle along x to the right. */
export function mallet(s: Sheet, place: Place): void {
  const put = putter(s, place);
  put(rect(60, -21, 420, 42, 18), "ash", { drop: 16, edge: 7 }, 1);
  put(poly([-74, -136], [74, -148], [74, 148], [-74, 136]), "beech", { drop: 26, edge: 9 }, 2);
  put(rect(-18, -20, 36, 40), "ash", { edge: 3 }, 6);
}

/** A flat brush: bristle tips at nought, handle to the right. */
export function brush(s: Sheet, place: Place, wet = "#8b5a30"): void {
  const put = putter(s, place);
  const tips = Array.from({ length: 13 }, (_, i): Point => [(i % 2) * 8, -54 + i * 9]);
  put(poly(...tips, [120, 48], [120, -48]), "#3a2c22", { drop: 12 });
  s.flat(placed(poly(...tips, [52, 50], [44, 10], [56, -20], [46, -50]), place), wet);
  for (let y = -40; y < 46; y += 11) s.line(placed(open([30, y * 1.08], [118, y * 0.9]), place), ink, 2, 0.5);
  put(rect(116, -52, 64, 104, 4), "brass", { drop: 14 });
  put("M180 -46Q236 -44 262 -20Q400 -30 430 -26Q456 -20 456 0Q456 20 430 26Q400 30 262 20Q236 44 180 46Z", "ash", { drop: 18, edge: 8 }, 5);
}

/** A round tin from above, lid off. */
export function openTin(s: Sheet, x: number, y: number, r: number, inside: string): void {
  s.solid(circle(x, y, r), s.of("steel"), { drop: 34, edge: 8 });
  s.solid(circle(x, y, r * 0.88), inside, { edge: 2, dark: 0.2, light: 0 });
  s.clipped(circle(x, y, r * 0.88), () => s.shade(`${circle(x, y, r * 1.2)}${circle(x + r * 0.16, y + r * 0.16, r * 0.86)}`, 0.34));
}

/** A bottle with a cork, seen from the side. */
export function bottle(s: Sheet, x: number, foot: number, wide: number, high: number, liquid: string, level = 0.6): void {
  const h = wide / 2;
  const body = `M${x - h} ${foot}L${x - h} ${foot - high * 0.56}Q${x - h} ${foot - high * 0.72} ${x - h * 0.3} ${foot - high * 0.76}L${x - h * 0.3} ${foot - high}L${x + h * 0.3} ${foot - high}L${x + h * 0.3} ${foot - high * 0.76}Q${x + h} ${foot - high * 0.72} ${x + h} ${foot - high * 0.56}L${x + h} ${foot}Z`;
  s.shadow(body, 22);
  s.flat(body, "#c3d0cf");
  s.clipped(body, () => {
    s.flat(rect(x - h, foot - high * level, wide, high), liquid);
    s.flat(rect(x - h * 0.72, foot - high, h * 0.22, high), "#ffffff", 0.4);
    s.shade(rect(x + h * 0.34, foot - high, h, high), 0.22, 90);
  });
  s.solid(body, "none", { edge: 6 });
  s.solid(rect(x - h * 0.34, foot - high - high * 0.08, h * 0.68, high * 0.12, 4), s.of("card"), { edge: 4 });
}

/** Curls off a plane or a gouge. */
export function shavings(s: Sheet, x: number, y: number, spread: number, count: number, seed: number, tones: readonly string[], size = 1, dark = "#6d4c2b"): void {
  const random = randomFrom(seed);
  for (let i = 0; i < count; i += 1) {
    const [cx, cy, r] = [x + (random() - 0.5) * spread * 2, y + (random() - 0.5) * spread * 0.9, (16 + random() * 20) * size];
    const turn = random() * 6.3;
    const points = Array.from({ length: 9 }, (_, k): Point => {
      const [a, reach] = [turn + k * 0.85, r * (1 - k * 0.085)];
      return [cx + Math.cos(a) * reach + k * 3 * size, cy + Math.sin(a) * reach * 0.7];
    });
    const path = curve(points);
    s.add(`<path d="${path}" fill="none" stroke="${ink}" stroke-opacity=".3" stroke-width="${11 * size}" transform="translate(6 6)"/>`);
    s.line(path, dark, 11 * size);
    s.line(path, tones[i % tones.length] ?? "#e3c99f", 8 * size);
  }
}

/** Drops, filings, crumbs: small uneven specks around a place. */
export function crumbs(s: Sheet, x: number, y: number, spread: Point, count: number, seed: number, colour: string, size = 6): void {
  const random = randomFrom(seed);
  for (let i = 0; i < count; i += 1) {
    const [cx, cy] = [x + (random() + random() - 1) * spread[0], y + (random() + random() - 1) * spread[1]];
    const [a, b] = [size * (0.4 + random()), size * (0.3 + random() * 0.6)];
    s.flat(ellipse(cx + 3, cy + 3, a, b), ink, 0.3);
    s.flat(poly([cx - a, cy], [cx, cy - b], [cx + a, cy - b * 0.2], [cx + a * 0.3, cy + b]), colour);
  }
}
