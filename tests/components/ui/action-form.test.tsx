import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import { ActionForm, type FormField } from '@/components/ui/action-form';
import type { FormState } from '@/components/ui/form-state';

const fields: readonly FormField[] = [
  { name: 'name', label: 'Name' },
  { name: 'secretPassword', label: 'Password', type: 'password' },
  {
    name: 'units',
    label: 'Units',
    value: 'metric',
    options: [
      { value: 'metric', label: 'Millimetres' },
      { value: 'inch', label: 'Inches' },
    ],
  },
];

async function send(state: FormState) {
  const action = vi.fn<(state: FormState, data: FormData) => Promise<FormState>>();
  action.mockResolvedValue(state);
  const user = userEvent.setup();
  render(<ActionForm action={action} fields={fields} submit="Save" />);
  await user.type(screen.getByLabelText('Name'), 'Marit');
  await user.selectOptions(screen.getByLabelText('Units'), 'inch');
  await user.click(screen.getByRole('button', { name: 'Save' }));
  return action;
}

describe('a form over an action', () => {
  it('sends its fields', async () => {
    const action = await send({ outcome: 'done', message: 'Saved.' });
    const data = action.mock.calls[0]?.[1];
    expect(data?.get('name')).toBe('Marit');
    expect(data?.get('units')).toBe('inch');
    expect(await screen.findByText(/Saved\./)).toBeVisible();
  });

  it('keeps what was typed when refused, and takes the hand to what is wrong', async () => {
    await send({
      outcome: 'refused',
      message: 'Not saved yet.',
      errors: { name: 'Type the whole name.' },
      values: { name: 'Marit', units: 'inch' },
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('Not saved yet.');
    expect(screen.getByLabelText('Name')).toHaveValue('Marit');
    expect(screen.getByLabelText('Name')).toHaveAccessibleDescription('Type the whole name.');
    expect(screen.getByLabelText('Name')).toHaveFocus();
    expect(screen.getByLabelText('Units')).toHaveValue('inch');
    expect(screen.getByLabelText('Password')).toHaveValue('');
  });

  it('shows a link that is handed out once', async () => {
    await send({ outcome: 'done', message: 'Made.', link: 'https://x.example/set-password/abc' });
    expect(await screen.findByText('https://x.example/set-password/abc')).toBeVisible();
    expect(screen.getByRole('button', { name: 'Copy the link' })).toBeVisible();
  });
});
