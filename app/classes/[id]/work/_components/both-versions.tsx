'use client';

import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import type { Difference } from './assignment-state';

/** Where two versions of the same work differ, field by field, and the way to the other's. */
export function BothVersions({ differences }: Readonly<{ differences: readonly Difference[] }>) {
  return (
    <>
      {differences.length === 0 ? (
        <p>Theirs says the same as yours.</p>
      ) : (
        <Table caption="Both versions">
          <HeadRow>
            <ColumnName>What</ColumnName>
            <ColumnName>Yours</ColumnName>
            <ColumnName>Theirs</ColumnName>
          </HeadRow>
          <tbody>
            {differences.map(({ what, yours, theirs }) => (
              <Row key={what}>
                <RowName className="align-top">{what}</RowName>
                <Cell className="align-top whitespace-pre-line">{yours}</Cell>
                <Cell className="align-top whitespace-pre-line">{theirs}</Cell>
              </Row>
            ))}
          </tbody>
        </Table>
      )}
      <p className="mt-3">
        Yours stands in the form below: change it if you like, and save it over theirs. Or{' '}
        <button
          type="button"
          className="link min-h-11"
          onClick={() => {
            window.location.reload();
          }}
        >
          take theirs
        </button>
        .
      </p>
    </>
  );
}
