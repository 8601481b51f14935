/** What each material looks like: one flat ground and a few flat tones cut through it by noise, as a print is cut. */

export type Layer =
  | { kind: "noise"; tone: string; across: number; down: number; from: number; soft?: number; octaves?: number; alpha?: number }
  | { kind: "rings"; tone: string; rings: number; wander: number; across: number; down: number; width: number; alpha?: number }
  | { kind: "weave"; tone: string; threads: number; alpha?: number };

export interface Recipe {
  readonly ground: string;
  readonly layers: readonly Layer[];
}

const speck = (tone: string, from: number, alpha = 0.6): Layer => ({ kind: "noise", tone, across: 130, down: 130, from, soft: 0.06, octaves: 2, alpha });
const blotch = (tone: string, size: number, from: number, alpha = 0.8): Layer => ({ kind: "noise", tone, across: size, down: size, from, soft: 0.02, octaves: 5, alpha });
const brushed = (tone: string, alpha = 0.35): Layer => ({ kind: "noise", tone, across: 5, down: 190, from: 0.62, soft: 0.1, octaves: 1, alpha });
const pores = (tone: string, from: number, alpha = 0.7): Layer => ({ kind: "noise", tone, across: 26, down: 240, from, soft: 0.06, octaves: 1, alpha });
const rings = (tone: string, count: number, wander: number, width: number, alpha = 0.8): Layer => ({ kind: "rings", tone, rings: count, wander, across: 2, down: 4, width, alpha });
const streaks = (tone: string, from: number, alpha = 0.6): Layer => ({ kind: "noise", tone, across: 3, down: 36, from, soft: 0.03, octaves: 3, alpha });

