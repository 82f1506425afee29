import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { SelectField, TextField } from '@/components/ui/field';

describe('a field', () => {
  it('ties its label, its hint and its error to the control', () => {
    render(
      <TextField
        label="E-mail"
        name="email"
        hint="The one you were invited with."
        error="That is not an address; one looks like you@example.org."
      />,
    );
    const field = screen.getByLabelText('E-mail');
    expect(field).toBeInvalid();
    expect(field).toHaveAccessibleDescription(
      'The one you were invited with. That is not an address; one looks like you@example.org.',
    );
  });

  it('is valid and undescribed when there is nothing to say', () => {
    render(<TextField label="Name" name="name" defaultValue="Marit" />);
    const field = screen.getByLabelText('Name');
    expect(field).toBeValid();
    expect(field).not.toHaveAttribute('aria-describedby');
    expect(field).toHaveValue('Marit');
  });

  it('offers its options', () => {
    render(
      <SelectField label="Units" name="units" defaultValue="inch">
        <option value="metric">Millimetres</option>
        <option value="inch">Inches</option>
      </SelectField>,
    );
    expect(screen.getByLabelText('Units')).toHaveDisplayValue('Inches');
  });
});
