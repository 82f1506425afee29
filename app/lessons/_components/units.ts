import type { FrontMatter } from '@/content/lessons/front-matter-schema';

/** A unit with the lessons of it that can be read. */
export interface UnitOfLessons {
  readonly number: number;
  readonly title: string;
  readonly lessons: readonly FrontMatter[];
}

/** The units of the whole course, in their order; those without a lesson yet are named, not linked. */
const course: readonly string[] = [
  'Wheels and ropes',
  'Toothed wheels',
  'Shape of a tooth',
  'Cranks and eccentrics',
  'Cams',
  'Bars and pins',
  'Drawing and copying',
  'Start and stop',
  'Wheels that travel',
  'Round corners',
];

/** Lessons by unit, the units in the order of the course, the lessons in the order given. */
export function groupByUnit(lessons: readonly FrontMatter[]): readonly UnitOfLessons[] {
  const units = new Map<number, FrontMatter[]>();
  for (const lesson of lessons) {
    units.set(lesson.unitNumber, [...(units.get(lesson.unitNumber) ?? []), lesson]);
  }
  return [...units]
    .sort(([one], [other]) => one - other)
    .map(([number, own]) => ({ number, title: own[0]?.unitTitle ?? '', lessons: own }));
}

/** The titles of the units that have no lesson yet, in the order of the course. */
export function unitsToCome(lessons: readonly FrontMatter[]): readonly string[] {
  const written = new Set(lessons.map((lesson) => lesson.unitNumber));
  return course.filter((_, index) => !written.has(index + 1));
}
