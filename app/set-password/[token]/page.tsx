import type { Metadata } from 'next';
import { DeadLink } from '@/app/_components/dead-link';
import { passwordHint } from '@/app/_components/password-sentence';
import { ActionForm } from '@/components/ui/action-form';
import { ButtonLink } from '@/components/ui/button';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { now } from '@/lib/clock';
import { findLinkHolder } from '@/lib/data/entry/set-password';
import { setPasswordByLink } from './actions';

export const metadata: Metadata = { title: 'Set a password', referrer: 'strict-origin' };

interface SetPasswordPageProps {
  readonly params: Promise<{ readonly token: string }>;
}

const password = {
  name: 'password',
  label: 'New password',
  type: 'password',
  autoComplete: 'new-password',
  hint: passwordHint,
} as const;

export default async function SetPasswordPage({ params }: SetPasswordPageProps) {
  const { token } = await params;
  const holder = await findLinkHolder({ by: 'link', secret: token }, now());
  if (holder === null) {
    return (
      <DeadLink>
        A link works once: for half an hour when you asked for it, for seven days when it was made
        for you. If you have set your password with it, sign in. If not, ask for another.
      </DeadLink>
    );
  }
  return (
    <Page width="narrow">
      <PageHeading eyebrow={holder.email}>
        {holder.hasPassword ? 'Set a new password' : `Welcome, ${holder.name}`}
      </PageHeading>
      <p className="mb-6 max-w-measure text-pencil">
        {holder.hasPassword
          ? 'The new password replaces the old one and signs you out on every device.'
          : 'Choose a password, and you can sign in with it and the address above.'}
      </p>
      <ActionForm
        action={setPasswordByLink.bind(null, token)}
        fields={[password]}
        submit="Set the password"
      />
      <p className="mt-6">
        <ButtonLink href="/sign-in" variant="secondary">
          Go to signing in
        </ButtonLink>
      </p>
    </Page>
  );
}
