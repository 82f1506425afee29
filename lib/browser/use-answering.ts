'use client';

import { useQueryClient, type QueryClient } from '@tanstack/react-query';
import { useRef, useState } from 'react';
import type { Counting, ExerciseResponse, RoundView } from '@/lib/schemas/round';
import { sendAttempt } from './exercises';
import { newKey } from './new-key';
import { isSignedOut, NetworkAway, sentenceFor } from './problem';
import { refreshWaiting, rememberReply } from './use-waiting-answers';
import { keepAnswer, type WaitingAnswer } from './waiting-answers';

/** What became of the answer that was last sent from this page. */
export type Answering =
  /** Nothing is on its way; `counting` says what the last one counted for. */
  | { readonly state: 'idle'; readonly counting?: readonly Counting[] }
  | { readonly state: 'sending' }
  /** Kept on this device: the network is away, or the session has ended. */
  | { readonly state: 'kept'; readonly because: 'network' | 'session' }
  | { readonly state: 'failed'; readonly sentence: string };

/**
 * Sends answers for a round. A second press while one is on its way does nothing, and trying again
 * with the same answer uses the same key, so that it counts once.
 */
export function useAnswering(
  personId: string | null,
  round: RoundView,
): readonly [Answering, (response: ExerciseResponse) => Promise<void>] {
  const client = useQueryClient();
  const [answering, setAnswering] = useState<Answering>({ state: 'idle' });
  const sending = useRef(false);
  const lastKey = useRef<{ readonly body: string; readonly key: string } | null>(null);

  const send = async (response: ExerciseResponse) => {
    if (personId === null || sending.current) return;
    sending.current = true;
    setAnswering({ state: 'sending' });
    const body = JSON.stringify([round.roundId, response]);
    const key = lastKey.current?.body === body ? lastKey.current.key : newKey();
    lastKey.current = { body, key };
    const givenAt = new Date().toISOString();
    const request = { roundId: round.roundId, response, answeredAt: givenAt };
    try {
      const reply = await sendAttempt(request, key);
      rememberReply(client, personId, reply);
      lastKey.current = null;
      setAnswering({ state: 'idle', counting: reply.counting });
    } catch (error) {
      const { exerciseId, title } = round;
      const answer = { key, personId, exerciseId, title, request, givenAt };
      setAnswering(await afterFailure(client, error, answer));
    } finally {
      sending.current = false;
    }
  };
  return [answering, send];
}

async function afterFailure(
  client: QueryClient,
  error: unknown,
  answer: WaitingAnswer,
): Promise<Answering> {
  if (!(error instanceof NetworkAway) && !isSignedOut(error)) {
    return { state: 'failed', sentence: sentenceFor(error) };
  }
  try {
    await keepAnswer(answer);
  } catch {
    return { state: 'failed', sentence: sentenceFor(error) };
  }
  await refreshWaiting(client);
  return { state: 'kept', because: isSignedOut(error) ? 'session' : 'network' };
}
