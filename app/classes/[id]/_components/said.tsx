import { sayWhen } from '@/components/progress/say-due';
import type { AttemptComment } from '@/lib/data/attempt-talk';

interface SaidProps {
  readonly comments: readonly AttemptComment[];
  readonly timeZone: string;
}

/** What has been said to a learner, the first first, and whether they have read it. */
export function Said({ comments, timeZone }: SaidProps) {
  if (comments.length === 0) return null;
  return (
    <ul className="mb-5 divide-y divide-rule border-y border-rule">
      {comments.map(({ authorName, body, at, readAt }) => (
        <li key={at} className="py-3">
          <p className="max-w-measure whitespace-pre-line">{body}</p>
          <p className="text-[0.9375rem] text-pencil">
            {authorName}, {sayWhen(at, timeZone)} ·{' '}
            {readAt === null ? 'not read yet' : `read ${sayWhen(readAt, timeZone)}`}
          </p>
        </li>
      ))}
    </ul>
  );
}
