import type { Point } from "./paths.ts";
import { open, rect } from "./paths.ts";
import type { Material } from "./recipes.ts";
import { tileOf, tileSize } from "./tiles.ts";

export const ink = "#141c26";

/** Height off the ground in pixels of shadow: light comes from the upper left, so it falls to the lower right. */
export interface SolidOptions {
  readonly drop?: number;
  readonly edge?: number;
  readonly dark?: number;
  readonly light?: number;
}

export interface Grain {
  /** Degrees the grain is turned; nought runs left to right. */
  readonly turn?: number;
  readonly size?: number;
  /** Which part of the tile is seen; give each board its own. */
  readonly part?: number;
}

interface Box {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly foot: number;
}

/** The box an outline and its curves' handles lie in. */
function boxOf(path: string): Box {
  const pairs = [...path.matchAll(/(-?[\d.]+) (-?[\d.]+)/g)];
  const [xs, ys] = [pairs.map((found) => Number(found[1])), pairs.map((found) => Number(found[2]))];
  return { left: Math.min(...xs), top: Math.min(...ys), right: Math.max(...xs), foot: Math.max(...ys) };
}

/** One plate being drawn: shapes go down in order, and the materials they use are kept for the definitions. */
export class Sheet {
  readonly width: number;
  readonly height: number;
  private readonly body: string[] = [];
  private readonly definitions: string[] = [];
  private readonly patterns = new Map<string, string>();
  private readonly materials = new Set<Material>();
  private count = 0;

  constructor(width: number, height: number) {
    this.width = width;
    this.height = height;
  }

  private id(letter: string): string {
    this.count += 1;
    return `${letter}${this.count}`;
  }

  add(markup: string): void {
    this.body.push(markup);
  }

  /** A material as something to fill with. */
  of(material: Material, { turn = 0, size = 1, part = 0 }: Grain = {}): string {
    const key = `${material} ${turn} ${size} ${part}`;
    const known = this.patterns.get(key);
    if (known) return known;
    this.materials.add(material);
    const id = this.id("p");
    const shift = `translate(${(part * 389) % tileSize} ${(part * 631) % tileSize})`;
    this.definitions.push(`<pattern id="${id}" patternUnits="userSpaceOnUse" width="${tileSize}" height="${tileSize}" patternTransform="rotate(${turn}) scale(${size}) ${shift}"><use href="#tile-${material}"/></pattern>`);
    this.patterns.set(key, `url(#${id})`);
    return `url(#${id})`;
  }

  /** The outline swept away from the light, flat, with engraved lines over it. */
  shadow(path: string, drop: number, strength = 0.34): void {
    const id = this.id("s");
    const steps = Math.max(1, Math.ceil(drop / 5));
    const copies = Array.from({ length: steps }, (_, i) => `<path d="${path}" fill="#fff" fill-rule="evenodd" transform="translate(${((i + 1) / steps) * drop} ${((i + 1) / steps) * drop * 0.86})"/>`);
    const box = boxOf(path);
    const swept = { ...box, right: box.right + drop, foot: box.foot + drop };
    const [wide, high] = [swept.right - box.left, swept.foot - box.top];
    this.definitions.push(`<mask id="${id}" maskUnits="userSpaceOnUse" x="${box.left}" y="${box.top}" width="${wide}" height="${high}">${copies.join("")}</mask>`);
    this.add(`<g mask="url(#${id})"><path d="${rect(box.left, box.top, wide, high)}" fill="${ink}" opacity="${strength}"/>${this.engrave(swept, 45, 9, 2.2, strength * 0.9)}</g>`);
  }

