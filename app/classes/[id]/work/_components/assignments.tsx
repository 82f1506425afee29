import { sayDeadline } from '@/components/progress/say-due';
import { ActionForm } from '@/components/ui/action-form';
import { Empty } from '@/components/ui/panel';
import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import type { AssignmentListed } from '@/lib/data/assignments';
import { withdrawWork } from '../actions';

interface AssignmentsProps {
  readonly classId: string;
  readonly timeZone: string;
  readonly assignments: readonly AssignmentListed[];
}

/** The work that is set to a class, with how many have done it; each can be taken back. */
export function Assignments({ classId, timeZone, assignments }: AssignmentsProps) {
  if (assignments.length === 0) {
    return (
      <Empty title="Nothing is set yet">
        Choose a lesson and a day. Everybody in the class finds it on their Today page.
      </Empty>
    );
  }
  return (
    <Table caption="Work that is set">
      <HeadRow>
        <ColumnName>What</ColumnName>
        <ColumnName>Due</ColumnName>
        <ColumnName>Done by</ColumnName>
        <ColumnName>
          <span className="sr-only">Take it back</span>
        </ColumnName>
      </HeadRow>
      <tbody>
        {assignments.map((work) => (
          <Row key={work.assignmentId}>
            <RowName className="min-w-52">
              {[...work.lessons, ...work.exercises].map(({ title }) => title).join(', ')}
              {work.note ? (
                <span className="block text-[0.9375rem] text-pencil">{work.note}</span>
              ) : null}
            </RowName>
            <Cell className="whitespace-nowrap">{sayDeadline(work.dueAt, timeZone)}</Cell>
            <Cell className="whitespace-nowrap">
              {work.done} of {work.learners}
            </Cell>
            <Cell>
              <ActionForm
                action={withdrawWork.bind(null, classId, work.assignmentId)}
                fields={[]}
                submit="Take back"
                variant="quiet"
              />
            </Cell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
