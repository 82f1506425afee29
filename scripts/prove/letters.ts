import { queueLetters } from '@/lib/data/letters';
import { closeDatabase } from '@/lib/db/connection';
import { transact } from '@/lib/db/query';

/** Queues so many letters in the database that `env` names, and answers their ids. */
export async function queueLettersTo(
  env: Readonly<Record<string, string>>,
  count: number,
): Promise<string[]> {
  Object.assign(process.env, env);
  const letters = Array.from({ length: count }, (_, place) => ({
    to: `somebody-${place}@workshop.example`,
    letter: { kind: 'password-changed' } as const,
  }));
  try {
    return await transact((transaction) => queueLetters(transaction, letters));
  } finally {
    await closeDatabase();
  }
}
