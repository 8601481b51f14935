import type { ReactNode } from 'react';
import { NavLink } from 'react-router-dom';
import type { BarLink, BarPerson } from './bar.tsx';
import { Face } from './face.tsx';
import { Menu } from './menu.tsx';

interface BarMenuProps {
  links: BarLink[];
  person: BarPerson | null;
  signInTo: string;
  search?: ReactNode;
}

const rowClass = 'block px-3 py-2 text-control font-medium text-ink no-underline hover:bg-hover aria-[current]:font-bold';

/** The person's menu on a wide screen; on a phone everything the bar has no room for. */
export function BarMenu({ links, person, signInTo, search }: BarMenuProps) {
  const theirs = person && (
    <>
      <p className="px-3 pb-1 pt-2 text-note text-ink-soft">Signed in as {person.name}</p>
      <MenuLinks links={person.links} />
      <form method="post" action={person.signOutAction}>
        <button type="submit" className="w-full px-3 py-2 text-left text-control font-medium hover:bg-hover">
          Sign out
        </button>
      </form>
    </>
  );
  return (
    <>
      {person && (
        <Menu label={`Menu of ${person.name}`} face={<Face name={person.name} />} className="hidden wide:block">
          {theirs}
        </Menu>
      )}
      <Menu label="Menu" face={<MenuStrokes />} className="wide:hidden">
        {search && <div className="bg-scribe-deep p-2">{search}</div>}
        <MenuLinks links={links} />
        <div className="mt-1 border-t border-rule pt-1">{theirs ?? <MenuLinks links={[{ to: signInTo, label: 'Sign in' }]} />}</div>
      </Menu>
    </>
  );
}

function MenuLinks({ links }: { links: BarLink[] }) {
  return links.map((link) => (
    <NavLink key={link.to} to={link.to} className={rowClass}>
      {link.label}
    </NavLink>
  ));
}

function MenuStrokes() {
  return (
    <svg viewBox="0 0 22 16" width="22" height="16" aria-hidden="true" focusable="false">
      <path d="M0 1.5h22M0 8h22M0 14.5h22" stroke="currentColor" strokeWidth="2" />
    </svg>
  );
}
