import { describe, expect, it } from 'vitest';
import { readForm } from '@/app/_components/read-form';
import { newAssignmentSchema } from '@/lib/schemas/class';
import { newPersonSchema, passwordChangeSchema, profileSchema } from '@/lib/schemas/person';

function form(fields: Readonly<Record<string, string>>): FormData {
  const data = new FormData();
  for (const [name, value] of Object.entries(fields)) data.set(name, value);
  return data;
}

const person = {
  name: ' Marit Vik ',
  email: 'Marit@Example.org',
  isAdministrator: 'no',
};

describe('reading a form', () => {
  it('gives what the schema makes of it and drops the names that React adds', () => {
    const reading = readForm(form({ ...person, $ACTION_ID_abc: '' }), newPersonSchema);
    expect(reading).toMatchObject({
      ok: true,
      data: { name: 'Marit Vik', email: 'marit@example.org', isAdministrator: false },
    });
  });

  it('says what is wrong field by field and gives back what was typed', () => {
    const reading = readForm(form({ ...person, email: 'marit' }), newPersonSchema);
    expect(reading.ok).toBe(false);
    if (reading.ok) return;
    expect(reading.state.outcome).toBe('refused');
    expect(reading.state.errors).toEqual({
      email: 'That is not an address; one looks like you@example.org.',
    });
    expect(reading.state.values).toMatchObject({ name: ' Marit Vik ', email: 'marit' });
  });

  it('refuses a field that nobody asked for', () => {
    const sent = form({
      name: 'M',
      timeZone: 'Europe/Oslo',
      units: 'inch',
      isAdministrator: 'yes',
    });
    expect(readForm(sent, profileSchema).ok).toBe(false);
  });

  it('never gives a secret back', () => {
    const reading = readForm(
      form({ currentPassword: 'old one', newPassword: '' }),
      passwordChangeSchema,
    );
    expect(JSON.stringify(reading)).not.toContain('old one');
  });

  it.each([
    [
      'a lesson by another name',
      { lessonId: '../x', dueOn: '2026-12-08', dueTime: '18:30', note: '' },
    ],
    [
      'a day that does not exist',
      { lessonId: 'pantograph', dueOn: '2026-02-30', dueTime: '18:30', note: '' },
    ],
    [
      'an hour that does not exist',
      { lessonId: 'pantograph', dueOn: '2026-12-08', dueTime: '25:00', note: '' },
    ],
  ])('refuses %s', (_, fields) => {
    expect(readForm(form(fields), newAssignmentSchema).ok).toBe(false);
  });

  it('takes a lesson with a day and a time', () => {
    const fields = { lessonId: 'pantograph', dueOn: '2026-12-08', dueTime: '18:30', note: '' };
    expect(readForm(form(fields), newAssignmentSchema)).toMatchObject({ ok: true, data: fields });
  });
});
