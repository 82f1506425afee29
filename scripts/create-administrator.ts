import { parseArgs } from 'node:util';
import { now } from '@/lib/clock';
import { createAdministrator } from '@/lib/data/entry/first-administrator';
import { closeDatabase } from '@/lib/db/connection';

/** `--name … --email …`: makes an administrator and prints the link that sets the password once. */
async function main(): Promise<void> {
  const { values } = parseArgs({
    options: { name: { type: 'string' }, email: { type: 'string' } },
  });
  const { name, email } = values;
  if (!name || !email || !/^[^\s@]+@[^\s@]+$/.test(email)) {
    throw new Error('Say who: --name "Ada Wright" --email ada@workshop.example');
  }
  const link = await createAdministrator({ by: 'console' }, { name, email }, now());
  console.log(`${name} is an administrator now. This link sets the password, once, within a week:`);
  console.log(`  ${link}`);
}

try {
  await main();
} catch (error) {
  console.error(error instanceof Error ? error.message : String(error));
  process.exitCode = 1;
} finally {
  await closeDatabase();
}
