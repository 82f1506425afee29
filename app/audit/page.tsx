import type { Metadata } from 'next';
import Link from 'next/link';
import { forbidden } from 'next/navigation';
import { buttonClass } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { Empty } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { listAudit, listAuditChoices } from '@/lib/data/audit-log';
import { can } from '@/lib/policy/can';
import { auditQuerySchema } from '@/lib/schemas/audit';
import { AuditFilterForm } from './_components/audit-filter-form';
import { AuditTable } from './_components/audit-table';
import { queryOf } from './_components/query-of';

export const metadata: Metadata = { title: 'Audit log' };

interface AuditPageProps {
  readonly searchParams: Promise<Readonly<Record<string, string | string[] | undefined>>>;
}

export default async function AuditPage({ searchParams }: AuditPageProps) {
  const viewer = await requireViewer();
  if (!can(viewer, 'read the audit log')) forbidden();
  const asked = auditQuerySchema.safeParse(await searchParams);
  const { before: start = null, ...filter } = asked.data ?? {};
  const [{ entries, before }, choices] = await Promise.all([
    listAudit(viewer, filter, start),
    listAuditChoices(viewer),
  ]);
  return (
    <Page>
      <PageHeading eyebrow="Who did what to whose records; nothing here is ever changed">
        Audit log
      </PageHeading>
      {asked.success ? null : (
        <Notice
          tone="wrong"
          title={asked.error.issues[0]?.message ?? 'That cannot be looked for.'}
        />
      )}
      <AuditFilterForm filter={filter} choices={choices} />
      {entries.length > 0 ? (
        <AuditTable entries={entries} timeZone={viewer.timeZone} />
      ) : (
        <Empty title="No line fits">Look for less, or for a longer time.</Empty>
      )}
      <div className="mt-5 flex flex-wrap items-center gap-5 print:hidden">
        {before ? (
          <Link
            href={`/audit?${queryOf({ ...filter, before })}`}
            prefetch={false}
            className="link link-target"
          >
            Earlier ›
          </Link>
        ) : null}
        <a href={`/api/audit?${queryOf(filter)}`} className={buttonClass('secondary')} download>
          Take these away as CSV
        </a>
      </div>
    </Page>
  );
}