export const recipes = {
  ash: { ground: "#d9ba8a", layers: [streaks("#e3c99f", 0.56, 0.8), rings("#c39d69", 20, 1.6, 0.34), pores("#b98f58", 0.8)] },
  oak: { ground: "#a87e4f", layers: [streaks("#b58d5e", 0.56), rings("#8d6639", 24, 1.4, 0.36), pores("#6f4d2a", 0.77)] },
  beech: { ground: "#a68b6d", layers: [streaks("#b19778", 0.55, 0.7), rings("#977c5e", 14, 0.9, 0.3, 0.6), pores("#87694b", 0.84, 0.6)] },
  pine: { ground: "#cfae7b", layers: [rings("#b98f57", 13, 1.8, 0.22), streaks("#d9bd90", 0.58, 0.6)] },
  walnut: { ground: "#74492c", layers: [streaks("#84573a", 0.55, 0.8), rings("#57331d", 16, 1.5, 0.34), pores("#40240f", 0.8, 0.7)] },
  walnutDark: { ground: "#4d2f1e", layers: [streaks("#5b3926", 0.55, 0.8), rings("#3a2114", 15, 1.3, 0.34), pores("#2a160b", 0.82, 0.6)] },
  figured: {
    ground: "#8a5730",
    layers: [
      { kind: "rings", tone: "#a06a3d", rings: 7, wander: 3.4, across: 3, down: 3, width: 0.5, alpha: 0.8 },
      { kind: "rings", tone: "#5f371c", rings: 11, wander: 4.6, across: 3, down: 3, width: 0.26, alpha: 0.85 },
      pores("#4a2813", 0.84, 0.6),
    ],
  },
  dullFigured: {
    ground: "#7d6049",
    layers: [
      { kind: "rings", tone: "#8c6f57", rings: 7, wander: 3.4, across: 3, down: 3, width: 0.5, alpha: 0.7 },
      { kind: "rings", tone: "#5f4632", rings: 11, wander: 4.6, across: 3, down: 3, width: 0.24, alpha: 0.75 },
      blotch("#94806a", 7, 0.64, 0.45),
    ],
  },
  rot: { ground: "#4a3524", layers: [blotch("#2f2118", 9, 0.54), streaks("#6d5034", 0.62, 0.9), { kind: "noise", tone: "#1d140e", across: 60, down: 26, from: 0.74, soft: 0.04, octaves: 2, alpha: 0.9 }] },
  stained: { ground: "#a98a60", layers: [rings("#8b6c46", 18, 1.6, 0.34), blotch("#6b5237", 4, 0.56, 0.75), blotch("#3f3022", 6, 0.68, 0.8)] },
  ply: { ground: "#dcc094", layers: [rings("#cba978", 6, 3.2, 0.34, 0.7), streaks("#e6cfa8", 0.58, 0.7), pores("#c09c69", 0.86, 0.6)] },
  lining: { ground: "#c7b08a", layers: [rings("#b89d74", 6, 2.8, 0.3, 0.6), pores("#a88c63", 0.86, 0.5)] },
  aluminium: { ground: "#bcc6c8", layers: [brushed("#cbd4d5", 0.7), brushed("#a8b4b8", 0.4), blotch("#b0bbbe", 5, 0.6, 0.5)] },
  steel: { ground: "#9aa6ad", layers: [brushed("#b3bec4", 0.7), { kind: "noise", tone: "#808d95", across: 7, down: 160, from: 0.66, soft: 0.1, octaves: 1, alpha: 0.5 }] },
  darkSteel: { ground: "#5f6b74", layers: [brushed("#717d86", 0.6), brushed("#4f5a63", 0.4)] },
  castIron: { ground: "#6b757b", layers: [speck("#7b868c", 0.6, 0.7), speck("#555f66", 0.68, 0.7), blotch("#626c72", 6, 0.56, 0.6)] },
  japan: { ground: "#262d36", layers: [speck("#323a44", 0.66, 0.6), blotch("#2d3540", 5, 0.58, 0.7)] },
  rust: { ground: "#8d4f2c", layers: [blotch("#a8632f", 9, 0.52, 0.9), blotch("#643520", 8, 0.6, 0.9), blotch("#bf7c3d", 16, 0.68, 0.8), speck("#4b2617", 0.72, 0.7)] },
  darkRust: { ground: "#62402f", layers: [blotch("#7e4d2e", 9, 0.54, 0.9), blotch("#432c24", 8, 0.58, 0.9), speck("#37231c", 0.7, 0.7)] },
  primer: { ground: "#9c3f24", layers: [blotch("#a8492c", 6, 0.56, 0.6), speck("#8a361e", 0.7, 0.5)] },
  greyPrimer: { ground: "#8f9a9d", layers: [blotch("#99a4a6", 6, 0.56, 0.6), speck("#828d90", 0.7, 0.5)] },
  cream: { ground: "#e9e2c9", layers: [blotch("#efe9d4", 5, 0.56, 0.6), speck("#ddd5ba", 0.76, 0.4)] },
  chalkyCream: { ground: "#cdc8b4", layers: [blotch("#bdb9a6", 5, 0.55, 0.7), blotch("#d8d4c2", 8, 0.62, 0.6), streaks("#aaa793", 0.74, 0.4)] },
  sea: { ground: "#2c7e6e", layers: [blotch("#33897a", 5, 0.56, 0.6), speck("#236b5e", 0.74, 0.4)] },
  chalkySea: { ground: "#66857c", layers: [blotch("#7a958c", 5, 0.55, 0.7), blotch("#587469", 8, 0.62, 0.6)] },
  whiteMetal: { ground: "#c3c7c4", layers: [speck("#d5d8d4", 0.6, 0.6), speck("#a9afae", 0.72, 0.5), blotch("#b8bdbb", 6, 0.58, 0.5)] },
  moltenMetal: { ground: "#eef0ea", layers: [blotch("#d8ddd9", 5, 0.58, 0.8)] },
  brass: { ground: "#c79c46", layers: [brushed("#d9b363", 0.6), speck("#ad8334", 0.74, 0.4)] },
  tarnish: { ground: "#54452f", layers: [blotch("#6b5937", 8, 0.56, 0.8), blotch("#39352c", 9, 0.6, 0.8), blotch("#4c6a58", 12, 0.7, 0.6)] },
  leather: { ground: "#8a5a35", layers: [streaks("#93623c", 0.56, 0.7), speck("#774b2a", 0.76, 0.4), blotch("#7f522f", 4, 0.6, 0.4)] },
  greenLeather: { ground: "#24584a", layers: [speck("#2f6656", 0.6, 0.6), speck("#1b463b", 0.7, 0.6)] },
  canvas: { ground: "#cfc6b0", layers: [{ kind: "weave", tone: "#b5aa90", threads: 128, alpha: 0.6 }, blotch("#d8d0bc", 5, 0.58, 0.5)] },
  cloth: { ground: "#7d8fa0", layers: [{ kind: "weave", tone: "#66788a", threads: 128, alpha: 0.6 }, blotch("#899aab", 5, 0.58, 0.5)] },
  rubber: { ground: "#23272c", layers: [speck("#30353b", 0.68, 0.6)] },
  oldRubber: { ground: "#4b4d4c", layers: [blotch("#5c5e5b", 12, 0.56, 0.8), speck("#343736", 0.7, 0.7)] },
  concrete: { ground: "#8f979a", layers: [blotch("#989fa1", 5, 0.54, 0.7), speck("#7f878b", 0.72, 0.6), speck("#a3a9aa", 0.74, 0.5)] },
  wall: { ground: "#8fa3a1", layers: [streaks("#98aba9", 0.56, 0.7), rings("#85999a", 10, 1.2, 0.2, 0.5)] },
  slate: { ground: "#3c4650", layers: [streaks("#434e58", 0.56, 0.8), rings("#343d47", 10, 1.2, 0.24, 0.6)] },
  blueBoard: { ground: "#2a3160", layers: [streaks("#303869", 0.56, 0.8), rings("#232952", 10, 1.2, 0.24, 0.6)] },
  grass: { ground: "#6f8061", layers: [{ kind: "noise", tone: "#7d8e6b", across: 150, down: 40, from: 0.58, soft: 0.06, octaves: 2, alpha: 0.8 }, { kind: "noise", tone: "#5d6f52", across: 160, down: 44, from: 0.64, soft: 0.06, octaves: 2, alpha: 0.8 }] },
  brick: { ground: "#8d6658", layers: [blotch("#986f60", 10, 0.54, 0.8), speck("#7a574b", 0.7, 0.6)] },
  moss: { ground: "#59684a", layers: [speck("#6d7d57", 0.58, 0.9), blotch("#465439", 14, 0.6, 0.8)] },
  card: { ground: "#b9a98c", layers: [speck("#aa9a7d", 0.7, 0.5), blotch("#c2b397", 5, 0.6, 0.5)] },
  glass: { ground: "#a9bec2", layers: [blotch("#b3c6c9", 3, 0.6, 0.6)] },
  clay: { ground: "#b09a83", layers: [blotch("#a08a73", 8, 0.56, 0.7), speck("#8f7963", 0.74, 0.5)] },
  grease: { ground: "#6d6a3d", layers: [blotch("#817d4a", 8, 0.56, 0.8)] },
  soda: { ground: "#7f979b", layers: [blotch("#8aa2a5", 5, 0.56, 0.6), blotch("#98794f", 4, 0.66, 0.45)] },
  glue: { ground: "#8b5220", layers: [blotch("#a5682c", 4, 0.58, 0.7)] },
  polished: {
    ground: "#6f3f20",
    layers: [
      { kind: "rings", tone: "#8b5229", rings: 7, wander: 3.4, across: 2, down: 4, width: 0.5, alpha: 0.85 },
      { kind: "rings", tone: "#4a2611", rings: 11, wander: 3.6, across: 2, down: 4, width: 0.26, alpha: 0.9 },
    ],
  },
} as const satisfies Record<string, Recipe>;

export type Material = keyof typeof recipes;
