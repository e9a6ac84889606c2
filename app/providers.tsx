'use client';

import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { type ReactNode, useState } from 'react';
import { AnnouncementsProvider } from '@/components/ui/announcements';

const makeQueryClient = () =>
  new QueryClient({
    defaultOptions: { queries: { staleTime: 20_000, retry: 1, refetchOnWindowFocus: true } },
  });

/** One cache for the life of the page in the browser; on the server one for each request. */
export function Providers({ children }: Readonly<{ children: ReactNode }>) {
  const [queryClient] = useState(makeQueryClient);
  return (
    <QueryClientProvider client={queryClient}>
      <AnnouncementsProvider>{children}</AnnouncementsProvider>
    </QueryClientProvider>
  );
}
