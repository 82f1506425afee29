import type { Metadata } from 'next';
import { forbidden } from 'next/navigation';
import { PageLinks } from '@/app/_components/page-links';
import { ButtonLink } from '@/components/ui/button';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { Empty } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { findPeople } from '@/lib/data/people-list';
import { can } from '@/lib/policy/can';
import { peopleQuerySchema } from '@/lib/schemas/person';
import { FindPeople } from './_components/find-people';
import { PeopleTable } from './_components/people-table';

export const metadata: Metadata = { title: 'People' };

interface PeoplePageProps {
  readonly searchParams: Promise<Readonly<Record<string, string | string[] | undefined>>>;
}

export default async function PeoplePage({ searchParams }: PeoplePageProps) {
  const viewer = await requireViewer();
  if (!can(viewer, 'look after people')) forbidden();
  const { search, standing, page } = peopleQuerySchema.parse(await searchParams);
  const { people, total, pages } = await findPeople(viewer, { search, standing, page });
  const hrefOf = (to: number) =>
    `/people?${new URLSearchParams({ search, standing: standing ?? '', page: String(to) }).toString()}`;
  return (
    <Page>
      <PageHeading eyebrow={search || standing ? `${total} found` : `${total} with an account`}>
        People
      </PageHeading>
      <div className="mb-6 flex flex-wrap gap-3">
        <ButtonLink href="/people/new">Make an account</ButtonLink>
        <ButtonLink href="/people/invitations" variant="secondary">
          Invite people
        </ButtonLink>
      </div>
      <FindPeople search={search} standing={standing} />
      {people.length > 0 ? (
        <PeopleTable people={people} timeZone={viewer.timeZone} />
      ) : (
        <Empty title="Nobody is like that">
          Look for a shorter part of the name or the address, or for everybody.
        </Empty>
      )}
      <PageLinks page={Math.min(page, pages)} pages={pages} hrefOf={hrefOf} />
    </Page>
  );
}
