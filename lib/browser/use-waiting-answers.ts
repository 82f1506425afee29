'use client';

import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useCallback, useEffect } from 'react';
import { sendAttempt } from './exercises';
import { queryKeys } from './query-keys';
import {
  discardAnswer,
  listWaiting,
  sendWaiting,
  type Sent,
  type WaitingAnswer,
} from './waiting-answers';

/** The answers that wait on this device, seen by one person. */
export interface Waiting {
  readonly mine: readonly WaitingAnswer[];
  /** How many answers of other people wait here; only that they do is shown. */
  readonly others: number;
  /** Tries to deliver mine now. */
  readonly sendNow: () => Promise<readonly Sent[]>;
  readonly discard: (key: string) => Promise<void>;
  readonly refresh: () => Promise<void>;
}

/**
 * Watches the answers that wait on this device and delivers this person's own: when the page opens
 * and whenever the network comes back.
 * @param personId who is signed in, or null: then nothing is ever sent.
 */
export function useWaitingAnswers(
  personId: string | null,
  onSent?: (sent: readonly Sent[]) => void,
): Waiting {
  const client = useQueryClient();
  const { data = [] } = useQuery({
    queryKey: queryKeys.waiting(),
    queryFn: listWaiting,
    networkMode: 'always',
    staleTime: 0,
  });

  const refresh = useCallback(
    () => client.invalidateQueries({ queryKey: queryKeys.waiting() }),
    [client],
  );
  const sendNow = useCallback(async () => {
    if (personId === null) return [];
    const sent = await sendWaiting(personId, sendAttempt);
    if (sent.length > 0) {
      await refresh();
      onSent?.(sent);
    }
    return sent;
  }, [personId, refresh, onSent]);
  const discard = useCallback(
    async (key: string) => {
      await discardAnswer(key);
      await refresh();
    },
    [refresh],
  );

  useEffect(() => {
    const deliver = () => void sendNow();
    deliver();
    window.addEventListener('online', deliver);
    return () => window.removeEventListener('online', deliver);
  }, [sendNow]);

  return {
    mine: data.filter((answer) => answer.personId === personId),
    others: data.filter((answer) => answer.personId !== personId).length,
    sendNow,
    discard,
    refresh,
  };
}
