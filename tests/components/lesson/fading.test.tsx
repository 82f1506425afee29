import { describe, expect, it } from 'vitest';
import { hiddenSteps } from '@/components/lesson/fading';

const pegs = (...states: ('open' | 'started' | 'home' | 'lifting')[]) =>
  states.map((state) => ({ state }));

describe('hiddenSteps', () => {
  it('shows a newcomer, and anybody not signed in, every step', () => {
    expect(hiddenSteps(pegs('open', 'open', 'open'), 6)).toBe(0);
    expect(hiddenSteps([], 6)).toBe(0);
  });

  it('hides the last step as soon as one peg is started', () => {
    expect(hiddenSteps(pegs('started', 'open', 'open', 'open', 'open'), 6)).toBe(1);
  });

  it('leaves all but the first step to somebody who has every peg home', () => {
    expect(hiddenSteps(pegs('home', 'home'), 6)).toBe(5);
  });

  it('shows more again once a peg lifts', () => {
    const home = hiddenSteps(pegs('home', 'home', 'home'), 6);
    expect(hiddenSteps(pegs('home', 'lifting', 'lifting'), 6)).toBeLessThan(home);
  });

  it('never hides a single step', () => {
    expect(hiddenSteps(pegs('home'), 1)).toBe(0);
  });
});
