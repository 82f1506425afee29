import type { Metadata } from 'next';
import { forbidden } from 'next/navigation';
import { ButtonLink } from '@/components/ui/button';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { Empty } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { findMailLog } from '@/lib/data/mail-log';
import { can } from '@/lib/policy/can';
import { mailFilterSchema, type MailFilter as Filter } from '@/lib/schemas/mail';
import { LettersTable } from './_components/letters-table';
import { MailFilter } from './_components/mail-filter';

export const metadata: Metadata = { title: 'Mail' };

interface MailPageProps {
  readonly searchParams: Promise<Readonly<Record<string, string | string[] | undefined>>>;
}

export default async function MailPage({ searchParams }: MailPageProps) {
  const filter = mailFilterSchema.parse({ state: null, after: null, ...(await searchParams) });
  const viewer = await requireViewer();
  if (!can(viewer, 'see what was mailed')) forbidden();
  const { letters, next, counts } = await findMailLog(viewer, filter);
  return (
    <Page>
      <PageHeading
        eyebrow={`${counts.waiting} waiting, ${counts.failed} failed, ${counts.sent} sent`}
      >
        Mail
      </PageHeading>
      <MailFilter filter={filter} />
      {letters.length === 0 ? (
        <Empty title="No letters here">
          Invitations, passwords and what classes are told stand here once they are written. What a
          letter says is not shown.
        </Empty>
      ) : (
        <LettersTable letters={letters} timeZone={viewer.timeZone} />
      )}
      {next === null ? null : (
        <ButtonLink href={olderPage(filter, next)} variant="secondary" className="mt-6">
          Older letters
        </ButtonLink>
      )}
    </Page>
  );
}

function olderPage({ state, kind, address }: Filter, after: string): string {
  return `/mail?${new URLSearchParams({ state: state ?? '', kind, address, after }).toString()}`;
}
