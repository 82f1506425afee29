import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { PasswordGate } from '@/app/_components/password-gate';
import { ActionForm } from '@/components/ui/action-form';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { findProfile } from '@/lib/data/profile';
import { saveAddress, savePassword, saveProfile } from './actions';
import { CalendarAddress } from './_components/calendar-address';
import { addressFields, passwordFields, profileFields } from './_components/fields';
import { MailPreference } from './_components/mail-preference';
import { OwnRecords } from './_components/own-records';
import { OwnSessions } from './_components/own-sessions';
import { SignOut } from './_components/sign-out';

export const metadata: Metadata = { title: 'Account' };

export default async function AccountPage() {
  const viewer = await requireViewer();
  const profile = await findProfile(viewer);
  if (profile === null) notFound();
  return (
    <Page width="narrow">
      <PageHeading eyebrow={profile.email}>Account</PageHeading>
      <Section title="About you">
        <ActionForm action={saveProfile} fields={profileFields(profile)} submit="Save" />
      </Section>
      <Section title="Where you are signed in">
        <OwnSessions viewer={viewer} />
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
      <Section title="Address">
        <PasswordGate viewer={viewer} name="address" purpose="change your address">
          <ActionForm
            action={saveAddress}
            fields={addressFields}
            submit="Send the letter"
            variant="secondary"
          />
        </PasswordGate>
      </Section>
      <Section title="Your records">
        <OwnRecords viewer={viewer} />
      </Section>
      <Section title="Leave">
        <SignOut personId={viewer.personId} />
      </Section>
    </Page>
  );
}
