import { spawnSync } from 'node:child_process';
import { chmodSync, renameSync } from 'node:fs';
import path from 'node:path';
import { reachDatabase, withoutPassword } from './machine/embedded.mjs';
import { requireFolder, root } from './machine/node.mjs';
import { requireServer } from './machine/postgres.mjs';
import { complain, Remedy, say } from './machine/say.mjs';

/** `npm run backup [file]`: the whole database in one file, written whole or not at all. */
async function main() {
  const stamp = new Date().toISOString().slice(0, 19).replaceAll(':', '-');
  const file = path.resolve(
    process.argv[2] ?? path.join(root, '.hornbeam/backups', `hornbeam-${stamp}.dump`),
  );
  requireFolder(path.dirname(file));
  const database = await reachDatabase();
  try {
    const { url, env } = withoutPassword(database.owner);
    const part = `${file}.part`;
    const done = spawnSync(path.join(requireServer(), 'pg_dump'), ['-Fc', '--file', part, url], {
      env,
      encoding: 'utf8',
    });
    if (done.status !== 0)
      throw new Remedy(`The backup did not succeed.\n${done.stderr}`, 'No file was left.');
    chmodSync(part, 0o600);
    renameSync(part, file);
    say(`Backed up to ${file}`);
    say('It holds personal records: keep it where only those may read it who may read them.');
  } finally {
    await database.stop();
  }
}

main().catch((error) => {
  complain(error);
  process.exit(1);
});
