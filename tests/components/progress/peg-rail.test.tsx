import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { PegList } from '@/components/progress/peg-list';
import { PegRail, type Peg } from '@/components/progress/peg-rail';
import { pegSummary, type PegState } from '@/components/progress/peg-words';

const peg = (state: PegState, name: string): Peg => ({ skill: `train.${name}`, name, state });
const pegs = [
  peg('home', 'ratio'),
  peg('home', 'direction'),
  peg('started', 'idler'),
  peg('open', 'compound'),
  peg('lifting', 'centres'),
];

/** The top edge of what stands highest in a peg's place, in the rail's pixels. */
function heightOf(state: PegState): number {
  const { container } = render(<PegRail pegs={[peg(state, 'one')]} />);
  const tops = [...container.querySelectorAll('[data-peg] rect')].map((rect) =>
    Number(rect.getAttribute('y')),
  );
  return Math.min(...tops);
}

describe('the peg rail', () => {
  it('is one picture with the summary and every skill said in words', () => {
    render(<PegRail pegs={pegs} />);
    expect(screen.getByRole('img')).toHaveAccessibleName(
      '2 of 5 skills home, one started, one lifting. ratio: peg home; direction: peg home; ' +
        'idler: peg started; compound: open hole; centres: peg lifting',
    );
  });

  it('draws one place for each skill, in the order given', () => {
    const { container } = render(<PegRail pegs={pegs} />);
    const states = [...container.querySelectorAll('[data-peg]')].map((place) =>
      place.getAttribute('data-peg'),
    );
    expect(states).toEqual(['home', 'home', 'started', 'open', 'lifting']);
  });

  it('tells the state by height alone: started proud, lifting half out, home flush', () => {
    expect(heightOf('started')).toBeLessThan(heightOf('lifting'));
    expect(heightOf('lifting')).toBeLessThan(heightOf('home'));
  });

  it('draws an open hole dashed and with nothing in it', () => {
    const { container } = render(<PegRail pegs={[peg('open', 'one')]} />);
    const shapes = container.querySelectorAll('[data-peg] > :not(title)');
    expect(shapes).toHaveLength(1);
    expect(shapes[0]).toHaveAttribute('stroke-dasharray');
  });

  it('ticks a peg that is home and gives an arrow to one that lifts', () => {
    const { container } = render(<PegRail pegs={[peg('home', 'one'), peg('lifting', 'two')]} />);
    expect(container.querySelectorAll('[data-peg=home] path')).toHaveLength(1);
    expect(container.querySelectorAll('[data-peg=lifting] path')).toHaveLength(1);
  });

  it('writes the summary beside the drawing when asked', () => {
    render(<PegRail pegs={pegs} words />);
    expect(screen.getByText('2 of 5 skills home, one started, one lifting')).toBeVisible();
  });
});

describe('a rail in words', () => {
  it('says only what there is', () => {
    expect(pegSummary(['open', 'open', 'open'])).toBe('0 of 3 skills home');
    expect(pegSummary(['home'])).toBe('1 of 1 skill home');
    expect(pegSummary(['lifting', 'lifting'])).toBe('0 of 2 skills home, two lifting');
    expect(pegSummary([])).toBe('no skills yet');
  });
});

describe('the list of pegs', () => {
  it('says of each skill how it stands, in words', () => {
    render(
      <PegList
        pegs={[
          { ...peg('started', 'Ratio of a train'), detail: 'Two right so far, one more to go.' },
          { ...peg('open', 'Direction'), detail: '' },
        ]}
      />,
    );
    expect(screen.getByText('Ratio of a train')).toBeVisible();
    expect(screen.getByText('Two right so far, one more to go.')).toBeVisible();
    expect(screen.getByText('open hole')).toBeVisible();
  });
});
