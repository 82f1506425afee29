import { describe, expect, it } from 'vitest';
import { lessonFigures } from '@/content/exercises/figures';
import { listLessonFiles, parseFrontMatter, readLessonFile } from '@/content/lessons/front-matter';
import { unitSystems } from '@/lib/quantities/unit-system';

function text(lesson: string, name: string, units: 'metric' | 'inch' = 'metric'): string {
  return lessonFigures(lesson, units, 1).values[name]?.text ?? '';
}

describe('the numbers of a lesson’s prose', () => {
  it.each(listLessonFiles())('cover every name that %s uses, in both units', (file) => {
    const source = readLessonFile(file);
    const { id } = parseFrontMatter(source, file);
    const names = [...source.matchAll(/<Value of="([^"]+)"/g)].map((match) => match[1] ?? '');
    expect(names.length).toBeGreaterThan(0);
    for (const units of unitSystems) {
      const { values } = lessonFigures(id, units, 1);
      for (const name of names) {
        expect(values[name]?.text, `${name} in ${units}`).toMatch(/\d/);
        expect(values[name]?.text, `${name} in ${units}`).not.toMatch(/NaN|Infinity|undefined/);
      }
      expect(Object.keys(values).sort(), 'nothing worked out in vain').toEqual(
        [...new Set(names)].sort(),
      );
    }
  });

  // Values of the curriculum, unit 7.
  it('of the trammel are those of the curriculum', () => {
    const lesson = 'trammel-and-oval';
    expect(text(lesson, 'explore-pen')).toBe('31°');
    expect(text(lesson, 'widest-bar')).toBe('52.2°');
    expect(text(lesson, 'widest-gap')).toBe('14.5°');
    expect(text(lesson, 'skew-size')).toBe('0.03 mm');
    expect(text(lesson, 'skew-turn')).toBe('0.37°');
    expect(text(lesson, 'edge-flat')).toBe('0.001 %');
    expect(text(lesson, 'edge-line')).toBe('0.04 %');
    expect(text(lesson, 'cutter-error')).toBe('0.2 mm');
    expect(text(lesson, 'strip-extra')).toBe('9.4 mm');
  });

  it('of the pantograph are those of the curriculum', () => {
    expect(text('pantograph', 'reach-near')).toBe('207 mm');
    expect(text('pantograph', 'reach-far')).toBe('773 mm');
    expect(text('pantograph', 'drill-scale')).toBe('2.985');
    expect(text('pantograph', 'drill-true')).toBe('3');
    expect(text('pantograph', 'pair-share')).toBe('0.2 %');
  });

  it('of the train: π·m/2 at modules 4 and 6, and a split arbor', () => {
    const lesson = 'train-of-toothed-wheels';
    expect(text(lesson, 'tooth-thin')).toBe('6.3 mm');
    expect(text(lesson, 'tooth-thick')).toBe('9.4 mm');
    expect(text(lesson, 'pair-ratio')).toBe('4 turns');
  });
});

describe('worked examples', () => {
  const lessons = ['train-of-toothed-wheels', 'trammel-and-oval', 'pantograph'];

  it.each(lessons)(
    'of %s have six steps, are the same for a seed, and differ between seeds',
    (lesson) => {
      for (const units of unitSystems) {
        const { worked } = lessonFigures(lesson, units, 7);
        expect(worked.steps).toHaveLength(6);
        expect(lessonFigures(lesson, units, 7).worked).toEqual(worked);
        expect(lessonFigures(lesson, units, 8).worked).not.toEqual(worked);
        const all = JSON.stringify(worked);
        expect(all).not.toMatch(/NaN|Infinity|undefined/);
      }
    },
  );

  it('of the porthole agree with halves, difference and groove', () => {
    for (let seed = 0; seed < 200; seed += 1) {
      const { worked } = lessonFigures('trammel-and-oval', 'metric', seed);
      const given = worked.givens.map((one) => Number(one.value));
      const [length = NaN, width = NaN, slider = NaN, beyond = NaN] = given;
      const steps = worked.steps.map((step) => Number.parseFloat(step.value));
      expect(steps.slice(0, 5)).toEqual([
        length / 2,
        width / 2,
        (length - width) / 2,
        length - width + slider,
        length / 2 + 2 * beyond,
      ]);
      expect(width / length).toBeGreaterThanOrEqual(0.5);
      expect(width / length).toBeLessThanOrEqual(0.8);
    }
  });

  it('refuse a lesson that nobody has written', () => {
    expect(() => lessonFigures('no-such-lesson', 'metric', 1)).toThrow(RangeError);
  });
});
