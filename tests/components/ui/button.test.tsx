import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { Table } from '@/components/ui/table';

describe('a button', () => {
  it('never sends a form by chance', () => {
    render(<Button>Step</Button>);
    expect(screen.getByRole('button', { name: 'Step' })).toHaveAttribute('type', 'button');
  });
});

describe('a notice', () => {
  it('carries a sign beside its colour and speaks up when asked', () => {
    render(
      <Notice tone="wrong" title="Not saved" role="alert">
        Try again.
      </Notice>,
    );
    expect(screen.getByRole('alert')).toHaveTextContent('✕ Not savedTry again.');
  });
});

describe('a table', () => {
  it('scrolls in a named region that the keyboard reaches', () => {
    render(
      <Table caption="Who has done what">
        <tbody />
      </Table>,
    );
    const region = screen.getByRole('region', { name: 'Who has done what' });
    expect(region).toHaveAttribute('tabindex', '0');
    expect(screen.getByRole('table', { name: 'Who has done what' })).toBeVisible();
  });
});
