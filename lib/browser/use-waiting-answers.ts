'use client';

import { useQuery, useQueryClient, type QueryClient } from '@tanstack/react-query';
import { useCallback, useEffect } from 'react';
import type { AttemptReply, RoundView } from '@/lib/schemas/round';
import { sendAttempt } from './exercises';
import { rememberPegs } from './use-pegs';
import { queryKeys } from './query-keys';
import { listWaiting, sendWaiting, type Sent, type WaitingAnswer } from './waiting-answers';

const none: readonly WaitingAnswer[] = [];

/** The answers that wait on this device, whoever gave them. */
export function useWaitingAnswers(): readonly WaitingAnswer[] {
  const { data } = useQuery({
    queryKey: queryKeys.waiting(),
    queryFn: listWaiting,
    networkMode: 'always',
    staleTime: 0,
    retry: false,
  });
  return data ?? none;
}

/** Makes every view of the waiting answers look again. */
export function refreshWaiting(client: QueryClient): Promise<void> {
  return client.invalidateQueries({ queryKey: queryKeys.waiting() });
}

/**
 * Puts what came back for an attempt where the page's exercises and pegs read it: wherever its
 * round is shown, whichever units the reader has switched to since.
 */
export function rememberReply(client: QueryClient, personId: string, reply: AttemptReply): void {
  const { round } = reply;
  client.setQueriesData<RoundView | null>(
    { queryKey: queryKeys.rounds(personId, round.exerciseId) },
    (shown) => (shown?.roundId === round.roundId ? round : shown),
  );
  rememberPegs(client, personId, reply.pegs);
}

/**
 * Delivers this person's waiting answers: when the page opens and whenever the network comes back.
 * @param personId who is signed in, or null: then nothing is sent.
 * @returns a function that tries at once.
 */
export function useDelivery(personId: string | null): () => Promise<readonly Sent[]> {
  const client = useQueryClient();
  const deliver = useCallback(async () => {
    if (personId === null) return [];
    const sent = await sendWaiting(personId, sendAttempt);
    for (const one of sent) {
      if (one.outcome === 'marked') rememberReply(client, personId, one.reply);
    }
    if (sent.length > 0) await refreshWaiting(client);
    return sent;
  }, [client, personId]);

  useEffect(() => {
    // Where the browser keeps nothing (a private window), nothing waits either.
    const attempt = () => void deliver().catch(() => undefined);
    attempt();
    window.addEventListener('online', attempt);
    return () => window.removeEventListener('online', attempt);
  }, [deliver]);

  return deliver;
}
