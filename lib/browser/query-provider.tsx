'use client';

import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { isPassing } from './problem';

/** A client that asks again, twice, only after failures that pass. */
export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: 30_000,
        refetchOnWindowFocus: false,
        retry: (failures, error) => failures < 2 && isPassing(error),
      },
      mutations: { retry: false, networkMode: 'always' },
    },
  });
}

/** Gives everything below it the page's one query client. */
export function QueryProvider({ children }: { readonly children: ReactNode }) {
  const [client] = useState(createQueryClient);
  return <QueryClientProvider client={client}>{children}</QueryClientProvider>;
}
