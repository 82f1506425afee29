import Link from 'next/link';
import { PegRail } from '@/components/progress/peg-rail';
import { Panel, Section } from '@/components/ui/panel';
import type { LessonPegs } from '@/lib/data/today';

/** The pegs that are lifting, with the lessons that put them home again; nothing when none is. */
export function Lifting({ lessons }: Readonly<{ lessons: readonly LessonPegs[] }>) {
  const due = lessons
    .map((lesson) => ({ ...lesson, pegs: lesson.pegs.filter((peg) => peg.state === 'lifting') }))
    .filter((lesson) => lesson.pegs.length > 0);
  const pegs = due.flatMap((lesson) => lesson.pegs);
  if (pegs.length === 0) return null;
  return (
    <Section title="Due again">
      <Panel>
        <p className="mb-2">
          {pegs.length === 1 ? 'One peg is' : `${pegs.length} pegs are`} lifting. One exercise each
          shows whether it still holds.
        </p>
        <PegRail pegs={pegs} />
        <ul className="mt-2">
          {due.map((lesson) => (
            <li key={lesson.lessonId}>
              <Link href={`${lesson.path}#answer`} prefetch={false} className="link link-target">
                {lesson.title}
              </Link>
            </li>
          ))}
        </ul>
      </Panel>
    </Section>
  );
}
