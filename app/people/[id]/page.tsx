import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { ActionForm } from '@/components/ui/action-form';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { findPerson } from '@/lib/data/people';
import { standingOf } from '../_components/standing';
import { makeLink } from '../actions';
import { AccountSwitch } from './_components/account-switch';

export const metadata: Metadata = { title: 'Person' };

interface PersonPageProps {
  readonly params: Promise<{ readonly id: string }>;
}

export default async function PersonPage({ params }: PersonPageProps) {
  const { id } = await params;
  const viewer = await requireViewer();
  const person = await findPerson(viewer, id);
  if (person === null) notFound();
  return (
    <Page width="narrow">
      <PageHeading eyebrow={person.email}>{person.name}</PageHeading>
      <p className="mb-8">Account: {standingOf(person)}.</p>
      <Section title="Classes">
        <ul>
          {person.classes.map(({ classId, name, role }) => (
            <li key={classId}>
              <Link href={`/classes/${classId}`} prefetch={false} className="link link-target">
                {name}
              </Link>
              , as {role}
            </li>
          ))}
        </ul>
        {person.classes.length === 0 ? (
          <p className="text-pencil">In no class. People are put into one on the class’s page.</p>
        ) : null}
      </Section>
      {person.disabled ? null : (
        <Section title={person.hasPassword ? 'Forgotten password' : 'First password'}>
          <p className="mb-4 max-w-measure text-pencil">
            A link that sets a new password, to hand over yourself. It is shown once.
          </p>
          <ActionForm
            action={makeLink.bind(null, id)}
            fields={[]}
            submit="Make a new link"
            variant="secondary"
          />
        </Section>
      )}
      <AccountSwitch person={person} own={person.personId === viewer.personId} />
    </Page>
  );
}
