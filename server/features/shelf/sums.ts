// Pieces of SQL that sums over priced rows share. SQL sums money and minutes, never quantities.

/** `?, ?, ?` for a list. */
export function marks(values: readonly unknown[]): string {
  return values.map(() => '?').join(', ');
}

/** A sum over the rows that meet a condition; nought where there are none. */
export function summed(condition: string, column: string): string {
  return `ifnull(sum(case when ${condition} then ${column} else 0 end), 0)`;
}

// A shortage found by counting is used, not written up, unless it was called wasted.
export const usedSum = summed(`kind = 'used' or (kind = 'counted' and ifnull(shortage, 'used') = 'used')`, 'value');
export const wastedSum = summed(`kind = 'wasted' or (kind = 'counted' and shortage = 'wasted')`, 'value');
