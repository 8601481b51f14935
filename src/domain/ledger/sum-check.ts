export interface BuildFigures {
  readonly spent: number;
  readonly movedIn: number;
  readonly used: number;
  readonly wasted: number;
  readonly left: number;
  readonly onOrder: number;
  readonly notSorted: number;
  readonly returned: number;
  readonly sold: number;
  readonly movedOut: number;
}

/**
 * The sum that must hold for every shelf and build, in minor units:
 * spent + moved in = used + wasted + left + on order + not sorted yet + returned + sold + moved out.
 * `difference` is the left side less the right.
 */
export function sumCheck(f: BuildFigures): { readonly holds: boolean; readonly difference: number } {
  const rests = f.used + f.wasted + f.left + f.onOrder + f.notSorted + f.returned + f.sold + f.movedOut;
  const difference = f.spent + f.movedIn - rests;
  return { holds: difference === 0, difference };
}
