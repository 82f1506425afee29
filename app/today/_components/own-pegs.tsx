import Link from 'next/link';
import { PegList } from '@/components/progress/peg-list';
import { PegRail } from '@/components/progress/peg-rail';
import type { LessonPegs } from '@/lib/data/today';
import { pegRule } from '@/lib/retention/peg';

/** Every lesson with the learner's pegs, each opening to its skills one by one. */
export function OwnPegs({ lessons }: Readonly<{ lessons: readonly LessonPegs[] }>) {
  return (
    <>
      {lessons.map((lesson) => (
        <div key={lesson.lessonId} className="border-t border-rule py-3">
          <Link href={lesson.path} prefetch={false} className="link link-target">
            {lesson.title}
          </Link>
          <details>
            <summary className="flex min-h-11 list-none flex-wrap items-center gap-x-4 [&::-webkit-details-marker]:hidden">
              <PegRail pegs={lesson.pegs} words />
              <span className="link text-[0.9375rem]">skill by skill</span>
            </summary>
            <PegList pegs={lesson.pegs} />
          </details>
        </div>
      ))}
      <p className="border-t border-rule pt-3 text-[0.9375rem] text-pencil">{pegRule}</p>
    </>
  );
}
