import Link from 'next/link';
import { sayDeadline, sayWhen } from '@/components/progress/say-due';
import { Empty } from '@/components/ui/panel';
import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import type { AssignmentListed } from '@/lib/data/assignment-list';

interface AssignmentsProps {
  readonly classId: string;
  readonly timeZone: string;
  readonly assignments: readonly AssignmentListed[];
}

/** The work that is set to a class, with its rules and how many have done it. */
export function Assignments({ classId, timeZone, assignments }: AssignmentsProps) {
  if (assignments.length === 0) {
    return (
      <Empty title="Nothing is set">
        Choose lessons or single exercises and a day. Everybody in the class finds it on their Today
        page.
      </Empty>
    );
  }
  return (
    <Table caption="Work that is set">
      <HeadRow>
        <ColumnName>What</ColumnName>
        <ColumnName>Due</ColumnName>
        <ColumnName>How it counts</ColumnName>
        <ColumnName>Done by</ColumnName>
      </HeadRow>
      <tbody>
        {assignments.map((work) => (
          <Row key={work.assignmentId}>
            <RowName className="min-w-56 align-top">
              <Link
                href={`/classes/${classId}/work/${work.assignmentId}`}
                prefetch={false}
                className="link link-target"
              >
                {work.titles.join(', ')}
              </Link>
              <span className="block text-[0.9375rem] text-pencil">
                {work.note ? `${work.note} ` : ''}Set by {work.setBy}.
              </span>
            </RowName>
            <Cell className="align-top whitespace-nowrap">
              <span className="flex min-h-11 items-center">
                {sayDeadline(work.dueAt, timeZone)}
              </span>
              <When work={work} timeZone={timeZone} />
            </Cell>
            <Cell className="min-w-44 align-top text-[0.9375rem]">
              <ul className="py-2.5">
                {rulesSaid(work).map((rule) => (
                  <li key={rule}>{rule}</li>
                ))}
              </ul>
            </Cell>
            <Cell className="align-top whitespace-nowrap">
              <span className="flex min-h-11 items-center">
                {work.done} of {work.learners}
                {work.forChosen ? ' chosen' : ''}
              </span>
            </Cell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}

function When({ work, timeZone }: Readonly<{ work: AssignmentListed; timeZone: string }>) {
  const opens = new Date(work.opensAt) > new Date();
  return (
    <span className="block text-[0.9375rem] text-pencil">
      {opens ? <span className="block">opens {sayWhen(work.opensAt, timeZone)}</span> : null}
      {work.extensions > 0 ? <span className="block">{work.extensions} with more time</span> : null}
    </span>
  );
}

/** The rules of an assignment in words, the usual ones left out. */
function rulesSaid(work: AssignmentListed): string[] {
  const { attemptsAllowed, counting, lateWork } = work;
  return [
    counting === 'best' ? 'best attempt' : 'latest attempt',
    attemptsAllowed === null
      ? 'any number of attempts'
      : `${attemptsAllowed} ${attemptsAllowed === 1 ? 'attempt' : 'attempts'}`,
    lateWork === 'marked' ? 'late work marked late' : 'no late work',
  ];
}
