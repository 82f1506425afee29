import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { listAudit, listAuditChoices, takeAudit } from '@/lib/data/audit-log';
import { recordAudit } from '@/lib/data/audit';
import { createAttempt } from '@/lib/data/attempts';
import { findAttemptInClass, findLearnerInClass } from '@/lib/data/class-work';
import { createSession } from '@/lib/data/entry/sessions';
import { row } from '@/lib/db/query';
import {
  countRows,
  mustOpen,
  openWorkshop,
  requestFor,
  setExercise,
  type Workshop,
} from '../support/workshop';

let workshop: Workshop;
beforeAll(async () => {
  workshop = await openWorkshop();
});
afterAll(() => workshop.close());

function note(action: 'signed in' | 'member added', actor = workshop.learner, classId?: string) {
  return recordAudit({
    actorId: actor.personId,
    action,
    objectKind: 'person',
    objectId: actor.personId,
    classId: classId ?? null,
    detail: { role: '=learner' },
  });
}

describe('the audit log', () => {
  it('is read, filtered and taken away by the administrator alone', async () => {
    const { learner, instructor, stranger, otherInstructor, administrator } = workshop;
    await note('signed in');
    for (const viewer of [learner, instructor, stranger, otherInstructor]) {
      expect(await listAudit(viewer, {})).toEqual({ entries: [], before: null });
      expect(await takeAudit(viewer, {})).toBeNull();
      expect((await listAuditChoices(viewer)).actions).toEqual([]);
    }
    expect((await listAudit(administrator, {})).entries.length).toBeGreaterThan(0);
  });

  it('finds lines by person, action, object, class and day', async () => {
    const { administrator, learner, harbour, quay } = workshop;
    await note('member added', learner, harbour);
    const found = async (filter: Parameters<typeof listAudit>[1]) =>
      (await listAudit(administrator, filter)).entries.length;
    const all = { person: 'lena', action: 'member added', objectKind: 'person', classId: harbour };
    const today = new Date().toISOString().slice(0, 10);
    expect(await found({ ...all, from: today, to: today })).toBe(1);
    expect(await found({ ...all, person: 'lena-' })).toBe(1);
    expect(await found({ ...all, person: 'Otto' })).toBe(0);
    expect(await found({ ...all, action: 'signed in' })).toBe(0);
    expect(await found({ ...all, objectKind: 'class' })).toBe(0);
    expect(await found({ ...all, classId: quay })).toBe(0);
    expect(await found({ ...all, to: '2020-01-01' })).toBe(0);
    expect(await found({ ...all, from: '2999-01-01' })).toBe(0);
    const [line] = (await listAudit(administrator, all)).entries;
    expect(line).toMatchObject({
      actorName: 'Lena Learner',
      objectName: 'Lena Learner',
      className: 'The harbour',
      detail: { role: '=learner' },
    });
    expect((await listAuditChoices(administrator)).actions).toContain('member added');
  });

  it('comes in pages of fifty, the latest first, each line once', async () => {
    const { administrator, classmate } = workshop;
    for (let n = 0; n < 60; n += 1) await note('signed in', classmate);
    const first = await listAudit(administrator, { person: 'carl' });
    const second = await listAudit(administrator, { person: 'carl' }, first.before);
    expect([first.entries.length, second.entries.length, second.before]).toEqual([50, 10, null]);
    const ids = [...first.entries, ...second.entries].map(({ id }) => Number(id));
    expect(ids).toEqual([...new Set(ids)].sort((one, other) => other - one));
  });

  it('is taken away as CSV without formulas, and that is a line of it', async () => {
    const { administrator } = workshop;
    const before = await countRows('audit_entries', "action = 'audit log taken away'");
    const csv = await takeAudit(administrator, { action: 'member added' });
    const lines = csv?.split('\r\n') ?? [];
    expect(lines[0]).toBe('\uFEFFat,who,did,about,whom or what,class,detail');
    expect(lines[1]).toMatch(/Lena Learner,member added,person,Lena Learner,The harbour,/);
    expect(await countRows('audit_entries', "action = 'audit log taken away'")).toBe(before + 1);
  });

  it('holds sign-ins that were refused, also of nobody who is known', async () => {
    const proof = { by: 'password', email: 'x@y.example', password: 'not it', from: null } as const;
    await createSession(proof, '', new Date());
    const { entries } = await listAudit(workshop.administrator, { action: 'sign-in refused' });
    expect(entries).toMatchObject([{ actorName: null, objectName: null }]);
  });
});

describe('an administrator', () => {
  it('cannot read a learner’s answers without a line of the log that says so', async () => {
    const { administrator, instructor, learner, harbour } = workshop;
    await setExercise(harbour, instructor, 'oval-from-pins');
    const round = await mustOpen(learner, 'oval-from-pins');
    const kept = await createAttempt(
      learner,
      await requestFor(round.roundId, 'right'),
      randomUUID(),
    );
    const attemptId = kept.outcome === 'kept' ? kept.reply.attempt.attemptId : '';
    const views = () =>
      countRows('audit_entries', `action = 'learner''s work viewed' and actor_id = $1`, [
        administrator.personId,
      ]);
    expect(await views()).toBe(0);
    expect(await findLearnerInClass(administrator, harbour, learner.learnerId)).not.toBeNull();
    expect(await views()).toBe(1);
    expect(await findAttemptInClass(administrator, harbour, attemptId)).not.toBeNull();
    expect(await views()).toBe(2);
    const line = await row<{ objectKind: string; classId: string }>(
      `select object_kind as "objectKind", class_id as "classId" from audit_entries
       where action = 'learner''s work viewed' order by id desc limit 1`,
    );
    expect(line?.classId).toBe(harbour);
    // An instructor reads their own class's work without one.
    const before = await countRows('audit_entries');
    await findAttemptInClass(instructor, harbour, attemptId);
    expect(await countRows('audit_entries')).toBe(before);
  });
});
