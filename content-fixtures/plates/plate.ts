import type { Sheet } from "./sheet.ts";

/** Width and height in pixels: three to two, four to three, or upright. */
export type Format = "wide" | "tall" | "full";

export const formats: Record<Format, readonly [number, number]> = { wide: [1600, 1067], full: [1600, 1200], tall: [1067, 1600] };

export interface Plate {
  readonly format: Format;
  readonly draw: (sheet: Sheet) => void;
}

/** Plates by the name of their file, without its ending. */
export type Plates = Readonly<Record<string, Plate>>;
