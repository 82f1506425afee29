'use client';

import { useQuery, type QueryClient } from '@tanstack/react-query';
import type { PegView } from '@/lib/schemas/round';
import { queryKeys } from './query-keys';

type Changed = Readonly<Record<string, PegView>>;

const nothing: Changed = {};

/** Keeps pegs that have moved since the page was made. */
export function rememberPegs(
  client: QueryClient,
  personId: string,
  pegs: readonly PegView[],
): void {
  client.setQueryData<Changed>(queryKeys.progress(personId), (before) => ({
    ...before,
    ...Object.fromEntries(pegs.map((peg) => [peg.skill, peg])),
  }));
}

/** The pegs that the page was made with, each replaced by what an attempt has since made of it. */
export function usePegs(personId: string | null, pegs: readonly PegView[]): readonly PegView[] {
  const { data } = useQuery({
    queryKey: queryKeys.progress(personId),
    queryFn: () => nothing,
    enabled: false,
    initialData: nothing,
    staleTime: Infinity,
  });
  return pegs.map((peg) => data[peg.skill] ?? peg);
}
