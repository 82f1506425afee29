import type { PegView } from '@/lib/schemas/round';

const share: Readonly<Record<PegView['state'], number>> = {
  open: 0,
  started: 0.5,
  lifting: 0.5,
  home: 1,
};

/**
 * How many of the last steps of a worked example are left to the learner: none for a newcomer, all
 * but the first once every peg of the lesson is home. Fading from the last step backwards helps
 * most (Renkl 2002), and a learner who can do it all is only held up by reading (Kalyuga 2003).
 * @example hiddenSteps([{ state: 'home' }, { state: 'open' }], 5) // 2
 */
export function hiddenSteps(pegs: readonly Pick<PegView, 'state'>[], steps: number): number {
  if (pegs.length === 0 || steps < 2) return 0;
  const home = pegs.reduce((sum, peg) => sum + share[peg.state], 0) / pegs.length;
  return Math.ceil(home * (steps - 1));
}
