import type { Migration } from '@/lib/db/migration';

/** How often somebody has tried something lately, shared by every instance. */
export const createThrottle: Migration = {
  async up(database) {
    // The shape that rate-limiter-flexible reads and writes.
    await database.run(`
      create table throttle (
        key varchar(255) primary key,
        points integer not null default 0,
        expire bigint
      )`);
  },
  async down(database) {
    await database.run('drop table throttle');
  },
};