  /** Parallel engraved lines over a box, all on one grid across the plate so that neighbouring shades run on. */
  private engrave(box: Box, turn: number, gap: number, weight: number, opacity: number): string {
    const angle = (turn * Math.PI) / 180;
    const [along, across]: [Point, Point] = [[Math.cos(angle), Math.sin(angle)], [-Math.sin(angle), Math.cos(angle)]];
    const corners: Point[] = [[box.left, box.top], [box.right, box.top], [box.left, box.foot], [box.right, box.foot]];
    const reach = (axis: Point): number[] => corners.map(([x, y]) => x * axis[0] + y * axis[1]);
    const [ends, rows] = [reach(along), reach(across)];
    const [from, to] = [Math.min(...ends), Math.max(...ends)];
    const lines: string[] = [];
    for (let row = Math.ceil(Math.min(...rows) / gap) * gap; row <= Math.max(...rows); row += gap) {
      lines.push(open([from * along[0] + row * across[0], from * along[1] + row * across[1]], [to * along[0] + row * across[0], to * along[1] + row * across[1]]));
    }
    return `<path d="${lines.join("")}" stroke="${ink}" stroke-width="${weight}" opacity="${opacity}"/>`;
  }

  clipped(path: string, draw: () => void): void {
    const id = this.id("c");
    this.definitions.push(`<clipPath id="${id}"><path d="${path}" clip-rule="evenodd"/></clipPath>`);
    this.add(`<g clip-path="url(#${id})">`);
    draw();
    this.add("</g>");
  }

  /** A thing with a body: shadow, face, a dark lower right edge and a light upper left one. */
  solid(path: string, fill: string, { drop = 0, edge = 5, dark = 0.38, light = 0.3 }: SolidOptions = {}): void {
    if (drop > 0) this.shadow(path, drop);
    this.flat(path, fill);
    const rim = (colour: string, shift: number, opacity: number): void =>
      this.add(`<path d="${path}" fill="none" stroke="${colour}" stroke-width="${edge}" stroke-opacity="${opacity}" transform="translate(${shift} ${shift})"/>`);
    this.clipped(path, () => {
      if (light > 0) rim("#fff6e0", edge / 2 - 1, light);
      if (dark > 0) rim(ink, -edge / 2 + 1, dark);
    });
  }

  flat(path: string, fill: string, opacity = 1): void {
    this.add(`<path d="${path}" fill="${fill}" fill-rule="evenodd"${opacity < 1 ? ` opacity="${opacity}"` : ""}/>`);
  }

  /** A turn away from the light: a flat tone and engraved lines. */
  shade(path: string, strength = 0.3, turn = 45): void {
    this.clipped(path, () => {
      this.flat(path, ink, strength);
      this.add(this.engrave(boxOf(path), turn, 8, 1.8, strength * 0.9));
    });
  }

  line(path: string, colour: string, weight: number, opacity = 1, cap: "butt" | "round" = "round"): void {
    this.add(`<path d="${path}" fill="none" stroke="${colour}" stroke-width="${weight}" stroke-linecap="${cap}" stroke-linejoin="round"${opacity < 1 ? ` opacity="${opacity}"` : ""}/>`);
  }

  /** A rod, wire, rope or bead: an outline stroke, its body and a line of light along it. */
  cord(path: string, fill: string, weight: number, drop = 0): void {
    if (drop > 0) this.add(`<path d="${path}" fill="none" stroke="${ink}" stroke-opacity=".36" stroke-width="${weight}" stroke-linecap="round" transform="translate(${drop} ${drop * 0.86})"/>`);
    this.line(path, ink, weight, 1);
    this.line(path, fill, weight - 3);
    this.add(`<path d="${path}" fill="none" stroke="#fff6e0" stroke-opacity=".4" stroke-width="${weight * 0.2}" stroke-linecap="round" transform="translate(${-weight * 0.17} ${-weight * 0.17})"/>`);
  }

  async svg(): Promise<string> {
    const tiles = await Promise.all([...this.materials].map(async (material) => `<image id="tile-${material}" width="${tileSize}" height="${tileSize}" href="${await tileOf(material)}"/>`));
    return `<svg xmlns="http://www.w3.org/2000/svg" width="${this.width}" height="${this.height}" viewBox="0 0 ${this.width} ${this.height}"><defs>${tiles.join("")}${this.definitions.join("")}</defs>${this.body.join("")}</svg>`;
  }
}
