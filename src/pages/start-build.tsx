import type { QueryClient } from '@tanstack/react-query';
import { Form, redirect, type ActionFunctionArgs } from 'react-router-dom';
import type { startBuild } from '#contracts/builds.ts';
import type { InputOf } from '#contracts/endpoint.ts';
import { AppError } from '#contracts/errors.ts';
import { ErrorSummary } from '#src/components/error-summary.tsx';
import { PageColumns } from '#src/components/page-columns.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { PageHead } from '#src/components/page-head.tsx';
import { Panel } from '#src/components/panel.tsx';
import { SectionHeading } from '#src/components/section-heading.tsx';
import { SubmitButton } from '#src/components/submit-button.tsx';
import { IdentityFields, NamingFields, ReckoningFields, ShowingFields } from '#src/features/builds/build-fields.tsx';
import { buildInput } from '#src/features/builds/build-form.ts';
import { formAction, useFormState } from '#src/lib/form-action.ts';
import { Head } from '#src/lib/head.tsx';
import { call } from '#src/lib/transport.ts';
import { sessionQuery } from '#src/queries/session.ts';

export function makeLoader(client: QueryClient) {
  return async () => {
    const { viewer } = await client.ensureQueryData(sessionQuery());
    if (!viewer) throw new AppError('sign-in-needed', 'Sign in first.');
    return null;
  };
}

export function makeAction(client: QueryClient) {
  return async ({ request }: ActionFunctionArgs) => formAction(request, async (form) => {
    const body = buildInput(form) as InputOf<typeof startBuild>['body'];
    const { slug } = await call<typeof startBuild>(client, 'POST', '/api/builds', { body: body.startedOn === '' ? { ...body, startedOn: undefined } : body });
    await client.invalidateQueries({ queryKey: ['builds'] });
    return redirect(`/builds/${slug}`);
  });
}

export function Component() {
  const form = useFormState();
  return (
    <PageFrame head={<PageHead title="Start a build" lettering="place" lede="Say what it is. Everything here but the currency can be changed later." />}>
      <Head title="Start a build" />
      <PageColumns aside={<WhatComesNext />}>
        <Form method="post" noValidate>
          <ErrorSummary errors={form.errors} attempt={form.attempt} />
          <div className="grid gap-6">
            <Panel><SectionHeading>What it is</SectionHeading><NamingFields form={form} /></Panel>
            <Panel><SectionHeading>Maker, model and numbers</SectionHeading><IdentityFields form={form} /></Panel>
          <Panel><SectionHeading>How it is reckoned</SectionHeading><ReckoningFields form={form} /></Panel>
            <Panel><SectionHeading>Who sees it</SectionHeading><ShowingFields form={form} /></Panel>
            <div><SubmitButton pending={form.pending} pendingWord="Starting the build">Start the build</SubmitButton></div>
          </div>
        </Form>
      </PageColumns>
    </PageFrame>
  );
}

const next = [
  ['Plan the stages', 'The parts of the job in order, with what you mean to spend on each. It can wait.'],
  ['Write up a day', 'What you did, a picture or two, and what it took: lines off the shelf, receipts, hours.'],
  ['Sign off', 'The day is priced from what you really paid, and stands for others to read and budget from.'],
] as const;

/** What a first-time restorer does after this page. */
function WhatComesNext() {
  return (
    <section>
      <SectionHeading>What comes next</SectionHeading>
      <ol className="list-none">
        {next.map(([title, words]) => <li key={title} className="border-b border-rule py-3"><b className="lettering-row block">{title}</b><span className="text-control text-ink-soft">{words}</span></li>)}
      </ol>
    </section>
  );
}
