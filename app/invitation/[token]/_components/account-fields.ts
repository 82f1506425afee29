import { passwordHint } from '@/app/_components/password-sentence';
import type { FormField } from '@/components/ui/action-form';

/** What somebody new says of themselves. */
export function accountFields(name: string | null): readonly FormField[] {
  return [
    {
      name: 'name',
      label: 'Your name',
      value: name ?? '',
      autoComplete: 'name',
      hint: 'As your instructor and your class know you.',
      required: true,
    },
    {
      name: 'password',
      label: 'A password',
      type: 'password',
      autoComplete: 'new-password',
      hint: passwordHint,
      required: true,
    },
  ];
}
