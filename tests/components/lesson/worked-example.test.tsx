import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { WorkedExample, type WorkedExampleView } from '@/components/lesson/worked-example';

const worked: WorkedExampleView = {
  question: 'Which pins does the porthole need?',
  givens: [{ symbol: 'ℓ', label: 'Length', value: '540', unit: 'mm' }],
  steps: [
    { text: 'Half of the length', value: '270 mm' },
    {
      text: 'Half of the width',
      value: '210 mm',
      result: { value: 210, field: { dimension: 'length', unit: 'mm' } },
    },
    { text: 'Pins apart', value: '60 mm' },
  ],
  check: 'Run the pencil to both ends.',
};

describe('WorkedExample', () => {
  it('shows a newcomer everything', () => {
    render(<WorkedExample worked={worked} hidden={0} />);
    for (const step of worked.steps) expect(screen.getByText(step.value)).toBeVisible();
    expect(screen.getByText('Run the pencil to both ends.')).toBeVisible();
    expect(screen.queryByRole('button')).toBeNull();
  });

  it('leaves the last steps to the learner and shows them one by one', async () => {
    const user = userEvent.setup();
    render(<WorkedExample worked={worked} hidden={2} />);
    expect(screen.getByText('270 mm')).toBeVisible();
    expect(screen.queryByText('210 mm')).toBeNull();
    await user.type(screen.getByRole('textbox', { name: 'Yours first' }), '200');
    await user.click(screen.getByRole('button', { name: 'Compare' }));
    expect(screen.getByText('210 mm')).toBeVisible();
    expect(screen.getByText(/^you wrote: 200/)).toHaveTextContent('✕ that is not the same');
    expect(screen.queryByText('60 mm')).toBeNull();
    await user.click(screen.getByRole('button', { name: 'Show this step' }));
    expect(screen.getByText('60 mm')).toBeVisible();
    expect(screen.getByText('Run the pencil to both ends.')).toBeVisible();
  });

  it.each([
    ['21 cm', '✓ that agrees'],
    ['209,5 mm', '✓ that agrees'],
    ['8 17/64 in', '✓ that agrees'],
    ['8 1/4', 'which could not be read'],
  ])('reads %s as an answer is read', async (own, said) => {
    const user = userEvent.setup();
    render(<WorkedExample worked={worked} hidden={2} />);
    await user.type(screen.getByRole('textbox', { name: 'Yours first' }), own);
    await user.click(screen.getByRole('button', { name: 'Compare' }));
    expect(screen.getByText(/^you wrote:/)).toHaveTextContent(said);
  });
});
