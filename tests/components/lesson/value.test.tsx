import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { Given, Value } from '@/components/lesson/value';

describe('Value', () => {
  it('shows the figure of that name', () => {
    render(<Value of="tooth" values={{ tooth: { text: '6.3 mm' } }} />);
    expect(screen.getByText('6.3 mm')).toBeVisible();
  });

  it('fails the page rather than leave a hole in a sentence', () => {
    expect(() => Value({ of: 'toothless', values: {} })).toThrow(
      'Value: no figure called toothless',
    );
  });
});

describe('Given', () => {
  it('is said in the reader’s units', () => {
    const { rerender } = render(<Given metric="18 mm" inch="3/4 in" units="metric" />);
    expect(screen.getByText('18 mm')).toBeVisible();
    rerender(<Given metric="18 mm" inch="3/4 in" units="inch" />);
    expect(screen.getByText('3/4 in')).toBeVisible();
  });
});
