import type { Metadata } from 'next';
import { forbidden } from 'next/navigation';
import { ActionForm } from '@/components/ui/action-form';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { listPeople } from '@/lib/data/people';
import { can } from '@/lib/policy/can';
import { makePerson } from './actions';
import { PeopleTable } from './_components/people-table';

export const metadata: Metadata = { title: 'People' };

export default async function PeoplePage() {
  const viewer = await requireViewer();
  if (!can(viewer, 'look after people')) forbidden();
  const people = await listPeople(viewer);
  return (
    <Page>
      <PageHeading eyebrow={`${people.length} with an account`}>People</PageHeading>
      <div className="grid gap-x-11 lg:grid-cols-[1.9fr_1fr]">
        <Section title="Everybody">
          <PeopleTable people={people} timeZone={viewer.timeZone} />
        </Section>
        <Section title="Make an account">
          <p className="mb-4 max-w-measure text-pencil">
            You get a link, once, with which they set their own password. Nobody else can make
            accounts.
          </p>
          <ActionForm
            action={makePerson}
            submit="Make the account"
            fields={[
              { name: 'name', label: 'Name', autoComplete: 'off', required: true },
              {
                name: 'email',
                label: 'E-mail',
                type: 'email',
                autoComplete: 'off',
                required: true,
              },
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
        </Section>
      </div>
    </Page>
  );
}
