import { SectionHeading } from '#src/components/section-heading.tsx';

const people = [
  { address: 'restorer@demo.example', does: 'owns the builds' },
  { address: 'crew@demo.example', does: 'helps on one of them' },
  { address: 'reader@demo.example', does: 'a member with no build' },
  { address: 'moderator@demo.example', does: 'works the queue' },
  { address: 'administrator@demo.example', does: 'gives and takes roles' },
];

/** The made-up people of the demo; their one password was printed where the site was started. */
export function DemoAddresses() {
  return (
    <section aria-labelledby="demo-people">
      <SectionHeading id="demo-people">People of the demo</SectionHeading>
      <p className="mb-3 text-control text-ink-soft">All five have one password. It was printed where the site was started, unless DEMO_PASSWORD set it.</p>
      <dl className="divide-y divide-rule border-y border-rule text-control">
        {people.map(({ address, does }) => (
          <div key={address} className="py-2">
            <dt className="font-semibold">{address}</dt>
            <dd className="text-small text-ink-soft">{does}</dd>
          </div>
        ))}
      </dl>
    </section>
  );
}
