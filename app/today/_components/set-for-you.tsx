import Link from 'next/link';
import { sayDeadline } from '@/components/progress/say-due';
import { Empty } from '@/components/ui/panel';
import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import type { SetWork } from '@/lib/data/today';

/** What is set, the next due first. */
export function SetForYou({ set }: Readonly<{ set: readonly SetWork[] }>) {
  if (set.length === 0) {
    return (
      <Empty title="Nothing is set">
        When your instructor sets a lesson it stands here with its date. Until then every lesson is
        yours to open.
      </Empty>
    );
  }
  return (
    <Table caption="Set for your class">
      <HeadRow>
        <ColumnName>What</ColumnName>
        <ColumnName>Due</ColumnName>
        <ColumnName className="max-sm:hidden">Left</ColumnName>
      </HeadRow>
      <tbody>
        {set.map((work) => (
          <SetRow key={work.assignmentId} work={work} />
        ))}
      </tbody>
    </Table>
  );
}

function SetRow({ work }: Readonly<{ work: SetWork }>) {
  const left = work.exercises.length - work.done;
  const stillLeft = left === 0 ? <Done /> : `${left} ${left === 1 ? 'exercise' : 'exercises'}`;
  return (
    <Row>
      <RowName className="sm:min-w-44">
        {placesOf(work).map(({ path, title }) => (
          <Link key={path} href={path} prefetch={false} className="link link-target mr-4">
            {title}
          </Link>
        ))}
        <span className="block text-[0.9375rem] text-pencil">
          {work.className}
          {work.note ? `: ${work.note}` : ''}
        </span>
      </RowName>
      <Cell className="sm:whitespace-nowrap">
        {work.overdue && left > 0 ? (
          <strong className="text-madder">{sayDeadline(work.dueAt, work.timeZone)}, late</strong>
        ) : (
          sayDeadline(work.dueAt, work.timeZone)
        )}
        {rulesFor(work).map((rule) => (
          <span key={rule} className="block text-[0.9375rem] text-pencil">
            {rule}
          </span>
        ))}
        <span className="block sm:hidden">
          {stillLeft}
          {left === 0 ? '' : ' left'}
        </span>
      </Cell>
      <Cell className="max-sm:hidden">{stillLeft}</Cell>
    </Row>
  );
}

/** What is worth knowing before answering: more time, a limit, and what happens to late work. */
function rulesFor(work: SetWork): string[] {
  return [
    ...(work.extended ? ['more time, for you'] : []),
    ...(work.lateWork === 'closed' ? ['no late work'] : []),
    ...attemptsLeft(work),
  ];
}

/** How many attempts still count: once for all exercises where it is the same, else one by one. */
function attemptsLeft({ exercises }: SetWork): string[] {
  const open = exercises.flatMap(({ title, mark, attemptsLeft: left }) =>
    mark === 'right' || left === null ? [] : [{ title, left }],
  );
  const say = (left: number) =>
    left === 0 ? 'no attempt left' : left === 1 ? 'one attempt left' : `${left} attempts left`;
  if (new Set(open.map(({ left }) => left)).size > 1) {
    return open.map(({ title, left }) => `${title}: ${say(left)}`);
  }
  return open.slice(0, 1).map(({ left }) => `${say(left)}${open.length > 1 ? ' for each' : ''}`);
}

function Done() {
  return (
    <span className="font-semibold text-leaf">
      <span aria-hidden="true">✓ </span>done
    </span>
  );
}

/** The lessons of the work, each once; an exercise set by itself stands under its own name. */
function placesOf(work: SetWork): readonly { path: string; title: string }[] {
  const places = new Map<string, string>();
  for (const exercise of work.exercises) {
    if (exercise.lesson) places.set(exercise.lesson.path, exercise.lesson.title);
  }
  return [...places].map(([path, title]) => ({ path, title }));
}
