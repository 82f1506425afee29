import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { findViewer } from '@/lib/data/entry/sessions';
import { asCsv, takeOwnRecords } from '@/lib/data/own-records';
import { ownRecordRules } from '@/lib/data/own-record-rules';
import { endOwnSession, endOwnSessions, listOwnSessions } from '@/lib/data/own-sessions';
import { findProfile, updateProfile } from '@/lib/data/profile';
import { createAttempt } from '@/lib/data/attempts';
import { rows } from '@/lib/db/query';
import {
  countRows,
  makeViewer,
  mustOpen,
  openWorkshop,
  requestFor,
  signInAs,
  type Workshop,
} from '../support/workshop';

let workshop: Workshop;
beforeAll(async () => {
  workshop = await openWorkshop();
});
afterAll(() => workshop.close());

describe('one’s own profile', () => {
  it('is changed by what is named, and nothing else', async () => {
    const viewer = await makeViewer('Petra Profile', []);
    await updateProfile(viewer, { paper: 'letter', reducedMotion: true });
    expect(await findProfile(viewer)).toMatchObject({
      name: 'Petra Profile',
      units: 'metric',
      paper: 'letter',
      timeZone: 'Europe/London',
      reducedMotion: true,
    });
    await expect(updateProfile(viewer, { timeZone: 'Mars/Olympus' })).rejects.toThrow(RangeError);
  });
});

describe('one’s own sign-ins', () => {
  it('are listed, this one first and marked, the ended and other people’s never', async () => {
    const viewer = await makeViewer('Selma Sessions', []);
    const other = (await signInAs(viewer.personId)).viewer;
    const ended = (await signInAs(viewer.personId)).viewer;
    await endOwnSession(viewer, ended.sessionId);
    const listed = await listOwnSessions(viewer);
    expect(listed.map(({ sessionId, here }) => [sessionId, here])).toEqual([
      [viewer.sessionId, true],
      [other.sessionId, false],
    ]);
    expect(await listOwnSessions(workshop.learner)).toHaveLength(1);
  });

  it('are ended by their owner alone, at once, and noted', async () => {
    const viewer = await makeViewer('Tiril Two', []);
    const { secret, viewer: other } = await signInAs(viewer.personId);
    expect(await endOwnSession(workshop.learner, other.sessionId)).toBe(false);
    expect(await endOwnSession(workshop.administrator, other.sessionId)).toBe(false);
    expect(await endOwnSession(viewer, 'not-an-id')).toBe(false);
    expect(await findViewer({ by: 'session', secret }, new Date())).not.toBeNull();
    expect(await endOwnSession(viewer, other.sessionId)).toBe(true);
    expect(await endOwnSession(viewer, other.sessionId)).toBe(false);
    expect(await findViewer({ by: 'session', secret }, new Date())).toBeNull();
    expect(
      await countRows('audit_entries', "action = 'session ended' and object_id = $1", [
        other.sessionId,
      ]),
    ).toBe(1);
  });

  it('all end with signing out everywhere', async () => {
    const viewer = await makeViewer('Una Everywhere', []);
    const { secret } = await signInAs(viewer.personId);
    expect(await endOwnSessions(viewer)).toBe(2);
    expect(await findViewer({ by: 'session', secret }, new Date())).toBeNull();
    expect(
      await countRows('sessions', 'person_id = $1 and ended_at is null', [
        workshop.learner.personId,
      ]),
    ).toBe(1);
  });
});

describe('one’s own records', () => {
  it('have a rule for every column that names a person or a learner', async () => {
    const keys = await rows<{ key: string }>(
      `select distinct k.conrelid::regclass || '.' || a.attname as key
       from pg_constraint k
       join unnest(k.conkey) as part (number) on true
       join pg_attribute a on a.attrelid = k.conrelid and a.attnum = part.number
       where k.contype = 'f' and k.confrelid in ('people'::regclass, 'learners'::regclass)
       union
       select table_name || '.' || column_name from information_schema.columns
       where table_schema = 'public' and column_name in ('person_id', 'learner_id')
       order by key`,
    );
    const ruled = ownRecordRules.flatMap((rule) => rule.keys).sort();
    expect(ruled).toEqual([...new Set(ruled)]);
    expect(keys.map(({ key }) => key).sort()).toEqual(ruled);
  });

  it('hold one’s own work and nobody else’s, and no secret', async () => {
    const { learner, classmate } = workshop;
    for (const viewer of [learner, classmate]) {
      const round = await mustOpen(viewer, 'oval-from-pins');
      const request = await requestFor(round.roundId, 'right');
      await createAttempt(viewer, request, crypto.randomUUID());
    }
    const records = await takeOwnRecords(learner);
    expect(records?.parts.profile).toMatchObject([{ name: 'Lena Learner' }]);
    expect(records?.parts.memberships).toMatchObject([{ class: 'The harbour', role: 'learner' }]);
    expect(records?.parts.attempts).toHaveLength(1);
    expect(records?.parts.rounds).toHaveLength(1);
    const text = JSON.stringify(records);
    for (const kept of await rows<{ secret: string }>(
      'select secret_hash as secret from sessions',
    )) {
      expect(text).not.toContain(kept.secret);
    }
    expect(text).not.toContain('Carl');
    expect(
      await countRows('audit_entries', "action = 'own records taken away' and actor_id = $1", [
        learner.personId,
      ]),
    ).toBe(1);
  });

  it('leave an open round’s numbers and marking out until it is closed', async () => {
    const viewer = await makeViewer('Vilde Wrong', []);
    const round = await mustOpen(viewer, 'oval-from-pins');
    await createAttempt(viewer, await requestFor(round.roundId, 'slipped'), crypto.randomUUID());
    const records = await takeOwnRecords(viewer);
    expect(records?.parts.rounds).toMatchObject([{ closedAt: null, variant: null }]);
    expect(records?.parts.attempts).toMatchObject([{ marking: null }]);
  });

  it('want the password given within a quarter of an hour', async () => {
    const later = new Date(Date.now() + 16 * 60_000);
    expect(await takeOwnRecords(workshop.classmate, later)).toBeNull();
  });

  it('as CSV never begin a cell with a formula', () => {
    const csv = asCsv([{ name: '=1+1', at: new Date(0), held: { a: 1 }, gone: null }]);
    expect(csv).toBe('\uFEFFname,at,held,gone\r\n\'=1+1,1970-01-01T00:00:00.000Z,"{""a"":1}",\r\n');
    expect(asCsv([])).toBe('\uFEFF');
  });
});
