import Link from 'next/link';
import { BenchPicture } from '@/app/_components/bench-picture';
import { pictureOf } from '@/app/_components/pictures';
import { PegRail, type Peg } from '@/components/progress/peg-rail';
import type { FrontMatter } from '@/content/lessons/front-matter-schema';
import { lessonPath } from '@/content/lessons/front-matter';

interface LessonCardProps {
  readonly lesson: FrontMatter;
  /** The pegs of this lesson's skills; none while nobody is signed in. */
  readonly pegs?: readonly Peg[];
}

/** A lesson in a list: its drawing, what it is about, and the pegs of its skills. */
export function LessonCard({ lesson, pegs }: LessonCardProps) {
  return (
    <li className="grid gap-4 border-b border-rule py-6 sm:grid-cols-[15rem_1fr] sm:gap-8">
      <div className="max-w-60 self-start border border-rule px-3 py-4">
        <BenchPicture spec={pictureOf(lesson.id)} />
      </div>
      <div>
        <h3 className="mb-1">
          <Link href={lessonPath(lesson)} prefetch={false} className="link link-target">
            {lesson.title}
          </Link>
        </h3>
        <p className="mb-3 max-w-measure text-pencil">{lesson.summary}</p>
        {pegs && pegs.length > 0 ? <PegRail pegs={pegs} words /> : null}
      </div>
    </li>
  );
}
