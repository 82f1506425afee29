import type { UnitSystem } from '@/lib/quantities/unit-system';
import type { AttemptRequest, AttemptReply, PegView, RoundView } from '@/lib/schemas/round';
import { fetchJson } from './fetch-json';

function exercisePath(exerciseId: string, last: string): string {
  return `/api/exercises/${encodeURIComponent(exerciseId)}/${last}`;
}

/** Opens the learner's round of an exercise, or gives the one that is open in these units. */
export function openRound(exerciseId: string, units?: UnitSystem): Promise<RoundView> {
  return fetchJson<RoundView>(exercisePath(exerciseId, 'round'), {
    body: units === undefined ? {} : { units },
  });
}

/** Records that a hint, counted from 1, was taken and gives the round with it. */
export function takeHint(exerciseId: string, roundId: string, hint: number): Promise<RoundView> {
  return fetchJson<RoundView>(exercisePath(exerciseId, 'hints'), { body: { roundId, hint } });
}

/** Shows the worked solution, which closes the round. */
export function showSolution(exerciseId: string, roundId: string): Promise<RoundView> {
  return fetchJson<RoundView>(exercisePath(exerciseId, 'solution'), { body: { roundId } });
}

/**
 * Sends an answer to be marked and kept.
 * @param idempotencyKey a UUID; sending again under the same key gives the same one attempt.
 */
export function sendAttempt(
  request: AttemptRequest,
  idempotencyKey: string,
): Promise<AttemptReply> {
  return fetchJson<AttemptReply>('/api/attempts', { body: request, idempotencyKey });
}

/** The pegs of whoever is signed in. */
export function fetchProgress(): Promise<{ pegs: readonly PegView[] }> {
  return fetchJson<{ pegs: readonly PegView[] }>('/api/progress');
}
