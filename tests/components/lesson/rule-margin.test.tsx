import { act, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { readerPlace } from '@/components/lesson/reader-place';
import { RuleMargin } from '@/components/lesson/rule-margin';

const tops = [
  { id: 'make', top: 100 },
  { id: 'try', top: 500 },
  { id: 'card', top: 900 },
];

describe('readerPlace', () => {
  it('stands at the first mark before the first part begins', () => {
    expect(readerPlace(tops, 20, 1200)).toEqual({ index: 0, along: 0 });
  });

  it('moves evenly between two marks, however long the part between them', () => {
    expect(readerPlace(tops, 300, 1200)).toEqual({ index: 0, along: 0.5 / 3 });
    expect(readerPlace(tops, 500, 1200)).toEqual({ index: 1, along: 1 / 3 });
  });

  it('reaches the end of the rule at the end of the page, and no further', () => {
    expect(readerPlace(tops, 1200, 1200)).toEqual({ index: 2, along: 1 });
    expect(readerPlace(tops, 5000, 1200).along).toBe(1);
  });

  it('bears a page without parts', () => {
    expect(readerPlace([], 300, 1200)).toEqual({ index: 0, along: 0 });
  });
});

describe('RuleMargin', () => {
  afterEach(() => vi.restoreAllMocks());

  it('links every part by its label and marks the one being read', () => {
    vi.spyOn(window, 'requestAnimationFrame').mockImplementation((callback) => {
      callback(0);
      return 0;
    });
    act(() => {
      render(
        <>
          <RuleMargin
            sections={[
              { id: 'make', label: 'Start' },
              { id: 'try', label: 'Try it' },
            ]}
          />
          <section id="make" />
          <section id="try" />
        </>,
      );
    });
    const links = screen.getAllByRole('link');
    expect(links.map((link) => [link.textContent, link.getAttribute('href')])).toEqual([
      ['Start', '#make'],
      ['Try it', '#try'],
    ]);
    expect(links.filter((link) => link.getAttribute('aria-current') === 'location')).toHaveLength(
      1,
    );
  });
});
