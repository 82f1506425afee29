import Link from 'next/link';
import { lessonPath } from '@/content/lessons/front-matter';
import { BenchPicture } from '@/app/_components/bench-picture';
import { pictureOfWay } from '@/app/_components/pictures';
import type { MotionEntry } from './entries';
import { MovingPicture } from './moving-picture';

interface MotionCardProps {
  readonly way: string;
  readonly entry: MotionEntry;
}

/** One mechanism for one motion: a drawing to turn, how it works, where it ends. */
export function MotionCard({ way, entry }: MotionCardProps) {
  const { lesson, by } = entry;
  const spec = pictureOfWay(way, lesson.id);
  return (
    <article className="grid gap-5 border-t border-rule py-5 md:grid-cols-[18rem_1fr]">
      <MovingPicture spec={spec} name={by}>
        <BenchPicture spec={spec} />
      </MovingPicture>
      <div>
        <p className="mb-2 max-w-measure">{by}</p>
        <p className="mb-1 text-base font-semibold">Where it ends</p>
        <ul className="mb-2 max-w-measure list-disc pl-5 text-base text-pencil">
          {lesson.limits.map((limit) => (
            <li key={limit}>{limit}</li>
          ))}
        </ul>
        <Link href={lessonPath(lesson)} prefetch={false} className="link link-target">
          {lesson.title}
        </Link>
      </div>
    </article>
  );
}
