import { ways, type FrontMatter, type Way } from '@/content/lessons/front-matter-schema';

/** One mechanism that gives the motion wanted, with the lesson that teaches it. */
export interface MotionEntry {
  readonly lesson: FrontMatter;
  /** How the mechanism does it, in a sentence. */
  readonly by: string;
}

/** A motion wanted, and every lesson that makes it. */
export interface Motion {
  readonly way: Way;
  readonly title: string;
  readonly entries: readonly MotionEntry[];
}

/** The motions that some lesson makes, in the order in which they are asked for. */
export function listMotions(lessons: readonly FrontMatter[]): readonly Motion[] {
  return (Object.keys(ways) as Way[])
    .map((way) => ({
      way,
      title: ways[way],
      entries: lessons.flatMap((lesson) =>
        lesson.motions
          .filter((motion) => motion.way === way)
          .map((motion) => ({ lesson, by: motion.by })),
      ),
    }))
    .filter((motion) => motion.entries.length > 0);
}

/** The motions that no lesson makes yet: named, so that nobody looks in vain. */
export function motionsToCome(lessons: readonly FrontMatter[]): readonly string[] {
  const made = new Set(listMotions(lessons).map((motion) => motion.way));
  return (Object.keys(ways) as Way[]).filter((way) => !made.has(way)).map((way) => ways[way]);
}
