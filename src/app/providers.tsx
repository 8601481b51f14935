import { QueryClientProvider, type QueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { SiteContext } from '#src/lib/site.ts';

/** What every page stands in. */
export function Providers({ client, publicUrl, children }: { client: QueryClient; publicUrl: string; children: ReactNode }) {
  return (
    <QueryClientProvider client={client}>
      <SiteContext value={publicUrl}>{children}</SiteContext>
    </QueryClientProvider>
  );
}
