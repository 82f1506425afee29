import { describe, expect, it } from 'vitest';
import { documents } from '@/content/lessons/documents';
import {
  findLesson,
  lessonPath,
  listLessonFiles,
  listLessons,
  parseFrontMatter,
} from '@/content/lessons/front-matter';

describe('front matter', () => {
  it('lists the lessons by unit, then in the order of the unit', () => {
    expect(listLessons().map((lesson) => lesson.id)).toEqual([
      'train-of-toothed-wheels',
      'trammel-and-oval',
      'pantograph',
    ]);
  });

  it('names each document after its unit and id', () => {
    const expected = listLessons().map((lesson) => `${lesson.unit}/${lesson.id}.mdx`);
    expect([...listLessonFiles()].sort()).toEqual(expected.sort());
  });

  it('has a compiled document for every lesson, and no other', () => {
    expect([...documents.keys()].sort()).toEqual(
      listLessons()
        .map((lesson) => lesson.id)
        .sort(),
    );
  });

  it('finds a lesson only under its own unit', () => {
    expect(findLesson('drawing-and-copying', 'pantograph')?.title).toBe('The pantograph');
    expect(findLesson('toothed-wheels', 'pantograph')).toBeNull();
    expect(findLesson('drawing-and-copying', '../pantograph')).toBeNull();
  });

  it('says where a lesson is read', () => {
    expect(lessonPath({ unit: 'toothed-wheels', id: 'train-of-toothed-wheels' })).toBe(
      '/lessons/toothed-wheels/train-of-toothed-wheels',
    );
  });

  it('names the file and the field when something is missing', () => {
    expect(() => parseFrontMatter('no head', 'a.mdx')).toThrow('a.mdx: no front matter');
    expect(() => parseFrontMatter('---\nid: Not A Name\n---\n', 'b.mdx')).toThrow(
      /^b\.mdx: id: expected a name-like-this/,
    );
  });

  it('refuses a field that nobody reads', () => {
    const head = listLessons()[0];
    const source = `---\n${JSON.stringify({ ...head, subtitle: 'x' })}\n---\n`;
    expect(() => parseFrontMatter(source, 'c.mdx')).toThrow(/subtitle/);
  });
});
