import { describe, expect, it } from 'vitest';
import { readForm } from '@/app/_components/read-form';
import { assignmentLists, assignmentSchema } from '@/lib/schemas/assignment';
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
});

const work = {
  lesson: ['pantograph', 'trammel-and-oval'],
  exercise: [],
  for: 'everybody',
  learner: [],
  opensOn: '',
  opensTime: '',
  dueOn: '2026-12-08',
  dueTime: '18:30',
  attemptsAllowed: '',
  counting: 'best',
  lateWork: 'marked',
  note: '',
  tell: ['yes'],
  version: '0',
} as const;

function workForm(changes: Readonly<Record<string, string | readonly string[]>> = {}): FormData {
  const data = new FormData();
  for (const [name, value] of Object.entries({ ...work, ...changes })) {
    for (const one of [value].flat()) data.append(name, one);
  }
  return data;
}

describe('reading the form of work to be set', () => {
  it('takes what is chosen several times as lists, and gives it back as text', () => {
    const reading = readForm(workForm(), assignmentSchema, assignmentLists);
    expect(reading).toMatchObject({
      ok: true,
      data: { lessons: ['pantograph', 'trammel-and-oval'], exercises: [], learners: null },
      values: { lesson: 'pantograph trammel-and-oval', exercise: '', tell: 'yes' },
    });
    const limited = { attemptsAllowed: ' 3 ', tell: [], dueTime: '' };
    expect(readForm(workForm(limited), assignmentSchema, assignmentLists)).toMatchObject({
      data: { attemptsAllowed: 3, tell: false, dueTime: '' },
      values: { tell: '' },
    });
  });

  it.each([
    ['a lesson that is a path', 'lesson', { lesson: '../x' }],
    ['a day that does not exist', 'dueOn', { dueOn: '2026-02-30' }],
    ['an hour that does not exist', 'dueTime', { dueTime: '25:00' }],
    ['no attempt at all', 'attemptsAllowed', { attemptsAllowed: '0' }],
    ['a hundred and one attempts', 'attemptsAllowed', { attemptsAllowed: '101' }],
    ['half an attempt', 'attemptsAllowed', { attemptsAllowed: '1.5' }],
    ['fewer than no attempts', 'attemptsAllowed', { attemptsAllowed: '-1' }],
    ['a learner who is not an id', 'learner', { learner: 'everybody' }],
    ['a note of a book’s length', 'note', { note: 'x'.repeat(2001) }],
  ])('refuses %s and keeps all that was typed', (_, field, changes) => {
    const reading = readForm(workForm(changes), assignmentSchema, assignmentLists);
    expect(reading.ok).toBe(false);
    if (reading.ok) return;
    expect(Object.keys(reading.state.errors ?? {})).toEqual([field]);
    expect(reading.state.values).toMatchObject({ counting: 'best', ...changes });
  });
});
