import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { parse } from 'yaml';
import { frontMatterSchema, type FrontMatter } from './front-matter-schema';

const folder = path.join(process.cwd(), 'content', 'lessons');

/**
 * Reads the front matter at the head of an MDX document.
 * @throws Error that names the file and the field when it is missing or malformed.
 */
export function parseFrontMatter(source: string, file: string): FrontMatter {
  const block = /^---\n([\s\S]*?)\n---\n/.exec(source)?.[1];
  if (block === undefined) throw new Error(`${file}: no front matter between two lines of ---`);
  const result = frontMatterSchema.safeParse(parse(block));
  if (result.success) return result.data;
  const issues = result.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);
  throw new Error(`${file}: ${issues.join('; ')}`);
}

/** Every lesson document, as a path below `content/lessons`. */
export function listLessonFiles(): readonly string[] {
  return readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith('.mdx'))
    .map((file) => file.split(path.sep).join('/'))
    .sort();
}

/** The text of a lesson document, front matter included. */
export function readLessonFile(file: string): string {
  return readFileSync(path.join(folder, file), 'utf8');
}

let read: readonly FrontMatter[] | null = null;

/**
 * What every lesson says about itself, by unit and then in the order of the unit. Read once in
 * production, afresh each time while developing.
 */
export function listLessons(): readonly FrontMatter[] {
  if (read !== null && process.env.NODE_ENV === 'production') return read;
  read = listLessonFiles()
    .map((file) => parseFrontMatter(readLessonFile(file), file))
    .sort((one, other) => one.unitNumber - other.unitNumber || one.order - other.order);
  return read;
}

/** The lesson of this unit and name, or null. */
export function findLesson(unit: string, lesson: string): FrontMatter | null {
  return listLessons().find((entry) => entry.unit === unit && entry.id === lesson) ?? null;
}

/** Where a lesson is read: `/lessons/toothed-wheels/train-of-toothed-wheels`. */
export function lessonPath(lesson: Pick<FrontMatter, 'unit' | 'id'>): string {
  return `/lessons/${lesson.unit}/${lesson.id}`;
}
