import { Link } from 'react-router-dom';
import type { LaidBar, Strip } from './tape-layout.ts';

export type TapeSize = 'tall' | 'short';

export interface TapeStripProps {
  strip: Strip;
  name: string;
  size: TapeSize;
  show: (amount: number, unsettled?: boolean) => string;
}

/** Height of the month band and of the ticks along the lower edge, px. */
const monthBand = 24;
const tickBand = 26;
const barRoom = { tall: 58, short: 34 } as const;
const tickHeights = { day: 6, week: 13, month: 22 } as const;

export function TapeStrip({ strip, name, size, show }: TapeStripProps) {
  const foot = monthBand + barRoom[size];
  const height = foot + tickBand;
  const ticks = (kind: keyof typeof tickHeights) => strip.ticks[kind].map((x) => `M${x} ${height}v-${tickHeights[kind]}`).join('');
  return (
    <svg width={strip.width} height={height} viewBox={`0 0 ${strip.width} ${height}`} role="group" aria-label={name}>
      <path className="ticks" strokeWidth="1" strokeOpacity="0.55" d={ticks('day')} />
      <path className="ticks" strokeWidth="1.25" d={ticks('week')} />
      <path className="ticks" strokeWidth="2" d={ticks('month')} />
      {strip.folds.map((fold) => (
        <g key={fold.x} aria-hidden="true">
          <rect className="fold" x={fold.x} y="0" width={fold.width} height={height} />
          <path className="fold-edge" d={zigzag(fold.x, height) + zigzag(fold.x + fold.width, height)} />
          <text x={fold.x + fold.width / 2} y={monthBand + barRoom[size] / 2 + 5} textAnchor="middle">
            laid up {fold.weeks} weeks
          </text>
        </g>
      ))}
      <g aria-hidden="true">
        {strip.months.map((month) => (
          <text key={month.x} x={month.x} y="16">
            {month.label}
          </text>
        ))}
      </g>
      {strip.bars.map((bar) => (
        <StripBar key={bar.key} bar={bar} foot={foot} room={barRoom[size]} height={height} figure={show(bar.amount, bar.unsettled)} />
      ))}
    </svg>
  );
}

interface StripBarProps {
  bar: LaidBar;
  foot: number;
  room: number;
  height: number;
  figure: string;
}

function StripBar({ bar, foot, room, height, figure }: StripBarProps) {
  // A day that cost nothing still shows that there was work.
  const tall = Math.max(2, Math.round(bar.share * room * 10) / 10);
  const name = `${bar.when}, ${bar.label}, ${figure}`;
  return (
    <Link to={bar.href} aria-label={name} aria-current={bar.current ? 'true' : undefined}>
      <rect className="bar" x={bar.bar.start} y={round(foot - tall)} width={round(bar.bar.end - bar.bar.start)} height={tall} />
      {bar.current && <path className="bar" d={`M${round((bar.bar.start + bar.bar.end) / 2)} ${foot + 2}l6 10h-12z`} />}
      <rect className="hit" x={bar.target.start} y={monthBand - 2} width={round(bar.target.end - bar.target.start)} height={height - monthBand + 2}>
        <title>{name}</title>
      </rect>
    </Link>
  );
}

function round(value: number): number {
  return Math.round(value * 10) / 10;
}

/** The torn edge of a fold, from top to bottom. */
function zigzag(x: number, height: number): string {
  const teeth = Math.ceil(height / 8);
  return `M${x} 0${Array.from({ length: teeth }, (_, index) => `l${index % 2 === 0 ? 4 : -4} 8`).join('')}`;
}
