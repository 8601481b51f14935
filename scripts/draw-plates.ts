/** Draws the demo's plates into content-fixtures/pictures. Usage: node --import tsx scripts/draw-plates.ts [part of a name …] */
import { readFile } from "node:fs/promises";

import sharp from "sharp";

import { formats } from "#fixtures/plates/plate.ts";
import type { Plate } from "#fixtures/plates/plate.ts";
import { plates } from "#fixtures/plates/plates.ts";
import { Sheet } from "#fixtures/plates/sheet.ts";

const folder = new URL("../content-fixtures/pictures/", import.meta.url);

async function drawOne(name: string, plate: Plate): Promise<number> {
  const [width, height] = formats[plate.format];
  const sheet = new Sheet(width, height);
  plate.draw(sheet);
  const image = sharp(Buffer.from(await sheet.svg()), { unlimited: true }).flatten({ background: "#eef2ef" });
  const { size } = await image.jpeg({ quality: 80, mozjpeg: true }).toFile(new URL(`${name}.jpg`, folder).pathname);
  return size;
}

async function checkIndex(): Promise<void> {
  const rows = JSON.parse(await readFile(new URL("index.json", folder), "utf8")) as { file: string }[];
  const told = new Set(rows.map(({ file }) => file.replace(".jpg", "")));
  const drawn = new Set(Object.keys(plates));
  const untold = [...drawn].filter((name) => !told.has(name));
  const undrawn = [...told].filter((name) => !drawn.has(name));
  if (untold.length + undrawn.length > 0) throw new Error(`index.json and the plates differ. Not in index.json: ${untold.join(", ") || "none"}. Not drawn: ${undrawn.join(", ") || "none"}.`);
}

const wanted = process.argv.slice(2);
let total = 0;
for (const [name, plate] of Object.entries(plates)) {
  if (wanted.length > 0 && !wanted.some((part) => name.includes(part))) continue;
  const started = Date.now();
  const size = await drawOne(name, plate);
  total += size;
  process.stdout.write(`${name} ${Math.round(size / 1000)} kB, ${Date.now() - started} ms\n`);
}
process.stdout.write(`${Math.round(total / 1000)} kB in all\n`);
await checkIndex();
