import type { PegView } from '@/lib/schemas/round';

/** How far a peg is in: an open hole, a peg started, a peg home, or a peg lifting (due again). */
export type PegState = PegView['state'];

/** The words for a single peg of each state, as they are said on the screen. */
export const pegWords: Readonly<Record<PegState, string>> = {
  open: 'open hole',
  started: 'peg started',
  home: 'peg home',
  lifting: 'peg lifting',
};

const NUMBERS = ['none', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine'];

/**
 * Says a rail of pegs in one line.
 *
 * @example pegSummary(['home', 'home', 'started', 'open', 'lifting']) // '2 of 5 skills home, one started, one lifting'
 */
export function pegSummary(states: readonly PegState[]): string {
  const count = (state: PegState) => states.filter((one) => one === state).length;
  const total = states.length;
  if (total === 0) return 'no skills yet';
  const said = [`${count('home')} of ${total} ${total === 1 ? 'skill' : 'skills'} home`];
  for (const state of ['started', 'lifting'] as const) {
    const n = count(state);
    if (n > 0) said.push(`${NUMBERS[n] ?? n} ${state}`);
  }
  return said.join(', ');
}
