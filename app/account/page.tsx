import type { Metadata } from 'next';
import { ActionForm } from '@/components/ui/action-form';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { findOwnAddress } from '@/lib/data/own-address';
import { savePassword, saveProfile } from './actions';
import { CalendarAddress } from './_components/calendar-address';
import { passwordFields, profileFields } from './_components/fields';
import { MailPreference } from './_components/mail-preference';
import { SignOut } from './_components/sign-out';

export const metadata: Metadata = { title: 'Account' };

export default async function AccountPage() {
  const viewer = await requireViewer();
  const address = await findOwnAddress(viewer);
  return (
    <Page width="narrow">
      <PageHeading eyebrow={address}>Account</PageHeading>
      <Section title="About you">
        <ActionForm action={saveProfile} fields={profileFields(viewer)} submit="Save" />
      </Section>
      <Section title="Password">
        <ActionForm
          action={savePassword}
          fields={passwordFields}
          submit="Change the password"
          variant="secondary"
        />
      </Section>
      <MailPreference viewer={viewer} />
      <CalendarAddress viewer={viewer} />
      <Section title="Leave">
        <SignOut personId={viewer.personId} />
      </Section>
    </Page>
  );
}
