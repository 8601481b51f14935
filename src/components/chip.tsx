import type { ReactNode } from 'react';

export type ChipKind = 'scribe' | 'zinc' | 'lead' | 'verd' | 'grey';

const kinds: Record<ChipKind, string> = {
  scribe: 'bg-scribe-wash text-scribe-text',
  zinc: 'bg-zinc-wash text-zinc-ink',
  lead: 'bg-lead-wash text-lead-text',
  verd: 'bg-verd-wash text-verd-text',
  grey: 'bg-grey-wash text-ink-soft',
};

export function Chip({ kind = 'scribe', children }: { kind?: ChipKind; children: ReactNode }) {
  return <span className={`inline-flex items-center gap-1.5 rounded-chip px-[9px] py-[3px] text-note font-semibold ${kinds[kind]}`}>{children}</span>;
}
