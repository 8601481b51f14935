import { Fragment, type ReactNode } from 'react';
import { Link } from 'react-router-dom';

export interface KickerProps {
  /** The build it belongs to, set heavier than the rest. */
  lead?: { label: string; to?: string };
  /** Facts after it, parted by dots; a Chip goes in as it is. */
  items?: ReactNode[];
}

export function Kicker({ lead, items = [] }: KickerProps) {
  const parts = [...(lead ? [<KickerLead key="lead" {...lead} />] : []), ...items];
  return (
    <p className="flex flex-wrap items-center gap-x-2.5 gap-y-1 text-note font-semibold text-ink-soft">
      {parts.map((part, index) => (
        // The order of a kicker is fixed, so the place is the identity.
        <Fragment key={index}>
          {index > 0 && <span aria-hidden="true" className="size-[3px] rounded-[50%] bg-ink-faint" />}
          <span>{part}</span>
        </Fragment>
      ))}
    </p>
  );
}

function KickerLead({ label, to }: { label: string; to?: string }) {
  // Above the title's link, which covers the whole of a row.
  const lettering = 'lettering-name relative z-10 text-ink';
  return to ? (
    <Link to={to} className={lettering}>
      {label}
    </Link>
  ) : (
    <b className={lettering}>{label}</b>
  );
}
