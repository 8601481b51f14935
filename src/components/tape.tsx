export type TapeScale = 'money' | 'hours';

export interface TapeBar {
  /** Plain date, YYYY-MM-DD. */
  day: string;
  /** Last day, where the entry covers several. */
  to?: string | null;
  /** Minor units of money, or minutes. */
  amount: number;
  /** Title of the entry and the figure in words; read out, and shown on hover. */
  label: string;
  href: string;
  current?: boolean;
}

export interface TapeProps {
  /** "Curlew, day by day". */
  title: string;
  scale: TapeScale;
  /** Plain dates the tape runs between. */
  from: string;
  to: string;
  bars: TapeBar[];
  /** Writes an amount out: `£91.74` or `7 h 30 min`. */
  show: (amount: number) => string;
  /** Chosen by the layout when left out: days while they can be told apart, then weeks. */
  unit?: 'day' | 'week';
  /** The same page with the other scale. */
  toggleHref?: string;
  /** Taller on a build's own page. */
  size?: 'tall' | 'short';
}

export function Tape({ title }: TapeProps) {
  return <p>{title}</p>;
}
