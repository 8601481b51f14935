import type { ReactNode } from 'react';

export interface FourFigure {
  figure: string;
  /** What the figure is: "spent", "used in the build". Never left out. */
  words: string;
  small?: ReactNode;
}

/** Spent, used, wasted, left on the shelf. More than four when there is something on order or returned. */
export function FourFigures({ figures }: { figures: FourFigure[] }) {
  return (
    <ul aria-label="What the build has cost" className="flex flex-wrap gap-px border border-rule bg-rule">
      {figures.map((figure) => (
        <li key={figure.words} className="grow basis-[calc(50%-1px)] bg-card p-4 wide:basis-[200px] wide:px-6 wide:py-5">
          <span className="lettering-figure block text-[clamp(1.25rem,0.7rem+2.2vw,2rem)]">{figure.figure}</span>
          <span className="mt-1.5 block font-semibold">{figure.words}</span>
          {figure.small && <span className="block text-small text-ink-soft">{figure.small}</span>}
        </li>
      ))}
    </ul>
  );
}
