import pg from 'pg';
import { exercises } from '@/content/exercises/registry';
import { answerKey } from '@/lib/marking/answer-key';
import type { Variant } from '@/lib/marking/definition';
import { site } from './site';

/** Asks the site's database, past every right: only a test may. */
export async function records<Row extends pg.QueryResultRow>(
  text: string,
  values: readonly unknown[] = [],
): Promise<Row[]> {
  const client = new pg.Client({ connectionString: site().database.superuser });
  await client.connect();
  try {
    return (await client.query<Row>(text, [...values])).rows;
  } finally {
    await client.end();
  }
}

/** The open round of a person at an exercise, as it was drawn. */
export async function openVariant(email: string, exerciseId: string): Promise<Variant> {
  const [row] = await records<{ variant: Variant }>(
    `select r.variant from rounds r
     join learners l on l.id = r.learner_id join people p on p.id = l.person_id
     where p.email = $1 and r.exercise_id = $2 and r.closed_at is null`,
    [email, exerciseId],
  );
  if (!row) throw new Error(`${email} has no open round at ${exerciseId}.`);
  return row.variant;
}

/** What is right for a round, from the same code that marks it. */
export function keyOf(variant: Variant) {
  const definition = exercises.get(variant.exerciseId);
  if (!definition) throw new Error(`There is no exercise ${variant.exerciseId}.`);
  return { definition, key: answerKey(definition, variant) };
}
