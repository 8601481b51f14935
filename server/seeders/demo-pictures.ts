import { readFile } from 'node:fs/promises';
import { fileURLToPath } from 'node:url';
import { z } from 'zod';

// As far from here as from the bundled server: both stand two folders below the tree's top.
const folder = new URL('../../content-fixtures/pictures/', import.meta.url);
const index = z.array(z.object({ file: z.string(), shows: z.string() }));

export interface PlateFile {
  readonly path: string;
  /** For people who cannot see it. */
  readonly alt: string;
}

/** The drawn plates of the demo by their file names. */
export async function demoPlates(): Promise<Map<string, PlateFile>> {
  const plates = index.parse(JSON.parse(await readFile(new URL('index.json', folder), 'utf8')));
  return new Map(plates.map(({ file, shows }) => [file, { path: fileURLToPath(new URL(file, folder)), alt: shows }]));
}
