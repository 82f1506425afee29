import { sayDay } from '@/components/progress/say-due';
import type { Member } from '@/lib/data/class-people';
import type { ClassFound } from '@/lib/data/classes';

interface LeftProps {
  readonly found: ClassFound;
  readonly people: readonly Member[];
}

/** Who was in the class and has left it. */
export function Left({ found, people }: LeftProps) {
  if (people.length === 0) return null;
  return (
    <details className="mb-10">
      <summary className="min-h-11 py-2 font-semibold">
        {people.length === 1 ? 'One has left' : `${people.length} have left`}
      </summary>
      <ul className="divide-y divide-rule border-y border-rule">
        {people.map(({ personId, name, role, leftAt }) => (
          <li key={personId} className="flex flex-wrap justify-between gap-x-4 py-2">
            <span>
              {name} <span className="text-pencil">({role})</span>
            </span>
            {leftAt === null ? null : (
              <span className="text-pencil">left {sayDay(leftAt, found.timeZone)}</span>
            )}
          </li>
        ))}
      </ul>
      <p className="mt-2 text-[0.9375rem] text-pencil">
        What they did stays in their own record. Put back in, they go on where they were.
      </p>
    </details>
  );
}
