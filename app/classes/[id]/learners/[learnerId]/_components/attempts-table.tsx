import Link from 'next/link';
import { MarkSign } from '@/components/progress/mark';
import { sayWhen } from '@/components/progress/say-due';
import { Empty } from '@/components/ui/panel';
import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import type { LearnerInClass } from '@/lib/data/class-work';

/** A learner's counted attempts, the latest first, each leading to everything about it. */
export function AttemptsTable({ learner }: Readonly<{ learner: LearnerInClass }>) {
  if (learner.attempts.length === 0) {
    return (
      <Empty title="No answer yet">
        Answers count here once they are given to something that is set to the class.
      </Empty>
    );
  }
  return (
    <Table caption={`Answers of ${learner.name}`}>
      <HeadRow>
        <ColumnName>Exercise</ColumnName>
        <ColumnName>How it went</ColumnName>
        <ColumnName>When</ColumnName>
      </HeadRow>
      <tbody>
        {learner.attempts.map((attempt) => (
          <Row key={attempt.attemptId}>
            <RowName>
              <Link
                href={`/classes/${learner.classId}/attempts/${attempt.attemptId}`}
                prefetch={false}
                className="link link-target"
              >
                {attempt.title}
              </Link>
            </RowName>
            <Cell>
              <MarkSign mark={attempt.verdict} />
            </Cell>
            <Cell className="sm:whitespace-nowrap">
              {sayWhen(attempt.createdAt, learner.timeZone)}
              {attempt.late ? <strong className="text-madder">, late</strong> : null}
              {attempt.answeredAt === null ? null : (
                <span className="block text-[0.9375rem] text-pencil">
                  answered on the device {sayWhen(attempt.answeredAt, learner.timeZone)}
                </span>
              )}
            </Cell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
