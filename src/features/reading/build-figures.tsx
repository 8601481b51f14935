import type { FiguresView } from '#contracts/builds.ts';
import { formatMinutes, formatMoney, plural } from '#domain/format.ts';
import { FourFigures } from '#src/components/four-figures.tsx';

/** The four headline figures; what else the sum holds is said under them when there is any. */
export function BuildFigures({ figures, currency, days, minutes }: { figures: FiguresView; currency: string; days: number; minutes: number }) {
  const money = (minor: number) => formatMoney(minor, currency);
  const others = [
    ['on order', figures.onOrder], ['not sorted yet', figures.notSorted], ['returned', figures.returned], ['sold', figures.sold], ['moved to the shed', figures.movedOut],
  ] as const;
  const rest = others.filter(([, minor]) => minor !== 0).map(([words, minor]) => `${money(minor)} ${words}`);
  const moved = figures.movedIn === 0 ? '' : `, and ${money(figures.movedIn)} from the shed`;
  return (
    <>
      <FourFigures figures={[
        { figure: money(figures.spent), words: 'spent', small: `${plural(figures.receipts, 'receipt', 'receipts')}${moved}` },
        { figure: money(figures.used), words: 'used in the build', small: `on ${plural(days, 'day', 'days')}, ${formatMinutes(minutes)}` },
        { figure: money(figures.wasted), words: 'wasted', small: wastedShare(figures) },
        { figure: money(figures.left), words: 'left on the shelf', small: plural(figures.materialsLeft, 'material', 'materials') },
      ]} />
      {(rest.length > 0 || figures.unsettled) && (
        <p className="num mt-2 text-note text-ink-soft">
          {rest.length > 0 && `Also in the sum: ${rest.join(', ')}. `}
          {figures.unsettled && 'Some of what was used is not bought yet, so its money is not in these figures.'}
        </p>
      )}
    </>
  );
}

function wastedShare({ used, wasted }: FiguresView): string {
  if (wasted === 0) return 'nothing so far';
  return used > 0 ? `${Math.round((wasted * 1000) / used) / 10} % of what was used` : 'nothing used yet';
}
