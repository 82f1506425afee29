import { LearnerLink } from '@/components/progress/lessons-table';
import { ActionForm } from '@/components/ui/action-form';
import { Empty } from '@/components/ui/panel';
import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import type { Member } from '@/lib/data/classes';
import { takeOut } from '../actions';

interface MembersProps {
  readonly classId: string;
  readonly members: readonly Member[];
  readonly mayRemove: boolean;
}

/** Who is in the class, instructors first. */
export function Members({ classId, members, mayRemove }: MembersProps) {
  if (members.length === 0) {
    return (
      <Empty title="Nobody is in this class yet">
        {mayRemove
          ? 'Put its instructors and learners into it with the form.'
          : 'The administrator puts people into classes.'}
      </Empty>
    );
  }
  return (
    <Table caption="Who is in the class">
      <HeadRow>
        <ColumnName>Name</ColumnName>
        <ColumnName>As</ColumnName>
        {mayRemove ? (
          <ColumnName>
            <span className="sr-only">Take out</span>
          </ColumnName>
        ) : null}
      </HeadRow>
      <tbody>
        {members.map((member) => (
          <Row key={member.personId}>
            <RowName>
              {member.role === 'learner' ? (
                <LearnerLink classId={classId} learner={member} />
              ) : (
                member.name
              )}
            </RowName>
            <Cell>{member.role}</Cell>
            {mayRemove ? (
              <Cell>
                <ActionForm
                  action={takeOut.bind(null, classId, member.personId)}
                  fields={[]}
                  submit="Take out"
                  variant="quiet"
                />
              </Cell>
            ) : null}
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
