import { describe, expect, it } from 'vitest';
import { listMotions, motionsToCome } from '@/app/by-motion/_components/entries';
import { groupByUnit, unitsToCome } from '@/app/lessons/_components/units';
import { listLessons } from '@/content/lessons/front-matter';
import { ways } from '@/content/lessons/front-matter-schema';

const lessons = listLessons();

describe('the list of lessons', () => {
  it('keeps every lesson, under its unit, in the order of the course', () => {
    const units = groupByUnit(lessons);
    expect(units.map((unit) => unit.number)).toEqual(
      [...units.map((unit) => unit.number)].sort((one, other) => one - other),
    );
    expect(units.flatMap((unit) => unit.lessons)).toEqual(lessons);
    expect(units[0]?.title).toBe('Toothed wheels');
  });

  it('names a unit as to come only while it has no lesson', () => {
    const toCome = unitsToCome(lessons);
    expect(toCome).toContain('Cams');
    expect(toCome).not.toContain('Toothed wheels');
    expect(toCome.length + groupByUnit(lessons).length).toBe(10);
  });
});

describe('by motion', () => {
  it('lists each motion with the lessons that make it', () => {
    const oval = listMotions(lessons).find((motion) => motion.way === 'oval');
    expect(oval?.entries.map((entry) => entry.lesson.id)).toEqual(['trammel-and-oval']);
  });

  it('sorts every motion into made or to come', () => {
    expect(listMotions(lessons).length + motionsToCome(lessons).length).toBe(
      Object.keys(ways).length,
    );
    expect(motionsToCome(lessons)).toContain('Turning into steps');
  });
});
