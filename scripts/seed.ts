import { now } from '@/lib/clock';
import { closeDatabase } from '@/lib/db/connection';
import { databaseEnvironment } from '@/lib/env';
import { clearPart, contents, loadDemo } from './demo/load';
import {
  demoAddress,
  demoAdministrator,
  demoClasses,
  demoInstructors,
  demoPassword,
} from './demo/people.data';

/** Loads the demo data into an empty database, and says how to sign in when it is there. */
async function seed(): Promise<void> {
  let held = await contents();
  if (held === 'part of the demo data') {
    await clearPart(databaseEnvironment().migrationUrl);
    held = 'nothing';
  }
  if (held === 'records') {
    console.log('The database holds records of its own: no demo data was loaded.');
    return;
  }
  if (held === 'nothing') await loadDemo(now());
  console.log(signIns());
}

function signIns(): string {
  const learners = demoClasses.flatMap(({ learners: all }) => all.slice(0, 1));
  const lines = [
    ['administrator', demoAdministrator.name],
    ...demoInstructors.map(({ name }) => ['instructor', name]),
    ...learners.map(({ name }) => ['learner', name]),
  ].map(([role = '', name = '']) => `  ${role.padEnd(14)} ${demoAddress(name).padEnd(26)} ${name}`);
  return [`Demo sign-ins, all with the password "${demoPassword}":`, ...lines].join('\n');
}

try {
  await seed();
} catch (error) {
  console.error(error instanceof Error ? (error.stack ?? error.message) : String(error));
  process.exitCode = 1;
} finally {
  await closeDatabase();
}
