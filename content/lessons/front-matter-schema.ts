import { z } from 'zod';

/**
 * The motions that somebody may come looking for who does not know the mechanism: the way in
 * called "By motion". Each has one plain sentence.
 */
export const ways = {
  slower: 'Turning into slower turning',
  faster: 'Turning into faster turning',
  'other-way': 'Turning into turning the other way',
  'round-a-corner': 'Turning round a corner',
  'to-and-fro': 'Turning into to-and-fro',
  steps: 'Turning into steps',
  copy: 'A hand’s path into a copy',
  oval: 'A hand’s path into an oval',
  'straight-line': 'A hand’s path into a straight line',
} as const;

/** One of the motions of {@link ways}. */
export type Way = keyof typeof ways;

const kebab = z.string().regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, 'expected a name-like-this');
const skill = z.string().regex(/^[a-z]+\.[a-z-]+$/, 'expected family.skill');

/**
 * The front matter of a lesson. `sections` stand in the order of the page and give the rule margin
 * its ticks; `motions` and `limits` feed "By motion".
 */
export const frontMatterSchema = z.strictObject({
  id: kebab,
  unit: kebab,
  unitNumber: z.int().min(1),
  unitTitle: z.string().min(3),
  order: z.int().min(1),
  title: z.string().min(3),
  summary: z.string().min(20).max(240),
  motions: z
    .array(z.strictObject({ way: z.literal(Object.keys(ways) as Way[]), by: z.string().min(3) }))
    .min(1),
  skills: z.array(skill).min(1),
  sections: z.array(z.strictObject({ id: kebab, label: z.string().min(2).max(14) })).min(3),
  bench: z.enum(['train', 'trammel', 'pantograph']),
  limits: z.array(z.string().min(10)).min(1),
});

/** What a lesson says about itself, before its text is read. */
export type FrontMatter = z.infer<typeof frontMatterSchema>;
