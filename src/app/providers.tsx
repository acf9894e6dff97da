import { QueryClientProvider } from '@tanstack/react-query';
import { Tooltip } from 'radix-ui';
import type { ReactNode } from 'react';
import { AnnouncementsProvider } from '#client/ui/announcements.tsx';
import { queryClient } from './query-client.ts';

export function Providers({ children }: { children: ReactNode }) {
  return (
    <QueryClientProvider client={queryClient}>
      <Tooltip.Provider delayDuration={250} skipDelayDuration={400}>
        <AnnouncementsProvider>{children}</AnnouncementsProvider>
      </Tooltip.Provider>
    </QueryClientProvider>
  );
}
