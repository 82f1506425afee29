import { LearnerLink } from '@/components/progress/learner-link';
import { sayDay } from '@/components/progress/say-due';
import { Empty } from '@/components/ui/panel';
import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import type { Member } from '@/lib/data/class-people';
import type { ClassFound } from '@/lib/data/classes';
import { takeOut } from '../actions';
import { TakeOut } from './take-out';

interface MembersProps {
  readonly found: ClassFound;
  readonly members: readonly Member[];
}

/** Who is in the class now, instructors first. */
export function Members({ found, members }: MembersProps) {
  const { classId, timeZone, archived } = found;
  if (members.length === 0) {
    return (
      <Empty title="Nobody is in this class yet">
        Put its instructors and learners into it with the form, or open joining and tell them the
        word.
      </Empty>
    );
  }
  return (
    <Table caption="Who is in the class">
      <HeadRow>
        <ColumnName>Name</ColumnName>
        <ColumnName>As</ColumnName>
        <ColumnName className="max-sm:hidden">Since</ColumnName>
        {archived ? null : (
          <ColumnName>
            <span className="sr-only">Take out</span>
          </ColumnName>
        )}
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
            <Cell className="whitespace-nowrap max-sm:hidden">
              {sayDay(member.joinedAt, timeZone)}
            </Cell>
            {archived ? null : (
              <Cell className="text-right">
                <TakeOut action={takeOut.bind(null, classId, member.personId)} name={member.name} />
              </Cell>
            )}
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
