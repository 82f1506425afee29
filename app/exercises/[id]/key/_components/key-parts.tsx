import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import type { FreshKey } from '@/lib/data/exercise-key';

/** The answer to each part, what else counts as it, and the slips with what is said to each. */
export function KeyParts({ parts }: Readonly<{ parts: FreshKey['parts'] }>) {
  return parts.map((part) => (
    <div key={part.key} className="mb-8">
      <h3 className="mb-1">{part.label}</h3>
      <p className="mb-3">
        <span className="font-semibold text-leaf">
          <span aria-hidden="true">✓ </span>
          <span className="font-mono">{part.answer}</span>
        </span>
        {part.accepts ? <span className="ml-3 text-pencil">{part.accepts}</span> : null}
      </p>
      {part.slips.length > 0 ? (
        <Table caption={`Slips of ${part.label}`}>
          <HeadRow>
            <ColumnName>Slip</ColumnName>
            <ColumnName>A learner would answer</ColumnName>
            <ColumnName>and be told</ColumnName>
          </HeadRow>
          <tbody>
            {part.slips.map((slip) => (
              <Row key={`${slip.id}${slip.answer}`}>
                <RowName className="align-top font-mono text-[0.9375rem]">{slip.id}</RowName>
                <Cell className="align-top font-mono">{slip.answer}</Cell>
                <Cell className="max-w-measure min-w-64 align-top">{slip.advice}</Cell>
              </Row>
            ))}
          </tbody>
        </Table>
      ) : null}
    </div>
  ));
}
