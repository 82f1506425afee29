import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { closeDatabase } from '@/lib/db/connection';
import { row, rows } from '@/lib/db/query';
import { createSession } from '@/lib/data/entry/sessions';
import { clearPart, contents, loadDemo } from '../../scripts/demo/load';
import {
  demoAddress,
  demoAdministrator,
  demoClasses,
  demoPassword,
} from '../../scripts/demo/people.data';
import type { TestDatabase } from '../support/database';
import { countRows, makeViewer, takeTestDatabase } from '../support/workshop';

let database: TestDatabase;
beforeAll(() => {
  database = takeTestDatabase();
});
afterAll(async () => {
  await closeDatabase();
  database.drop();
});

describe('the demo data', () => {
  it('is loaded into an empty database, and is whole once its administrator is there', async () => {
    expect(await contents()).toBe('nothing');
    const now = new Date();
    await loadDemo(now);
    expect(await contents()).toBe('the demo data');
    expect(await countRows('class_groups')).toBe(3);
    const learners = demoClasses.flatMap((one) => one.learners);
    expect(learners).toHaveLength(30);
    expect(new Set(learners.map(({ name }) => demoAddress(name))).size).toBe(30);
    expect(await countRows('people')).toBe(33);
    expect(await countRows('attempts', 'created_at > $1', [now])).toBe(0);
    expect(await countRows('rounds', 'opened_at > $1', [now])).toBe(0);
    // Letters of weeks that are over lie in the log; nothing of them goes out now.
    expect(await countRows('letters', "state = 'sent'")).toBeGreaterThan(50);
    expect(await countRows('letters', "state = 'failed'")).toBe(1);
    expect(await countRows('letters', "state = 'waiting' and send_after <= $1", [now])).toBe(0);
    expect(await countRows('graphile_worker.jobs')).toBe(0);
  }, 300_000);

  it('is varied: right and wrong, known slips, hints, solutions, work left open', async () => {
    const found = await row<Record<string, number>>(`
      select count(*)::int as attempts,
        (count(*) filter (where verdict = 'right'))::int as "right",
        (count(*) filter (where marking::text like '%"slip"%'))::int as slips,
        (count(distinct created_at::date))::int as days,
        (select count(*)::int from rounds where hints_taken > 0) as hinted,
        (select count(*)::int from rounds where solution_seen_at is not null) as solved,
        (select count(*)::int from rounds where closed_at is null) as open,
        (select count(*)::int from counted_attempts where late) as late
      from attempts`);
    expect(found?.attempts).toBeGreaterThan(500);
    expect((found?.right ?? 0) / (found?.attempts ?? 1)).toBeGreaterThan(0.5);
    expect((found?.right ?? 0) / (found?.attempts ?? 1)).toBeLessThan(0.9);
    expect(found?.days).toBeGreaterThan(20);
    for (const kind of ['slips', 'hinted', 'solved', 'open', 'late']) {
      expect(found?.[kind], kind).toBeGreaterThan(5);
    }
  });

  it('lets everybody in with the one password, which is kept as a hash', async () => {
    const names = [demoAdministrator.name, ...demoClasses.flatMap((one) => one.instructors)];
    for (const name of names) {
      const email = demoAddress(name);
      const proof = { by: 'password', email, password: demoPassword, from: null } as const;
      expect(await createSession(proof, '', new Date())).toMatchObject({ outcome: 'signed in' });
    }
    expect(await countRows('people', 'password_hash = $1', [demoPassword])).toBe(0);
  });

  it('that was cut off is cleared and recognised, and records of others are let be', async () => {
    await rows('delete from sessions returning 1 as gone');
    await rows("update people set email = 'ada@other.example' where email = $1 returning id", [
      demoAddress(demoAdministrator.name),
    ]);
    expect(await contents()).toBe('records');
    await rows("update people set email = 'left@harbour.example' where email = $1 returning id", [
      'ada@other.example',
    ]);
    expect(await contents()).toBe('part of the demo data');
    await clearPart(database.owner);
    expect(await contents()).toBe('nothing');
    await makeViewer('Real Person', []);
    expect(await contents()).toBe('records');
  });
});
