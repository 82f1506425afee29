import { describe, expect, it } from 'vitest';
import { lessonBench } from '@/content/lessons/benches';
import { listLessons } from '@/content/lessons/front-matter';
import { staticPicture } from '@/lib/scene/static-picture';
import { thumbnail } from '@/lib/scene/thumbnail';

describe.each(listLessons().map((lesson) => lesson.id))('the thumbnail of %s', (id) => {
  const spec = lessonBench(id, 'metric');

  it('is decoration, without a figure that could not be read', () => {
    expect(staticPicture(spec)).toMatch(/\d mm</);
    expect(thumbnail(spec)).not.toMatch(/\d mm</);
    expect(thumbnail(spec)).toContain('aria-hidden="true"');
  });

  it('moves with the drive and comes from numbers alone', () => {
    const moved = thumbnail(spec, (spec.drive ?? 0) + 0.5);
    expect(moved).not.toBe(thumbnail(spec));
    expect(moved).not.toMatch(/NaN|undefined|Infinity/);
  });
});
