import { MarkSign } from '@/components/progress/mark';
import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import type { AttemptView } from '@/lib/schemas/round';

/** Each part of an answer: what was understood, whether it was right, the slip and what was told. */
export function AttemptParts({ attempt }: Readonly<{ attempt: AttemptView }>) {
  return (
    <>
      <Table caption="The answer, part by part">
        <HeadRow>
          <ColumnName>Asked</ColumnName>
          <ColumnName>Answered</ColumnName>
          <ColumnName>Marked</ColumnName>
          <ColumnName>Slip</ColumnName>
        </HeadRow>
        <tbody>
          {attempt.parts.map((part) => (
            <Row key={part.key}>
              <RowName className="align-top">{part.label}</RowName>
              <Cell className="align-top font-mono">{part.echo}</Cell>
              <Cell className="align-top">
                <MarkSign mark={part.right ? 'right' : 'wrong'} />
              </Cell>
              <Cell className="align-top">
                {part.slip ? <span className="block font-mono">{part.slip}</span> : '–'}
                {part.message ? (
                  <span className="block text-[0.9375rem] text-pencil">{part.message}</span>
                ) : null}
              </Cell>
            </Row>
          ))}
        </tbody>
      </Table>
      <p className="mt-4 max-w-measure">
        <span className="text-pencil">The learner was told: </span>
        {attempt.message} {attempt.nextStep}
      </p>
    </>
  );
}
