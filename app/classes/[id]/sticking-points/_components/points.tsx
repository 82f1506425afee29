import Link from 'next/link';
import { Empty } from '@/components/ui/panel';
import type { StickingPoint } from '@/lib/data/sticking-points';

interface PointsProps {
  readonly classId: string;
  readonly points: readonly StickingPoint[];
}

/** The slips of a class, those of the most learners first, with the answers as they were typed. */
export function Points({ classId, points }: PointsProps) {
  if (points.length === 0) {
    return (
      <Empty title="No known slip yet">
        When answers that count show a slip we know, it stands here with who made it.
      </Empty>
    );
  }
  const rest = points.slice(first);
  return (
    <>
      <PointList classId={classId} points={points.slice(0, first)} />
      {rest.length > 0 ? (
        <details className="mt-3">
          <summary className="min-h-11 py-2 font-semibold">
            {rest.length === 1 ? 'One more slip' : `${rest.length} more slips`}
          </summary>
          <PointList classId={classId} points={rest} />
        </details>
      ) : null}
    </>
  );
}

/** What one evening has room for. */
const first = 3;

function PointList({ classId, points }: PointsProps) {
  return (
    <ol className="divide-y divide-rule border-y border-rule">
      {points.map((point) => (
        <li key={`${point.exerciseId} ${point.label} ${point.slip}`} className="py-5">
          <h3>{point.title}</h3>
          <p className="text-pencil">{point.label}</p>
          <p className="my-2 max-w-measure">{point.advice}</p>
          <p className="font-semibold">
            {point.learners} {point.learners === 1 ? 'learner' : 'learners'}, {point.times}{' '}
            {point.times === 1 ? 'answer' : 'answers'}
          </p>
          <Answers classId={classId} point={point} />
          {point.showAgain ? (
            <p className="mt-2">
              Show again:{' '}
              <Link href={point.showAgain.path} prefetch={false} className="link link-target">
                “{point.showAgain.label}” in {point.showAgain.lesson}
              </Link>
            </p>
          ) : null}
        </li>
      ))}
    </ol>
  );
}

const most = 12;

function Answers({ classId, point }: Readonly<{ classId: string; point: StickingPoint }>) {
  const more = point.answers.length - most;
  return (
    <ul className="mt-1 flex flex-wrap gap-x-6">
      {point.answers.slice(0, most).map(({ attemptId, name, typed }) => (
        <li key={attemptId}>
          <Link
            href={`/classes/${classId}/attempts/${attemptId}`}
            prefetch={false}
            className="link-target gap-2 hover:underline"
          >
            <span className="font-mono text-madder">{typed}</span>
            <span>{name}</span>
          </Link>
        </li>
      ))}
      {more > 0 ? (
        <li className="flex min-h-11 items-center text-pencil">and {more} more</li>
      ) : null}
    </ul>
  );
}
