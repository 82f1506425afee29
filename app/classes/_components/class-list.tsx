import Link from 'next/link';
import { Empty } from '@/components/ui/panel';
import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import type { ClassListed } from '@/lib/data/classes';

interface ClassListProps {
  readonly classes: readonly ClassListed[];
  /** Whether every class may be opened, taught or not. */
  readonly mayOpenAll: boolean;
}

/** The classes somebody is in, or looks after. */
export function ClassList({ classes, mayOpenAll }: ClassListProps) {
  if (classes.length === 0) {
    return (
      <Empty title="No class yet">
        {mayOpenAll
          ? 'Make one below, then put its instructors and learners into it.'
          : 'The administrator of your workshop puts people into classes. Until then every lesson is open to you.'}
      </Empty>
    );
  }
  return (
    <Table caption="Classes">
      <HeadRow>
        <ColumnName>Class</ColumnName>
        <ColumnName>You</ColumnName>
        <ColumnName>Instructors</ColumnName>
        <ColumnName>Learners</ColumnName>
      </HeadRow>
      <tbody>
        {classes.map(({ classId, name, role, instructors, learners, archived }) => (
          <Row key={classId}>
            <RowName>
              {mayOpenAll || role === 'instructor' ? (
                <Link href={`/classes/${classId}`} prefetch={false} className="link link-target">
                  {name}
                </Link>
              ) : (
                name
              )}
              {archived ? <span className="ml-2 text-pencil">put away</span> : null}
            </RowName>
            <Cell>{role === null ? '–' : role === 'instructor' ? 'teach it' : 'learn in it'}</Cell>
            <Cell>{instructors.join(', ') || 'nobody yet'}</Cell>
            <Cell className="font-mono">{learners}</Cell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
