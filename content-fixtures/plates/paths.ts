/** Outlines as SVG path text, made only of absolute M, L, C, Q and Z so that they can be moved and turned. */
import { randomFrom } from "./noise.ts";

export type Point = readonly [number, number];

const n = (value: number): string => String(Math.round(value * 10) / 10);
const pair = ([x, y]: Point): string => `${n(x)} ${n(y)}`;

export function poly(...points: Point[]): string {
  return `M${points.map(pair).join("L")}Z`;
}

export function open(...points: Point[]): string {
  return `M${points.map(pair).join("L")}`;
}

export function rect(x: number, y: number, width: number, height: number, round = 0): string {
  if (round === 0) return poly([x, y], [x + width, y], [x + width, y + height], [x, y + height]);
  const r = Math.min(round, width / 2, height / 2);
  const [right, foot] = [x + width, y + height];
  return `M${pair([x + r, y])}L${pair([right - r, y])}Q${pair([right, y])} ${pair([right, y + r])}L${pair([right, foot - r])}Q${pair([right, foot])} ${pair([right - r, foot])}L${pair([x + r, foot])}Q${pair([x, foot])} ${pair([x, foot - r])}L${pair([x, y + r])}Q${pair([x, y])} ${pair([x + r, y])}Z`;
}

/** How far a cubic's handles reach to make a quarter circle. */
const quarter = 0.5523;

export function ellipse(cx: number, cy: number, rx: number, ry: number): string {
  const [kx, ky] = [rx * quarter, ry * quarter];
  const cubic = (a: Point, b: Point, c: Point): string => `C${pair(a)} ${pair(b)} ${pair(c)}`;
  return [
    `M${pair([cx + rx, cy])}`,
    cubic([cx + rx, cy + ky], [cx + kx, cy + ry], [cx, cy + ry]),
    cubic([cx - kx, cy + ry], [cx - rx, cy + ky], [cx - rx, cy]),
    cubic([cx - rx, cy - ky], [cx - kx, cy - ry], [cx, cy - ry]),
    cubic([cx + kx, cy - ry], [cx + rx, cy - ky], [cx + rx, cy]),
    "Z",
  ].join("");
}

export const circle = (cx: number, cy: number, r: number): string => ellipse(cx, cy, r, r);

/** A disc with a hole: filled by the even-odd rule, as every shape here is. */
export const ring = (cx: number, cy: number, outer: number, inner: number): string => circle(cx, cy, outer) + circle(cx, cy, inner);

/** A curve through every point, eased at each (Catmull-Rom turned into cubics). */
export function curve(points: readonly Point[], closed = false): string {
  const count = points.length;
  const at = (i: number): Point => points[closed ? (i + count) % count : Math.min(count - 1, Math.max(0, i))] ?? [0, 0];
  const spans = Array.from({ length: closed ? count : count - 1 }, (_, i) => {
    const [before, from, to, after] = [at(i - 1), at(i), at(i + 1), at(i + 2)];
    const first: Point = [from[0] + (to[0] - before[0]) / 6, from[1] + (to[1] - before[1]) / 6];
    const second: Point = [to[0] - (after[0] - from[0]) / 6, to[1] - (after[1] - from[1]) / 6];
    return `C${pair(first)} ${pair(second)} ${pair(to)}`;
  });
  return `M${pair(at(0))}${spans.join("")}${closed ? "Z" : ""}`;
}

/** An uneven round patch: a stain, a spill, a lump of moss. */
export function blob(cx: number, cy: number, rx: number, ry: number, seed: number, rough = 0.22, corners = 14): string {
  const random = randomFrom(seed);
  const points = Array.from({ length: corners }, (_, i): Point => {
    const turn = (i / corners) * Math.PI * 2;
    const reach = 1 - rough + random() * rough * 2;
    return [cx + Math.cos(turn) * rx * reach, cy + Math.sin(turn) * ry * reach];
  });
  return curve(points, true);
}

/** Points along a straight line that will not keep straight: torn skin, broken wood, a crack. */
export function ragged(from: Point, to: Point, steps: number, stray: number, seed: number): Point[] {
  const random = randomFrom(seed);
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]) || 1;
  const across: Point = [-(to[1] - from[1]) / length, (to[0] - from[0]) / length];
  return Array.from({ length: steps + 1 }, (_, i): Point => {
    const t = i / steps;
    const off = i === 0 || i === steps ? 0 : (random() * 2 - 1) * stray;
    return [from[0] + (to[0] - from[0]) * t + across[0] * off, from[1] + (to[1] - from[1]) * t + across[1] * off];
  });
}

export interface Place {
  readonly x: number;
  readonly y: number;
  /** Degrees, clockwise. */
  readonly turn?: number;
  readonly size?: number;
  readonly flip?: boolean;
}

/** Moves an outline drawn about its own nought to where it belongs. */
export function placed(path: string, { x, y, turn = 0, size = 1, flip = false }: Place): string {
  const angle = (turn * Math.PI) / 180;
  const [cos, sin] = [Math.cos(angle) * size, Math.sin(angle) * size];
  return path.replace(/(-?[\d.]+) (-?[\d.]+)/g, (_, a: string, b: string) => {
    const [px, py] = [flip ? -Number(a) : Number(a), Number(b)];
    return pair([x + px * cos - py * sin, y + px * sin + py * cos]);
  });
}
