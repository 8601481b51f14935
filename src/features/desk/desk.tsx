import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { Failed } from '#src/components/failed.tsx';
import { Loading } from '#src/components/loading.tsx';
import { PageFrame } from '#src/components/page-frame.tsx';
import { deskQuery } from '#src/queries/entries.ts';
import { sessionQuery } from '#src/queries/session.ts';
import { DeskOpen, type DeskOpenProps } from './desk-open.tsx';
import { useDeskStart } from './desk-start.ts';
import { keptHere, type KeptAt } from './kept-here.ts';
import './desk.css';

export interface DeskProps {
  build: string;
  number: number;
}

/** Fetches what the desk needs, and what this browser kept of the entry. */
export function Desk({ build, number }: DeskProps) {
  const client = useQueryClient();
  const [opening, setOpening] = useState<{ count: number; said: string | null }>({ count: 0, said: null });
  const view = useQuery(deskQuery({ build, number }));
  const session = useQuery(sessionQuery());
  const handle = session.data?.viewer?.handle;
  if (view.isError && !view.data) {
    return (
      <PageFrame>
        <Failed title="The desk could not be fetched" kept={view.error.message} onRetry={() => void view.refetch()} />
      </PageFrame>
    );
  }
  if (!view.data || handle === undefined) return <DeskShape />;
  const reopen = async (said: string) => {
    await client.fetchQuery(deskQuery({ build, number }));
    setOpening(({ count }) => ({ count: count + 1, said }));
  };
  return <DeskOfPerson key={`${handle} ${opening.count}`} said={opening.said} handle={handle} guid={view.data.entry.guid} build={build} number={number} onReopen={reopen} />;
}

function DeskShape() {
  return (
    <PageFrame>
      <Loading label="Fetching the desk" shape="page" />
    </PageFrame>
  );
}

function DeskOfPerson({ handle, guid, build, number, said, onReopen }: KeptAt & Pick<DeskOpenProps, 'said' | 'onReopen'> & { guid: string }) {
  const { data: view } = useQuery(deskQuery({ build, number }));
  const at = useMemo(() => ({ handle, build, number }), [handle, build, number]);
  const kept = useMemo(() => keptHere({ handle, guid }), [handle, guid]);
  const start = useDeskStart(view, kept);
  if (!view || !start) return <DeskShape />;
  return <DeskOpen view={view} start={start} at={at} kept={kept} said={said} onReopen={onReopen} />;
}
