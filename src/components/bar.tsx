import { Link, NavLink } from 'react-router-dom';
import { BarMenu } from './bar-menu.tsx';
import { ButtonLink } from './button.tsx';
import { Mark } from './mark.tsx';

export interface BarLink {
  to: string;
  label: string;
}

export interface BarPerson {
  name: string;
  /** My builds, settings and so on; only pages that exist. */
  links: BarLink[];
  /** Address a plain form posts to. */
  signOutAction: string;
}

export interface BarProps {
  /** The pages of the site, in order. */
  links: BarLink[];
  /** Search is shown once there is a page for it. */
  search?: { action: string; value?: string };
  /** Where "Write up a day" leads; left out for people who cannot. */
  writeTo?: string;
  person: BarPerson | null;
  signInTo: string;
}

const narrowName = 'lettering-name text-[19px] max-[388px]:sr-only';

export function Bar({ links, search, writeTo, person, signInTo }: BarProps) {
  return (
    <header className="site-bar on-deep relative flex h-[60px] items-center gap-3 px-4 wide:gap-7 wide:px-8">
      <Link to="/" className="flex min-h-9 items-center gap-3 text-white no-underline">
        <Mark />
        <span className={narrowName}>Tallywright</span>
      </Link>
      <nav aria-label="Site" className="hidden gap-6 text-control wide:flex">
        {links.map((link) => (
          <NavLink
            key={link.to}
            to={link.to}
            className="border-b-[3px] border-transparent py-[19px] font-medium text-on-deep-soft no-underline hover:text-white aria-[current]:border-zinc aria-[current]:text-white"
          >
            {link.label}
          </NavLink>
        ))}
      </nav>
      <div className="ml-auto flex items-center gap-3.5">
        {search && <BarSearch {...search} id="bar-search" className="hidden wide:block" />}
        {writeTo && (
          <ButtonLink kind="zinc" to={writeTo}>
            Write up a day
          </ButtonLink>
        )}
        {!person && (
          <Link to={signInTo} className="hidden min-h-9 items-center font-semibold text-white no-underline hover:underline wide:flex">
            Sign in
          </Link>
        )}
        <BarMenu links={links} person={person} signInTo={signInTo} search={search && <BarSearch {...search} id="menu-search" />} />
      </div>
    </header>
  );
}

function BarSearch({ action, value, id, className = '' }: { action: string; value?: string; id: string; className?: string }) {
  return (
    <form role="search" action={action} className={className}>
      <label htmlFor={id} className="sr-only">
        Search builds and entries
      </label>
      <input
        id={id}
        name="q"
        type="search"
        defaultValue={value}
        placeholder="Search builds and entries"
        className="w-full rounded-edge border border-deep-edge bg-deep-field px-3 py-[7px] text-control text-white placeholder:text-on-deep-soft wide:w-[220px]"
      />
    </form>
  );
}
