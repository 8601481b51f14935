export interface Speedometer {
  readonly moved: (bytes: number) => void;
  /** Seconds for so many bytes at the pace of the last few seconds; nothing while there is no pace yet. */
  readonly secondsFor: (bytes: number) => number | null;
}

const span = 5000;
const soonest = 1000;

export function speedometer(now: () => number = () => performance.now()): Speedometer {
  let moves: { at: number; bytes: number }[] = [];
  return {
    moved: (bytes) => {
      const at = now();
      moves = [...moves.filter((move) => at - move.at < span), { at, bytes }];
    },
    secondsFor: (bytes) => {
      const first = moves[0];
      if (!first) return null;
      const elapsed = now() - first.at;
      const moved = moves.reduce((sum, move) => sum + move.bytes, 0);
      return elapsed < soonest || moved <= 0 ? null : Math.ceil(bytes / (moved / elapsed) / 1000);
    },
  };
}
