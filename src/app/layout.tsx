import { useSuspenseQuery } from '@tanstack/react-query';
import { Outlet, ScrollRestoration } from 'react-router-dom';
import { Bar } from '#src/components/bar.tsx';
import { SkipLink } from '#src/components/skip-link.tsx';
import { sessionQuery } from '#src/queries/session.ts';

const siteLinks = [{ to: '/builds', label: 'Builds' }];
const personLinks = [
  { to: '/my-builds', label: 'My builds' },
  { to: '/settings', label: 'Settings' },
];

/** What every page stands in: skip link, site bar, the page, the foot. */
export function Layout() {
  const { data: { viewer, demo } } = useSuspenseQuery(sessionQuery());
  return (
    <>
      <SkipLink />
      <Bar
        links={siteLinks}
        {...(viewer?.suspended ? {} : { writeTo: '/write' })}
        person={viewer ? { name: viewer.name, links: personLinks, signOutAction: '/sign-out' } : null}
        signInTo="/sign-in"
      />
      <Outlet />
      <SiteFoot demo={demo} />
      <ScrollRestoration />
    </>
  );
}

function SiteFoot({ demo }: { demo: boolean }) {
  return (
    <footer className="not-printed border-t border-rule">
      <div className="mx-auto flex w-full max-w-page flex-wrap gap-x-6 gap-y-2 px-[18px] py-6 text-sm text-ink-soft wide:px-8">
        <span>Tallywright. Write up the work. Know what it cost.</span>
        <a href="/feed.xml" className="-my-1 py-1">RSS</a>
        <a href="/feed.json" className="-my-1 py-1">JSON Feed</a>
        {demo && <span>This is the demo: its people and builds are made up.</span>}
      </div>
    </footer>
  );
}
