import clsx from 'clsx';
import Link from 'next/link';
import { sayWhen } from '@/components/progress/say-due';
import { ActionForm } from '@/components/ui/action-form';
import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import type { LetterListed } from '@/lib/data/mail-log';
import { sendAgain } from '../actions';
import { kindWords, stateWords } from './words';

interface LettersTableProps {
  readonly letters: readonly LetterListed[];
  readonly timeZone: string;
}

/** Letters, the latest first: to whom, how they stand, of what kind, and the way to send them again. */
export function LettersTable({ letters, timeZone }: LettersTableProps) {
  return (
    <Table caption="Letters">
      <HeadRow>
        <ColumnName>To</ColumnName>
        <ColumnName>State</ColumnName>
        <ColumnName>Kind</ColumnName>
        <ColumnName>Written</ColumnName>
        <ColumnName>
          <span className="sr-only">Send again</span>
        </ColumnName>
      </HeadRow>
      <tbody>
        {letters.map((letter) => (
          <Row key={letter.letterId}>
            <RowName className="min-w-44">
              <Reader letter={letter} />
            </RowName>
            <Cell className="min-w-44">
              <Standing letter={letter} timeZone={timeZone} />
            </Cell>
            <Cell className="whitespace-nowrap">
              {kindWords[letter.kind]}
              {letter.again ? <span className="block text-pencil">once more</span> : null}
            </Cell>
            <Cell className="whitespace-nowrap">{sayWhen(letter.createdAt, timeZone)}</Cell>
            <Cell>
              {letter.state === 'sent' || letter.state === 'failed' ? (
                <ActionForm
                  action={sendAgain.bind(null, letter.letterId)}
                  fields={[]}
                  submit="Send again"
                  variant="quiet"
                />
              ) : null}
            </Cell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}

function Reader({ letter }: Readonly<{ letter: LetterListed }>) {
  if (letter.personId === null) return <>{letter.to}</>;
  return (
    <>
      <Link href={`/people/${letter.personId}`} prefetch={false} className="link link-target">
        {letter.personName === null || letter.personName === '' ? letter.to : letter.personName}
      </Link>
      <span className="block text-[0.9375rem] text-pencil">{letter.to}</span>
    </>
  );
}

function Standing({ letter, timeZone }: Readonly<{ letter: LetterListed; timeZone: string }>) {
  const { word, sign, colour } = stateWords[letter.state];
  const later = letter.state === 'waiting' && letter.tries === 0;
  return (
    <>
      <span className={clsx('font-semibold', colour)}>
        <span aria-hidden="true">{sign} </span>
        {word}
      </span>
      {letter.sentAt === null ? null : ` ${sayWhen(letter.sentAt, timeZone)}`}
      {later ? ` until ${sayWhen(letter.sendAfter, timeZone)}` : null}
      {letter.state !== 'sent' && letter.tries > 0 ? (
        <span className="text-pencil">
          {letter.tries === 1 ? ' after one try' : ` after ${letter.tries} tries`}
        </span>
      ) : null}
      {letter.reason === null ? null : (
        <span className="block text-[0.9375rem] text-pencil">{letter.reason}</span>
      )}
    </>
  );
}
