import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { Form, redirect, useParams, type ActionFunctionArgs, type LoaderFunctionArgs } from 'react-router-dom';
import type { changeStages } from '#contracts/builds.ts';
import { AppError } from '#contracts/errors.ts';
import { ErrorSummary } from '#src/components/error-summary.tsx';
import { Kicker } from '#src/components/kicker.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { PageHead } from '#src/components/page-head.tsx';
import { SubmitButton } from '#src/components/submit-button.tsx';
import { StageRows } from '#src/features/builds/stage-rows.tsx';
import { stageInputs } from '#src/features/builds/stage-form.ts';
import { VersionField } from '#src/features/builds/version-field.tsx';
import { formAction, useFormState, versionOf } from '#src/lib/form-action.ts';
import { Head } from '#src/lib/head.tsx';
import { call } from '#src/lib/transport.ts';
import { stagesQuery } from '#src/queries/builds.ts';
import { buildQuery } from '#src/queries/reading.ts';

export function makeLoader(client: QueryClient) {
  return async ({ params }: LoaderFunctionArgs) => {
    const build = params['build'] ?? '';
    const [, page] = await Promise.all([client.fetchQuery(stagesQuery(build)), client.ensureQueryData(buildQuery(build, 1))]);
    if ('may' in page && !page.may.settle) throw new AppError('not-allowed', 'Only the restorer plans the stages.');
    return null;
  };
}

export function makeAction(client: QueryClient) {
  return async ({ request, params }: ActionFunctionArgs) => formAction(request, async (form) => {
    const build = params['build'] ?? '';
    await call<typeof changeStages>(client, 'PUT', '/api/builds/:build/stages', { params: { build }, body: { stages: stageInputs(form), version: versionOf(form) } });
    await client.invalidateQueries({ queryKey: ['build', build] });
    return redirect(`/builds/${build}`);
  });
}

/** Stages in order, with what is planned for each. */
export function Component() {
  const { build = '' } = useParams();
  const { data } = useSuspenseQuery(stagesQuery(build));
  const { data: page } = useSuspenseQuery(buildQuery(build, 1));
  const form = useFormState();
  return (
    <PageFrame head={
      <PageHead
        kicker={<Kicker lead={{ label: 'movedTo' in page ? build : page.title, to: `/builds/${build}` }} />}
        title="Plan the stages"
        lettering="place"
        lede="The parts of the build in order, and what you mean to spend on each. Leave blank what you do not know yet."
      />
    }>
      <Head title="Plan the stages" />
      <Form method="post" noValidate>
        <ErrorSummary errors={form.errors} attempt={form.attempt} />
        <VersionField form={form} version={data.version} />
        <StageRows stages={data.stages} currency={data.currency} form={form} />
        <div className="mt-6"><SubmitButton pending={form.pending} pendingWord="Keeping the plan">Keep the plan</SubmitButton></div>
      </Form>
    </PageFrame>
  );
}
