import { createHash } from "node:crypto";
import { mkdir, readFile, writeFile } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";

import sharp from "sharp";

import { noiseField } from "./noise.ts";
import type { Layer, Material, Recipe } from "./recipes.ts";
import { recipes } from "./recipes.ts";

/** One tile of every material, this many pixels square, repeats across the plate. */
export const tileSize = 1024;

type Mask = (u: number, v: number) => number;

function cut(value: number, from: number, soft: number): number {
  const t = Math.min(1, Math.max(0, (value - from + soft) / (2 * soft)));
  return t * t * (3 - 2 * t);
}

function maskOf(layer: Layer, seed: number): Mask {
  if (layer.kind === "noise") {
    const field = noiseField(layer.across, layer.down, layer.octaves ?? 3, seed);
    return (u, v) => cut(field(u, v), layer.from, layer.soft ?? 0.03);
  }
  if (layer.kind === "weave") {
    const turns = layer.threads * Math.PI * 2;
    return (u, v) => cut(Math.sin(u * turns) * Math.sin(v * turns), 0.1, 0.5);
  }
  const wander = noiseField(layer.across, layer.down, 3, seed);
  const weight = noiseField(5, 60, 2, seed + 7);
  return (u, v) => {
    const place = v * layer.rings + layer.wander * wander(u, v);
    const part = Math.abs(place - Math.floor(place) - 0.5) * 2;
    return cut(layer.width * (0.35 + 1.2 * weight(u, v)) - part, 0, 0.05);
  };
}

function channels(colour: string): [number, number, number] {
  const value = Number.parseInt(colour.slice(1, 7), 16);
  return [value >> 16, (value >> 8) & 255, value & 255];
}

function paint(recipe: Recipe, seed: number): Buffer {
  const pixels = Buffer.alloc(tileSize * tileSize * 3);
  const ground = channels(recipe.ground);
  const layers = recipe.layers.map((layer, i) => ({ mask: maskOf(layer, seed + i * 1009), tone: channels(layer.tone), alpha: layer.alpha ?? 0.8 }));
  for (let y = 0; y < tileSize; y += 1) {
    for (let x = 0; x < tileSize; x += 1) {
      let [red, green, blue] = ground;
      for (const { mask, tone, alpha } of layers) {
        const cover = alpha * mask(x / tileSize, y / tileSize);
        red += (tone[0] - red) * cover;
        green += (tone[1] - green) * cover;
        blue += (tone[2] - blue) * cover;
      }
      pixels.set([red, green, blue], (y * tileSize + x) * 3);
    }
  }
  return pixels;
}

const painted = new Map<Material, Promise<string>>();

const kept = join(tmpdir(), "workshop-plate-tiles");

/** Painting takes a second a tile, so each is kept under a name made of its recipe. */
async function paintTile(material: Material): Promise<string> {
  const seed = Array.from(material).reduce((sum, letter) => sum * 31 + letter.charCodeAt(0), 7) >>> 0;
  const recipe: Recipe = recipes[material];
  const file = join(kept, `${createHash("sha256").update(JSON.stringify([seed, tileSize, recipe])).digest("hex")}.jpg`);
  const known = await readFile(file).catch(() => undefined);
  if (known) return `data:image/jpeg;base64,${known.toString("base64")}`;
  const raw = { width: tileSize, height: tileSize, channels: 3 } as const;
  const jpeg = await sharp(paint(recipe, seed), { raw }).jpeg({ quality: 92, chromaSubsampling: "4:4:4" }).toBuffer();
  await mkdir(kept, { recursive: true });
  await writeFile(file, jpeg);
  return `data:image/jpeg;base64,${jpeg.toString("base64")}`;
}

/** The material's tile as a data address, painted the first time it is asked for. */
export function tileOf(material: Material): Promise<string> {
  const known = painted.get(material);
  if (known) return known;
  const made = paintTile(material);
  painted.set(material, made);
  return made;
}
