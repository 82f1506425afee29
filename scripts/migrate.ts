import { migrate } from '@/lib/db/migrator';
import { databaseEnvironment } from '@/lib/env';

/** Brings the database to the shape that this version expects, and says what was changed. */
try {
  const { migrationUrl, applicationRole } = databaseEnvironment();
  const changed = await migrate(migrationUrl, { applicationRole });
  console.log(
    changed.length === 0 ? 'The database is up to date.' : `Migrated: ${changed.join(', ')}.`,
  );
} catch (error) {
  console.error(error instanceof Error ? error.message : String(error));
  process.exitCode = 1;
}
