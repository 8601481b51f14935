import { Link } from 'react-router-dom';
import type { MyBuilds } from '#contracts/builds.ts';
import { SectionHeading } from '#src/components/section-heading.tsx';
import { formatDay } from '#domain/format.ts';

/** Write-ups left open, each with a way back to its desk. */
export function DraftsLeft({ builds }: { builds: MyBuilds['builds'] }) {
  const drafts = builds.flatMap((build) => build.drafts.map((draft) => ({ build, draft })));
  if (drafts.length === 0) return null;
  return (
    <section aria-labelledby="left-open">
      <SectionHeading id="left-open">Left open</SectionHeading>
      <ul className="border-t border-rule">
        {drafts.map(({ build, draft }) => {
          const title = draft.title.trim() || 'A day without a title yet';
          return (
            <li key={`${build.slug} ${draft.number}`} className="flex flex-wrap items-center justify-between gap-x-5 gap-y-1 border-b border-rule py-3">
              <div>
                <p className="font-semibold">{title}</p>
                <p className="text-small text-ink-soft">{build.title}, {formatDay(draft.day)}</p>
              </div>
              <Link to={`/builds/${build.slug}/edit/${draft.number}`} aria-label={`Go on with ${title}`} className="inline-flex min-h-11 items-center font-semibold">Go on</Link>
            </li>
          );
        })}
      </ul>
    </section>
  );
}
