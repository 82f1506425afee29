import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { PasswordGate } from '@/app/_components/password-gate';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { findPerson } from '@/lib/data/people-list';
import { standingOf } from '../_components/standing';
import { AccountSwitch } from './_components/account-switch';
import { AdministratorSwitch } from './_components/administrator-switch';
import { PasswordLink } from './_components/password-link';

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
      <Section title="What happened">
        <Link
          href={`/audit?person=${encodeURIComponent(person.email ?? person.name)}`}
          prefetch={false}
          className="link link-target"
        >
          Their lines in the audit log
        </Link>
      </Section>
      <PasswordGate viewer={viewer} name="person" purpose="change somebody’s account">
        {person.disabled ? null : <PasswordLink person={person} />}
        <AdministratorSwitch person={person} />
        <AccountSwitch person={person} own={person.personId === viewer.personId} />
      </PasswordGate>
    </Page>
  );
}
