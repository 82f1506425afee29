import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import type { AuditEntryListed } from '@/lib/data/audit-log';

interface AuditTableProps {
  readonly entries: readonly AuditEntryListed[];
  readonly timeZone: string;
}

/** Lines of the audit log, the latest first. */
export function AuditTable({ entries, timeZone }: AuditTableProps) {
  const when = new Intl.DateTimeFormat('en-GB', {
    timeZone,
    dateStyle: 'medium',
    timeStyle: 'medium',
  });
  return (
    <Table caption="Lines of the audit log">
      <HeadRow>
        <ColumnName>When</ColumnName>
        <ColumnName>Who</ColumnName>
        <ColumnName>Did what</ColumnName>
        <ColumnName>To whom or what</ColumnName>
        <ColumnName>Class</ColumnName>
      </HeadRow>
      <tbody>
        {entries.map((entry) => (
          <Row key={entry.id}>
            <RowName className="whitespace-nowrap">{when.format(new Date(entry.at))}</RowName>
            <Cell className="min-w-32">{entry.actorName ?? '–'}</Cell>
            <Cell className="min-w-40">
              {entry.action}
              <span className="block text-[0.9375rem] text-pencil">{detailOf(entry)}</span>
            </Cell>
            <Cell className="min-w-40">
              {entry.objectName ?? entry.objectKind}
              {entry.objectName ? (
                <span className="block text-[0.9375rem] text-pencil">{entry.objectKind}</span>
              ) : null}
            </Cell>
            <Cell>{entry.className ?? '–'}</Cell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}

function detailOf({ detail }: AuditEntryListed): string {
  return Object.entries(detail)
    .filter(([, value]) => value !== null && value !== '')
    .map(([name, value]) => `${name}: ${String(value)}`)
    .join(', ');
}
