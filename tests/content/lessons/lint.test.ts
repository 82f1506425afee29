import { describe, expect, it } from 'vitest';
import { lessons } from '@/content/exercises/registry';
import { listLessonFiles, parseFrontMatter, readLessonFile } from '@/content/lessons/front-matter';

const units = [
  'mm|cm|m|in|inch|inches|ft|feet|foot|°|degrees?|rpm|teeth|tooth|turns?|%|per cent|times|arbors?',
  'revolutions?|seconds?|minutes?|kg|g|N',
].join('|');
const typedNumber = new RegExp(`\\d(?:[\\d.,/ ]*\\d)?\\s*(?:″|"|(?:${units})(?![a-z]))`, 'g');

/** The prose of a document: no front matter, no formulas, no computed values, no givens. */
function prose(source: string): string {
  return source
    .replace(/^---\n[\s\S]*?\n---\n/, '')
    .replace(/\$\$[\s\S]*?\$\$/g, ' ')
    .replace(/\$[^$]*\$/g, ' ')
    .replace(/<(Given|Value)\b[^>]*\/>/g, ' ');
}

function typedNumbers(text: string): string[] {
  return [...text.matchAll(typedNumber)].map((match) => match[0]);
}

function used(source: string, component: string, attribute: string): string[] {
  const pattern = new RegExp(`<${component}\\s[^>]*\\b${attribute}="([^"]+)"`, 'g');
  return [...source.matchAll(pattern)].map((match) => match[1] ?? '');
}

describe('the lint of numbers', () => {
  it('finds a number with its unit, however it is written', () => {
    const wrong =
      'A bar of 300 mm, 12in, 3 1/8 inches or 3-1/8", a 1° slope, 12 teeth, 40 rpm, 2 %.';
    expect(typedNumbers(wrong)).toHaveLength(8);
  });

  it('lets givens, computed values, formulas and plain counts pass', () => {
    const right =
      'Cut <Given metric="300 mm" inch="12 in" /> to <Value of="x" />, at $2 m$ to 1, in 3 steps.';
    expect(typedNumbers(prose(right))).toEqual([]);
  });
});

describe.each(listLessonFiles())('%s', (file) => {
  const source = readLessonFile(file);
  const head = parseFrontMatter(source, file);
  const registered = lessons.find((lesson) => lesson.id === head.id);

  it('types no number that has a unit', () => {
    expect(typedNumbers(prose(source))).toEqual([]);
  });

  it('agrees with the registry about its unit and skills', () => {
    expect(registered?.unit).toBe(head.unit);
    expect(registered?.skills).toEqual(head.skills);
  });

  it('asks exactly what the registry says, in that order, after its own prediction', () => {
    expect(used(source, 'Exercise', 'id')).toEqual(registered?.exercises);
    expect(used(source, 'Prediction', 'id')).toEqual([registered?.prediction]);
  });

  it('asks at least five things', () => {
    expect(registered?.exercises.length).toBeGreaterThanOrEqual(5);
  });

  it('has the sections that its rule margin marks, in that order', () => {
    const ids = [...source.matchAll(/<(?:Hook|Section)\s+id="([^"]+)"/g)].map((match) => match[1]);
    expect(ids).toEqual(head.sections.map((section) => section.id));
  });

  it('has everything that a lesson must have', () => {
    for (const part of [
      'LessonBench',
      'Prediction',
      'Try',
      'WorkedExample',
      'FromDrawingToWood',
      'Caution',
      'Card',
    ]) {
      expect(source, part).toContain(`<${part}`);
    }
    expect(source).toContain('**Where it stops being true.**');
    expect(prose(source)).toMatch(/competent/);
  });

  it('says every given in both unit systems', () => {
    const givens = source.match(/<Given\b[^>]*\/>/g) ?? [];
    for (const given of givens) expect(given).toMatch(/metric="[^"]+"\s+inch="[^"]+"/);
  });

  it('uses none of the words that we do not say', () => {
    expect(prose(source)).not.toMatch(/\b(mastery|roster|streak|score|quiz|simply|just do)\b/i);
  });
});
