import { createEmptyCard, fsrs, Rating, type Card, type Grade } from 'ts-fsrs';
import type { ClosedRound } from './peg';

/**
 * Spacing by FSRS-6 with its published weights and a wanted retention of 0.9; without its random
 * spread, and in whole days, so that the same history always gives the same due time and nothing
 * comes back on the day it was learnt.
 */
const scheduler = fsrs({ request_retention: 0.9, enable_fuzz: false, enable_short_term: false });

/**
 * When a skill is due again after these closed rounds, ISO 8601, or `null` before the first. A round
 * that was not right counts as forgotten; right with help, or not at the first try, as hard; right
 * alone at the first try as good. Nothing counts as easy: speed is not measured.
 */
export function dueAfter(rounds: readonly ClosedRound[]): string | null {
  const inOrder = [...rounds].sort((one, other) => at(one).getTime() - at(other).getTime());
  const [first] = inOrder;
  if (first === undefined) return null;
  const card = inOrder.reduce<Card>(
    (before, round) => scheduler.next(before, at(round), gradeOf(round)).card,
    createEmptyCard(at(first)),
  );
  return card.due.toISOString();
}

/** How a closed round is graded for spacing. */
export function gradeOf({ right, unaided, attempts = 1 }: ClosedRound): Grade {
  if (!right) return Rating.Again;
  return unaided && attempts === 1 ? Rating.Good : Rating.Hard;
}

function at({ closedAt }: ClosedRound): Date {
  const time = new Date(closedAt);
  if (Number.isNaN(time.getTime())) throw new RangeError(`dueAfter: ${closedAt} is not a time`);
  return time;
}
