import { NavLink } from 'react-router-dom';

export interface PageTabsProps {
  label: string;
  links: { to: string; label: string; end?: boolean }[];
}

/** The pages of one build or of the settings; stands at the foot of the header band. */
export function PageTabs({ label, links }: PageTabsProps) {
  return (
    <nav aria-label={label} className="not-printed -mb-6 mt-4 flex flex-wrap gap-x-[26px] text-control font-semibold">
      {links.map((link) => (
        <NavLink
          key={link.to}
          to={link.to}
          end={link.end ?? true}
          className="border-b-[3px] border-transparent py-2.5 text-ink-soft no-underline hover:text-ink aria-[current]:border-scribe aria-[current]:text-scribe"
        >
          {link.label}
        </NavLink>
      ))}
    </nav>
  );
}
