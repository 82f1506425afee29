import type { Metadata } from 'next';
import { ActionForm } from '@/components/ui/action-form';
import { ButtonLink } from '@/components/ui/button';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { now } from '@/lib/clock';
import { findLinkHolder } from '@/lib/data/entry/set-password';
import { setPasswordByLink } from './actions';

export const metadata: Metadata = { title: 'Set a password', referrer: 'no-referrer' };

interface SetPasswordPageProps {
  readonly params: Promise<{ readonly token: string }>;
}

const password = {
  name: 'password',
  label: 'New password',
  type: 'password',
  autoComplete: 'new-password',
  hint: 'Ten characters at least. Three or four words in a row do well; paste one if you like.',
} as const;

export default async function SetPasswordPage({ params }: SetPasswordPageProps) {
  const { token } = await params;
  const holder = await findLinkHolder({ by: 'link', secret: token }, now());
  if (holder === null) {
    return (
      <Page width="narrow">
        <PageHeading>This link is used up</PageHeading>
        <p className="mb-6 max-w-measure">
          A link works once, and for seven days. If you have set your password with it, sign in. If
          not, ask for a new one where you got this.
        </p>
        <ButtonLink href="/sign-in">Sign in</ButtonLink>
      </Page>
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
