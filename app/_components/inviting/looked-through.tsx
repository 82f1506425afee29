import { Button } from '@/components/ui/button';
import { SubmitButton } from '@/components/ui/submit-button';
import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import type { InviteeReading } from '@/lib/schemas/invitees';

interface LookedThroughProps {
  readonly reading: InviteeReading;
  readonly role: string;
}

/** A list before anybody is invited: who would be, and every line that names nobody, with the reason. */
export function LookedThrough({ reading: { good, bad }, role }: LookedThroughProps) {
  const count = good.length;
  return (
    <div>
      <p className="mb-3 font-semibold" role="status">
        {count === 0
          ? 'Nobody of this list can be invited.'
          : `${count} ${count === 1 ? 'person' : 'people'} can be invited. Nobody is yet.`}
        {bad.length > 0
          ? ` ${bad.length} ${bad.length === 1 ? 'line needs' : 'lines need'} a look.`
          : ''}
      </p>
      {bad.length > 0 ? (
        <div className="mb-5">
          <Table caption="Lines that need a look">
            <HeadRow>
              <ColumnName>Line</ColumnName>
              <ColumnName>It says</ColumnName>
              <ColumnName>What is wrong</ColumnName>
              <ColumnName>Expected</ColumnName>
            </HeadRow>
            <tbody>
              {bad.map(({ line, text, wrong, expected }, at) => (
                <Row key={at}>
                  <RowName>{line}</RowName>
                  <Cell className="min-w-44 break-words">{text || '–'}</Cell>
                  <Cell className="min-w-32 font-semibold text-madder">{wrong}</Cell>
                  <Cell className="min-w-44">{expected}</Cell>
                </Row>
              ))}
            </tbody>
          </Table>
        </div>
      ) : null}
      {count > 0 ? (
        <details className="mb-5" open={count <= 12}>
          <summary className="link link-target">Who would be invited</summary>
          <ul>
            {good.map(({ email, name }) => (
              <li key={email} className="break-all">
                {name ? `${name}, ` : ''}
                {email}
              </li>
            ))}
          </ul>
        </details>
      ) : null}
      <input type="hidden" name="people" value={JSON.stringify(good)} />
      <input type="hidden" name="role" value={role} />
      <div className="flex flex-wrap gap-3">
        {count > 0 ? (
          <SubmitButton name="step" value="invite">
            {count === 1 ? 'Invite this one' : `Invite these ${count}`}
          </SubmitButton>
        ) : null}
        <Button type="submit" name="step" value="back" variant="secondary">
          Change the list
        </Button>
      </div>
    </div>
  );
}
