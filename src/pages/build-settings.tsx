import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { Form, Link, redirect, useParams, type ActionFunctionArgs, type LoaderFunctionArgs } from 'react-router-dom';
import type { archiveBuild, BuildSettings, changeBuild } from '#contracts/builds.ts';
import { ErrorSummary } from '#src/components/error-summary.tsx';
import { Button } from '#src/components/button.tsx';
import { Kicker } from '#src/components/kicker.tsx';
import { PageColumns } from '#src/components/page-columns.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { PageHead } from '#src/components/page-head.tsx';
import { Panel } from '#src/components/panel.tsx';
import { SectionHeading } from '#src/components/section-heading.tsx';
import { SubmitButton } from '#src/components/submit-button.tsx';
import { IdentityFields, NamingFields, ReckoningFields, ShowingFields, StandsFields } from '#src/features/builds/build-fields.tsx';
import { buildInput } from '#src/features/builds/build-form.ts';
import { VersionField } from '#src/features/builds/version-field.tsx';
import { formAction, textOf, useFormState, versionOf } from '#src/lib/form-action.ts';
import { Head } from '#src/lib/head.tsx';
import { call } from '#src/lib/transport.ts';
import { buildSettingsQuery } from '#src/queries/builds.ts';

export function makeLoader(client: QueryClient) {
  return async ({ params }: LoaderFunctionArgs) => {
    await client.fetchQuery(buildSettingsQuery(params['build'] ?? ''));
    return null;
  };
}

export function makeAction(client: QueryClient) {
  return async ({ request, params }: ActionFunctionArgs) => formAction(request, async (form) => {
    const build = params['build'] ?? '';
    if (form.has('archived')) {
      await call<typeof archiveBuild>(client, 'POST', '/api/builds/:build/archive', { params: { build }, body: { archived: textOf(form, 'archived') === 'yes' } });
      await client.invalidateQueries();
      return redirect(`/builds/${build}/settings`);
    }
    const { slug } = await call<typeof changeBuild>(client, 'PATCH', '/api/builds/:build/settings', { params: { build }, body: { ...buildInput(form), version: Number(versionOf(form)) } });
    // what this page shows stands at the old address, if the build was renamed: nothing is asked for there again
    await client.invalidateQueries({ refetchType: 'none' });
    return redirect(`/builds/${slug}`);
  });
}

export function Component() {
  const { build = '' } = useParams();
  const { data } = useSuspenseQuery(buildSettingsQuery(build));
  const form = useFormState();
  return (
    <PageFrame head={<PageHead kicker={<Kicker lead={{ label: data.title, to: `/builds/${data.slug}` }} />} title="Settings of the build" lettering="place" />}>
      <Head title={`Settings, ${data.title}`} />
      <PageColumns aside={<><BuildPlaces build={data} /><PutAway build={data} /></>}>
        <Form method="post" noValidate>
          <ErrorSummary errors={form.errors} attempt={form.attempt} />
          <VersionField form={form} version={String(data.version)} />
          <div className="grid gap-6">
            <Panel><SectionHeading>What it is</SectionHeading><NamingFields form={form} build={data} /></Panel>
            <Panel><SectionHeading>Where it stands</SectionHeading><StandsFields form={form} build={data} /></Panel>
            <Panel><SectionHeading>Maker and numbers</SectionHeading><IdentityFields form={form} build={data} /></Panel>
            <Panel><SectionHeading>How it is reckoned</SectionHeading><ReckoningFields form={form} build={data} /></Panel>
            <Panel><SectionHeading>Who sees it</SectionHeading><ShowingFields form={form} build={data} /></Panel>
            <div><SubmitButton pending={form.pending} pendingWord="Keeping the settings">Keep the settings</SubmitButton></div>
          </div>
        </Form>
      </PageColumns>
    </PageFrame>
  );
}

/** The other places where a build is looked after. */
function BuildPlaces({ build }: { build: BuildSettings }) {
  const places = [
    { to: `/builds/${build.slug}`, label: 'The page readers see' }, { to: `/builds/${build.slug}/plan`, label: 'Plan the stages' }, { to: `/write?build=${build.slug}`, label: 'Write up a day' },
  ];
  return (
    <nav aria-label="This build">
      <SectionHeading>This build</SectionHeading>
      <ul>{places.map((place) => <li key={place.to} className="border-b border-rule px-3 py-[11px] text-control"><Link to={place.to}>{place.label}</Link></li>)}</ul>
      <p className="mt-3 text-small text-ink-soft">A new name gives the build a new address. {build.visibility === 'public' ? 'The old one leads to it, so links that people kept go on working.' : 'The old one leads to it for you and the crew, and for nobody else.'}</p>
    </nav>
  );
}

function PutAway({ build }: { build: BuildSettings }) {
  return (
    <Form method="post" className="mt-10">
      <SectionHeading>{build.archived ? 'Bring it back out' : 'Put it away'}</SectionHeading>
      <p className="max-w-reading text-control text-ink-soft">
        {build.archived ? 'It is out of the lists of builds. Its pages can still be read by their addresses.' : 'It leaves the lists of builds. Its pages stay where they are, and you can bring it back out.'}
      </p>
      <input type="hidden" name="archived" value={build.archived ? 'no' : 'yes'} />
      <div className="mt-4"><Button type="submit" kind="quiet">{build.archived ? 'Bring it back out' : 'Put the build away'}</Button></div>
    </Form>
  );
}
