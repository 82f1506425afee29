import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import path from 'node:path';
import { reachDatabase, withoutPassword } from './machine/embedded.mjs';
import { requireServer } from './machine/postgres.mjs';
import { complain, Remedy, say } from './machine/say.mjs';

/** `npm run restore -- file --yes`: puts a backup in the place of what is there, whole or not at all. */
async function main() {
  const [named, ...flags] = process.argv.slice(2);
  if (!named) throw new Remedy('Which backup?', 'npm run restore -- path/to/file.dump --yes');
  const file = path.resolve(named);
  if (!existsSync(file))
    throw new Remedy(`There is no file ${file}.`, 'Name a file that npm run backup wrote.');
  if (!flags.includes('--yes')) {
    throw new Remedy(
      'A restore replaces everything that is in the database now.',
      'Say so with --yes at the end of the command.',
    );
  }
  const database = await reachDatabase();
  try {
    const { url, env } = withoutPassword(database.owner);
    const done = spawnSync(
      path.join(requireServer(), 'pg_restore'),
      [
        '--clean',
        '--if-exists',
        '--single-transaction',
        '--exit-on-error',
        '--no-owner',
        '--dbname',
        url,
        file,
      ],
      { env, encoding: 'utf8' },
    );
    if (done.status !== 0) {
      throw new Remedy(
        `The restore did not succeed; the database is as it was.\n${done.stderr}`,
        'See the lines above for the reason.',
      );
    }
    say(`Restored from ${file}`);
  } finally {
    await database.stop();
  }
}

main().catch((error) => {
  complain(error);
  process.exit(1);
});
