import Link from 'next/link';
import { sayWhen } from '@/components/progress/say-due';
import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import type { PersonListed } from '@/lib/data/people-list';
import { standingOf } from './standing';

interface PeopleTableProps {
  readonly people: readonly PersonListed[];
  readonly timeZone: string;
}

/** Everybody with an account: their classes, how the account stands, when they were last here. */
export function PeopleTable({ people, timeZone }: PeopleTableProps) {
  return (
    <Table caption="Everybody with an account">
      <HeadRow>
        <ColumnName>Name</ColumnName>
        <ColumnName>Classes</ColumnName>
        <ColumnName>Account</ColumnName>
        <ColumnName>Last here</ColumnName>
      </HeadRow>
      <tbody>
        {people.map((person) => (
          <Row key={person.personId}>
            <RowName className="min-w-60">
              <Link
                href={`/people/${person.personId}`}
                prefetch={false}
                className="link link-target"
              >
                {person.name}
              </Link>
              <span className="block text-[0.9375rem] text-pencil">{person.email}</span>
            </RowName>
            <Cell className="min-w-52">
              {person.classes
                .map(({ name, role }) => (role === 'instructor' ? `${name} (teaches)` : name))
                .join(', ') || '–'}
            </Cell>
            <Cell>{standingOf(person)}</Cell>
            <Cell className="whitespace-nowrap">
              {person.lastSeenAt ? sayWhen(person.lastSeenAt, timeZone) : 'never'}
            </Cell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
