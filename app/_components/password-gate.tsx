import type { ReactNode } from 'react';
import { ActionForm } from '@/components/ui/action-form';
import { hasGivenPassword } from '@/lib/data/password-given';
import type { Viewer } from '@/lib/policy/viewer';
import { givePasswordAgain } from './password-gate-actions';

interface PasswordGateProps {
  readonly viewer: Viewer;
  /** Names the gate among several of a page. */
  readonly name: string;
  /** What lies behind it, as the end of "Your password, before you can …". */
  readonly purpose: string;
  readonly children: ReactNode;
}

/** Shows what is sensitive to whoever has given their password within the last quarter of an hour. */
export async function PasswordGate({ viewer, name, purpose, children }: PasswordGateProps) {
  if (await hasGivenPassword(viewer)) return children;
  return (
    <ActionForm
      action={givePasswordAgain}
      prefix={`${name}-gate-`}
      submit="Go on"
      variant="secondary"
      fields={[
        {
          name: 'password',
          label: 'Your password',
          type: 'password',
          autoComplete: 'current-password',
          hint: `Asked for again before you can ${purpose}: this device may have been left open.`,
          required: true,
        },
      ]}
    />
  );
}
