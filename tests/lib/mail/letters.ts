import type { LetterContext } from '@/lib/mail/draft';
import type { Letter } from '@/lib/mail/letter';

const id = '7b0f6f0e-52c1-4c3b-9a33-0d6c5b3c1a10';
const linkId = '11111111-2222-4333-8444-555555555555';
const inClass = { className: 'Tuesday evening', timeZone: 'Europe/London' };

/** One letter of every kind, as the golden files have them. */
export const sampleLetters: readonly Letter[] = [
  { kind: 'invitation', className: 'Tuesday evening', inviterName: 'Wren Ashdown', linkId },
  { kind: 'set-password', linkId },
  { kind: 'reset-password', linkId },
  { kind: 'confirm-address', linkId },
  { kind: 'change-address', linkId },
  { kind: 'address-changed' },
  { kind: 'password-changed' },
  { kind: 'account-exists', className: 'Tuesday evening' },
  {
    kind: 'assignment-set',
    assignmentId: id,
    ...inClass,
    setBy: 'Wren Ashdown',
    opensAt: '2026-12-01T18:00:00Z',
    dueAt: '2026-12-08T18:30:00Z',
    note: 'Bring your trammel.\nThe <brass> one & the rule.',
    work: ['The trammel and the oval', 'Gearing a clock hand'],
  },
  {
    kind: 'due-tomorrow',
    assignmentId: id,
    ...inClass,
    dueAt: '2026-12-09T00:00:00Z',
    left: ['Pins for an oval', 'Gearing a clock hand'],
  },
  {
    kind: 'comment',
    className: 'Tuesday evening',
    authorName: 'Wren Ashdown',
    subject: 'Pins for an oval',
    body: 'Nearly. You took the whole axis where half of it was wanted; measure from the middle and it comes out.\n\nTry again on Tuesday?',
    path: '/today',
  },
  {
    kind: 'weekly-summary',
    classId: id,
    ...inClass,
    from: '2026-11-23',
    to: '2026-11-29',
    answered: [
      { name: 'Bo Lindqvist', answers: 7 },
      { name: 'Ida Marsh', answers: 1 },
    ],
    quiet: ['Tom Reed'],
    late: [{ name: 'Bo Lindqvist', answers: 2 }],
    slips: [
      { exercise: 'Pins for an oval', advice: 'That is the whole axis, not half.', times: 4 },
    ],
    due: [{ work: 'The pantograph', dueAt: '2026-12-01T18:30:00Z' }],
  },
];

/** What is known when the sample letters are written. */
export const sampleContext: LetterContext = {
  siteAddress: 'https://workshop.example',
  readerName: 'Ida Marsh',
  timeZone: 'Europe/London',
  writtenAt: new Date('2026-12-01T18:00:00Z'),
  link: { href: 'https://workshop.example/set-password/the-token', goodForMinutes: 30 },
  unsubscribeAddress: 'https://workshop.example/unsubscribe/a-token',
};
