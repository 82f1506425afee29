import { reachDatabase } from './machine/embedded.mjs';
import { requireNode, runEntry } from './machine/node.mjs';
import { complain } from './machine/say.mjs';

/** `npm run create-administrator -- --email … --name …`: prints a link that sets the password once. */
async function main() {
  requireNode();
  const database = await reachDatabase();
  try {
    runEntry('scripts/create-administrator.ts', {
      args: process.argv.slice(2),
      env: {
        DATABASE_URL: database.app,
        DATABASE_MIGRATION_URL: database.owner,
        NEXTAUTH_URL: process.env.NEXTAUTH_URL ?? 'http://127.0.0.1:3000',
        NEXTAUTH_SECRET: process.env.NEXTAUTH_SECRET ?? database.session,
      },
      what: 'Making the administrator',
    });
  } finally {
    await database.stop();
  }
}

main().catch((error) => {
  complain(error);
  process.exit(1);
});
