import { Link } from 'react-router-dom';
import { Face } from './face.tsx';

export interface BylineProps {
  name: string;
  to?: string;
  /** "with ines", "published 15 Nov 2026". */
  note?: string;
}

export function Byline({ name, to, note }: BylineProps) {
  return (
    <div className="flex items-center gap-2.5 text-control">
      <Face name={name} />
      <div className="leading-snug">
        {to ? (
          <Link to={to} className="font-[650] text-ink no-underline hover:underline">
            {name}
          </Link>
        ) : (
          <b className="font-[650]">{name}</b>
        )}
        {note && <div className="text-small text-ink-soft">{note}</div>}
      </div>
    </div>
  );
}
