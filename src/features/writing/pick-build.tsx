import type { MyBuilds } from '#contracts/builds.ts';
import { buildKindWords } from '#contracts/words.ts';
import { plural } from '#domain/format.ts';
import { pictureData } from '#src/blocks/views.ts';
import { BuildRow } from '#src/components/build-row.tsx';
import { Chip } from '#src/components/chip.tsx';
import { SectionHeading } from '#src/components/section-heading.tsx';

/** Which build the day was spent on, newest work first. */
export function PickBuild({ builds }: { builds: MyBuilds['builds'] }) {
  return (
    <section aria-labelledby="which-build">
      <SectionHeading id="which-build">Which build</SectionHeading>
      {builds.map((build) => (
        <BuildRow
          key={build.slug} to={`/write?build=${build.slug}`} title={build.title} picture={build.picture ? pictureData(build.picture) : null}
          facts={[<Chip key="kind">{buildKindWords[build.kind].one}</Chip>, ...(build.mine ? [] : ['You are in the crew'])]} figures={[plural(build.days, 'day', 'days')]}
        />
      ))}
    </section>
  );
}
