/** Noise that repeats at the edge of a tile, from a seed, so that the same plate always comes out the same. */

export type Random = () => number;

/** A small 32-bit generator (mulberry32): enough for grain and rivets, and the same on every machine. */
export function randomFrom(seed: number): Random {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

/** Takes a point in 0..1 by 0..1 and gives about 0..1; the left edge meets the right and the top meets the foot. */
export type Field = (u: number, v: number) => number;

function lattice(columns: number, rows: number, seed: number): Field {
  const random = randomFrom(seed);
  const values = Float32Array.from({ length: columns * rows }, () => random());
  const ease = (t: number): number => t * t * (3 - 2 * t);
  const value = (column: number, row: number): number => values[(row % rows) * columns + (column % columns)] ?? 0;
  return (u, v) => {
    const x = (u - Math.floor(u)) * columns;
    const y = (v - Math.floor(v)) * rows;
    const column = Math.floor(x);
    const row = Math.floor(y);
    const tx = ease(x - column);
    const ty = ease(y - row);
    const top = value(column, row) * (1 - tx) + value(column + 1, row) * tx;
    const foot = value(column, row + 1) * (1 - tx) + value(column + 1, row + 1) * tx;
    return top * (1 - ty) + foot * ty;
  };
}

/** Several sizes of noise laid over one another, stretched back to fill 0..1. */
export function noiseField(columns: number, rows: number, octaves: number, seed: number): Field {
  const layers = Array.from({ length: octaves }, (_, i) => lattice(columns * 2 ** i, rows * 2 ** i, seed + i * 101));
  const whole = layers.reduce((sum, _, i) => sum + 0.5 ** i, 0);
  return (u, v) => {
    const sum = layers.reduce((total, layer, i) => total + layer(u, v) * 0.5 ** i, 0);
    return (sum / whole - 0.5) * 1.7 + 0.5;
  };
}
