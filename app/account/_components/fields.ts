import { timeZoneOptions, unitOptions } from '@/app/_components/time-zones';
import type { FormField } from '@/components/ui/action-form';

interface Profile {
  readonly name: string;
  readonly timeZone: string;
  readonly units: string;
}

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
      name: 'timeZone',
      label: 'Time zone',
      value: profile.timeZone,
      options: timeZoneOptions(profile.timeZone),
      hint: 'Your days are counted in it, and dates are shown in it.',
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
    hint: 'Ten characters at least. Three or four words in a row do well.',
    required: true,
  },
];
