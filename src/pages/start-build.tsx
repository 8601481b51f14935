import type { QueryClient } from '@tanstack/react-query';
import { Form, redirect, type ActionFunctionArgs } from 'react-router-dom';
import type { startBuild } from '#contracts/builds.ts';
import type { InputOf } from '#contracts/endpoint.ts';
import { AppError } from '#contracts/errors.ts';
import { ErrorSummary } from '#src/components/error-summary.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { PageHead } from '#src/components/page-head.tsx';
import { Panel } from '#src/components/panel.tsx';
import { SectionHeading } from '#src/components/section-heading.tsx';
import { SubmitButton } from '#src/components/submit-button.tsx';
import { NamingFields, ReckoningFields, ShowingFields } from '#src/features/builds/build-fields.tsx';
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
      <Form method="post" noValidate className="max-w-[760px]">
        <ErrorSummary errors={form.errors} attempt={form.attempt} />
        <div className="grid gap-6">
          <Panel><SectionHeading>What it is</SectionHeading><NamingFields form={form} /></Panel>
          <Panel><SectionHeading>How it is reckoned</SectionHeading><ReckoningFields form={form} /></Panel>
          <Panel><SectionHeading>Who sees it</SectionHeading><ShowingFields form={form} /></Panel>
          <div><SubmitButton pending={form.pending} pendingWord="Starting the build">Start the build</SubmitButton></div>
        </div>
      </Form>
    </PageFrame>
  );
}
