'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import type { RoundView } from '@/lib/schemas/round';
import { openRound, showSolution, takeHint } from './exercises';
import { queryKeys } from './query-keys';

/** Whose round of which exercise, in which units. */
export interface RoundOf {
  readonly personId: string | null;
  readonly exerciseId: string;
  readonly units: UnitSystem;
}

/** A round in the page, and what can be asked of the server about it. */
export interface RoundInPage {
  readonly round: RoundView | null;
  readonly busy: boolean;
  /** What the last request failed with, or null. */
  readonly error: unknown;
  /** Opens the round, or the next one with new numbers once this one is closed. */
  readonly open: () => void;
  readonly hint: () => void;
  readonly solution: () => void;
}

/**
 * The learner's round of an exercise: the one the page was made with, until a request brings
 * something newer. Nothing is opened unasked.
 */
export function useRound(of: RoundOf, initial: RoundView | null): RoundInPage {
  const { personId, exerciseId, units } = of;
  const client = useQueryClient();
  const queryKey = queryKeys.round(personId, exerciseId, units);
  const { data } = useQuery<RoundView | null>({
    queryKey,
    queryFn: () => openRound(exerciseId, units),
    enabled: false,
    initialData: initial,
    staleTime: Infinity,
    gcTime: Infinity,
  });
  const asking = useMutation({
    mutationFn: (ask: () => Promise<RoundView>) => ask(),
    onSuccess: (round) => client.setQueryData(queryKey, round),
  });
  const round = data ?? null;
  const about = (ask: (round: RoundView) => Promise<RoundView>) => () => {
    if (round !== null && !asking.isPending) asking.mutate(() => ask(round));
  };
  return {
    round,
    busy: asking.isPending,
    error: asking.error,
    open: () => {
      if (!asking.isPending) asking.mutate(() => openRound(exerciseId, units));
    },
    hint: about(({ roundId, hints }) => takeHint(exerciseId, roundId, hints.length + 1)),
    solution: about(({ roundId }) => showSolution(exerciseId, roundId)),
  };
}
