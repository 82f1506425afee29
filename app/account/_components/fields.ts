import { passwordHint } from '@/app/_components/password-sentence';
import { timeZoneOptions, unitOptions } from '@/app/_components/time-zones';
import type { FormField } from '@/components/ui/action-form';
import type { Profile } from '@/lib/data/profile';

const paperOptions = [
  { value: 'a4', label: 'A4' },
  { value: 'a3', label: 'A3' },
  { value: 'letter', label: 'Letter' },
  { value: 'tabloid', label: 'Tabloid' },
] as const;

/** What people may change about themselves, as fields. */
export function profileFields(profile: Profile): readonly FormField[] {
  return [
    { name: 'name', label: 'Name', value: profile.name, autoComplete: 'name', required: true },
    {
      name: 'units',
      label: 'Units',
      value: profile.units,
      options: unitOptions,
      hint: 'Exercises open in these. An exercise you have begun in the other unit waits for you there.',
    },
    {
      name: 'paper',
      label: 'Paper',
      value: profile.paper,
      options: paperOptions,
      hint: 'What your printer takes.',
    },
    {
      name: 'timeZone',
      label: 'Time zone',
      value: profile.timeZone,
      options: timeZoneOptions(profile.timeZone),
      hint: 'Your days are counted in it, and dates are shown in it.',
    },
    {
      name: 'reducedMotion',
      label: 'Movement',
      value: profile.reducedMotion ? 'yes' : 'no',
      options: [
        { value: 'no', label: 'As my device has it' },
        { value: 'yes', label: 'Less: benches stand still until I turn them' },
      ],
    },
  ];
}

/** The password one has, and the one wanted. */
export const passwordFields: readonly FormField[] = [
  {
    name: 'currentPassword',
    label: 'The password you have now',
    type: 'password',
    autoComplete: 'current-password',
    required: true,
  },
  {
    name: 'newPassword',
    label: 'The new one',
    type: 'password',
    autoComplete: 'new-password',
    hint: passwordHint,
    required: true,
  },
];

/** A new address. */
export const addressFields: readonly FormField[] = [
  {
    name: 'email',
    label: 'New address',
    type: 'email',
    autoComplete: 'email',
    hint: 'A letter goes there; the change is made when you follow its link, within half an hour.',
    required: true,
  },
];
