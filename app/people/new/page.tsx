import type { Metadata } from 'next';
import { forbidden } from 'next/navigation';
import { PasswordGate } from '@/app/_components/password-gate';
import { ActionForm } from '@/components/ui/action-form';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { requireViewer } from '@/lib/auth/viewer';
import { can } from '@/lib/policy/can';
import { makePerson } from '../actions';

export const metadata: Metadata = { title: 'Make an account' };

export default async function NewPersonPage() {
  const viewer = await requireViewer();
  if (!can(viewer, 'look after people')) forbidden();
  return (
    <Page width="narrow">
      <PageHeading>Make an account</PageHeading>
      <p className="mb-4 max-w-measure text-pencil">
        They get a letter with a link to set their first password. You see the link too, once, to
        hand over where letters do not arrive.
      </p>
      <PasswordGate viewer={viewer} name="new" purpose="make accounts">
        <ActionForm
          action={makePerson}
          submit="Make the account"
          fields={[
            { name: 'name', label: 'Name', autoComplete: 'off', required: true },
            { name: 'email', label: 'E-mail', type: 'email', autoComplete: 'off', required: true },
            {
              name: 'isAdministrator',
              label: 'Administrator',
              options: [
                { value: 'no', label: 'No' },
                { value: 'yes', label: 'Yes: looks after people and every class' },
              ],
            },
          ]}
        />
      </PasswordGate>
    </Page>
  );
}
