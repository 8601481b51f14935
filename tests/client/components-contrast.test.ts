import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

// Contrast by WCAG 2.2, "relative luminance" and "contrast ratio" (https://www.w3.org/TR/WCAG22/#dfn-contrast-ratio).
// The design asks 5:1 of text, above the 4.5:1 of success criterion 1.4.3; drawn parts need 3:1 (1.4.11).
type Scheme = 'light' | 'dark';
const schemes: readonly Scheme[] = ['light', 'dark'];
const text = 5;
const drawn = 3;

const css = readFileSync('src/app/app.css', 'utf8');
const tokens = readTokens(css);

function readTokens(source: string): Map<string, Record<Scheme, string>> {
  const found = new Map<string, Record<Scheme, string>>();
  for (const [, name, value] of source.matchAll(/--color-([a-z-]+):\s*([^;]+);/g)) {
    const hexes = value?.match(/#[0-9a-f]{3,8}/gi) ?? [];
    const [light, dark = light] = hexes;
    if (name && light && dark) found.set(name, { light, dark });
  }
  return found;
}

function colour(name: string, scheme: Scheme): string {
  const token = tokens.get(name);
  if (!token) throw new Error(`No colour named ${name} in app.css`);
  return token[scheme];
}

function luminance(hex: string): number {
  const full = hex.length === 4 ? hex.replaceAll(/[0-9a-f]/gi, '$&$&') : hex;
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((at) => {
    const share = Number.parseInt(full.slice(at, at + 2), 16) / 255;
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

function contrast(one: string, other: string): number {
  const [dark = 0, light = 0] = [luminance(one), luminance(other)].toSorted((a, b) => a - b);
  return (light + 0.05) / (dark + 0.05);
}

const open = ['sheet', 'card', 'hover'];
const deep = ['scribe-deep'];
/** Every colour words are set in, and what they stand on. */
const words: Record<string, readonly string[]> = {
  ink: [...open, 'zinc-wash', 'scribe-wash', 'lead-wash', 'verd-wash', 'grey-wash'],
  'ink-soft': [...open, 'grey-wash'],
  'ink-faint': open,
  scribe: open,
  lead: open,
  verd: open,
  'zinc-ink': [...open, 'zinc-wash'],
  'on-scribe': ['scribe'],
  'on-zinc': ['zinc'],
  'on-deep': deep,
  'on-deep-soft': [...deep, 'deep-field'],
  white: ['scribe-deep', 'deep-field', 'face'],
  'scribe-text': ['scribe-wash'],
  'lead-text': ['lead-wash'],
  'verd-text': ['verd-wash'],
  'tape-ink': ['tape'],
};

/** Edges, bars, marks and rings that carry meaning. */
const parts: Record<string, readonly string[]> = {
  edge: ['sheet', 'card'],
  'deep-edge': deep,
  scribe: ['sheet', 'card', 'rule'],
  lead: ['sheet', 'card', 'rule'],
  verd: ['sheet', 'card', 'rule'],
  ink: ['rule'],
  zinc: deep,
  'tape-bar': ['tape'],
  'tape-now': ['tape'],
  'scribe-deep': ['zinc'],
};

describe.each(schemes)('the %s scheme', (scheme) => {
  const pairs = (table: typeof words) => Object.entries(table).flatMap(([front, grounds]) => grounds.map((ground) => [front, ground] as const));

  it.each(pairs(words))('sets %s on %s clearly enough to read', (front, ground) => {
    expect(contrast(colour(front, scheme), colour(ground, scheme))).toBeGreaterThanOrEqual(text);
  });

  it.each(pairs(parts))('draws %s on %s clearly enough to see', (front, ground) => {
    expect(contrast(colour(front, scheme), colour(ground, scheme))).toBeGreaterThanOrEqual(drawn);
  });
});

describe('the parts of the look', () => {
  const sources = readdirSync('src/components').map((name) => readFileSync(`src/components/${name}`, 'utf8')).join('\n');

  it('set words only in colours that are measured here', () => {
    const used = [...sources.matchAll(/(?<![\w-])text-([a-z]+(?:-[a-z]+)*)/g)].flatMap(([, name]) => (name && tokens.has(name) ? [name] : []));
    expect(used.length).toBeGreaterThan(20);
    expect([...new Set(used)].filter((name) => !(name in words))).toEqual([]);
  });

  it('name no colour that app.css does not have', () => {
    const named = [...sources.matchAll(/(?<![\w-])(?:bg|fill|stroke|border|accent)-([a-z]+(?:-[a-z]+)*)(?![\w[-])/g)].flatMap(([, name]) => (name ? [name] : []));
    const notColours = /^(?:[trblxy]|dashed|transparent|collapse|center|cover|inherit|none|[trblxy]-.*)$/;
    expect([...new Set(named)].filter((name) => !tokens.has(name) && !notColours.test(name))).toEqual([]);
  });
});

it('measures as WCAG says: black on white is 21 to 1, a colour on itself 1 to 1', () => {
  expect(contrast('#000', '#ffffff')).toBeCloseTo(21, 5);
  expect(contrast('#272c8c', '#272c8c')).toBe(1);
  // Grey #767676 on white, the lightest that passes AA: 4.54 (W3C, Understanding 1.4.3, from memory).
  expect(contrast('#767676', '#fff')).toBeCloseTo(4.54, 2);
});
