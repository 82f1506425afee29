import ICAL from 'ical.js';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { GET as getCalendar } from '@/app/api/calendar/[secret]/route';
import {
  endCalendarAddress,
  findCalendarAddress,
  makeCalendarAddress,
} from '@/lib/data/calendar-address';
import { writeCalendar, type DueEvent } from '@/lib/calendar/write-calendar';
import { rows } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { models } from '@/models';
import {
  countRows,
  makeViewer,
  openWorkshop,
  setExercise,
  type Workshop,
} from '../support/workshop';

let workshop: Workshop;
beforeAll(async () => {
  workshop = await openWorkshop();
});
afterAll(() => workshop.close());
beforeEach(async () => {
  await rows('delete from extensions returning assignment_id');
  await rows('delete from assignment_items returning id');
  await rows('delete from assignments returning id');
});

const days = (n: number) => new Date(Math.floor(Date.now() / 60_000) * 60_000 + n * 86_400_000);

async function set(dueAt: Date, rules: { opensAt?: Date } = {}, where = workshop.harbour) {
  const itemId = await setExercise(where, workshop.instructor, 'oval-from-pins', {
    dueAt,
    ...rules,
  });
  const item = await models().AssignmentItem.findByPk(itemId, { rejectOnEmpty: true });
  return item.assignmentId;
}

function ask(address: string, headers: HeadersInit = {}): Promise<Response> {
  const secret = address.split('/').at(-1) ?? '';
  return getCalendar(new Request(address, { headers }), { params: Promise.resolve({ secret }) });
}

/** The feed as a calendar program reads it. */
function read(body: string) {
  return new ICAL.Component(ICAL.parse(body) as unknown[])
    .getAllSubcomponents('vevent')
    .map((component) => {
      const event = new ICAL.Event(component);
      return {
        uid: event.uid,
        sequence: event.sequence,
        start: event.startDate.toJSDate().toISOString(),
        summary: event.summary,
        description: event.description,
        status: component.getFirstPropertyValue('status'),
        url: component.getFirstPropertyValue('url'),
      };
    });
}

async function feedOf(viewer: Viewer) {
  const answer = await ask(await makeCalendarAddress(viewer));
  expect(answer.status).toBe(200);
  return read(await answer.text());
}

describe('a calendar address', () => {
  it('is shown once, kept as a hash, renewed and ended by its person', async () => {
    const { learner } = workshop;
    expect(await findCalendarAddress(learner)).toBeNull();
    expect(await endCalendarAddress(learner)).toBe(false);
    const first = await makeCalendarAddress(learner);
    expect(first).toMatch(/^http:\/\/127\.0\.0\.1:5455\/api\/calendar\/[\w-]{43}$/);
    const secret = first.split('/').at(-1) ?? '';
    expect(await countRows('calendar_addresses c', 'c::text like $1', [`%${secret}%`])).toBe(0);
    expect(await findCalendarAddress(learner)).toMatch(/^\d{4}-/);
    expect((await ask(first)).status).toBe(200);
    const second = await makeCalendarAddress(learner);
    expect((await ask(first)).status).toBe(404);
    expect((await ask(second)).status).toBe(200);
    expect(await endCalendarAddress(learner)).toBe(true);
    expect((await ask(second)).status).toBe(404);
    expect(
      await countRows('audit_entries', "action like 'calendar address %' and actor_id = $1", [
        learner.personId,
      ]),
    ).toBe(3);
  });

  it('that nobody has, or whose person is disabled, leads nowhere', async () => {
    const viewer = await makeViewer('Dina Disabled', [[workshop.harbour, 'learner']]);
    const address = await makeCalendarAddress(viewer);
    await models().Person.update({ disabledAt: new Date() }, { where: { id: viewer.personId } });
    for (const wrong of [address, `${address}x`, 'http://127.0.0.1:5455/api/calendar/nothing']) {
      const answer = await ask(wrong);
      expect(answer.status).toBe(404);
      expect(answer.headers.get('content-type')).toBe('application/problem+json');
      expect(answer.headers.get('cache-control')).toBe('no-store');
    }
  });
});

describe('a calendar feed', () => {
  it('holds what has opened to the learner, and what is set to the classes of an instructor', async () => {
    const dueAt = days(7);
    const open = await set(dueAt);
    const later = await set(days(9), { opensAt: days(2) });
    await set(days(3), {}, workshop.quay);
    const { learner, instructor, otherInstructor, administrator } = workshop;
    expect(await feedOf(learner)).toEqual([
      {
        uid: open,
        sequence: 0,
        start: dueAt.toISOString(),
        summary: expect.stringMatching(/^The harbour: [A-Z]/) as string,
        description: expect.stringMatching(/^[A-Z]/) as string,
        status: 'CONFIRMED',
        url: 'http://127.0.0.1:5455/today',
      },
    ]);
    const taught = await feedOf(instructor);
    expect(taught.map(({ uid }) => uid)).toEqual([open, later]);
    expect(taught[0]?.url).toBe(`http://127.0.0.1:5455/classes/${workshop.harbour}`);
    expect(await feedOf(otherInstructor)).toHaveLength(1);
    expect(await feedOf(administrator)).toEqual([]);
  });

  it('follows extensions, edits and withdrawals under the same name with a growing number', async () => {
    const { learner, classmate, instructor } = workshop;
    const id = await set(days(7));
    const entry = async (of: Viewer) => {
      const [event] = await feedOf(of);
      return [event?.uid, event?.sequence, event?.start, event?.status];
    };
    const start = days(7).toISOString();
    expect(await entry(learner)).toEqual([id, 0, start, 'CONFIRMED']);
    const note = (action: string) =>
      rows(
        `insert into audit_entries (actor_id, action, object_kind, object_id, class_id, detail)
         values ($1, $2, 'learner', $3, $4, jsonb_build_object('assignment', $5::text))
         returning 1 as n`,
        [instructor.personId, action, learner.learnerId, workshop.harbour, id],
      );
    await rows(
      `insert into extensions (assignment_id, learner_id, due_at, given_by)
       values ($1, $2, $3, $4) returning 1 as n`,
      [id, learner.learnerId, days(10), instructor.personId],
    );
    await note('extension given');
    expect(await entry(learner)).toEqual([id, 1, days(10).toISOString(), 'CONFIRMED']);
    expect(await entry(classmate)).toEqual([id, 0, start, 'CONFIRMED']);
    await rows('delete from extensions returning 1 as n');
    await note('extension taken back');
    expect(await entry(learner)).toEqual([id, 2, start, 'CONFIRMED']);
    await rows(
      `update assignments set due_at = $2, version = version + 1, updated_at = now()
       where id = $1 returning id`,
      [id, days(8)],
    );
    expect(await entry(learner)).toEqual([id, 3, days(8).toISOString(), 'CONFIRMED']);
    await rows(
      `update assignments set withdrawn_at = now(), version = version + 1, updated_at = now()
       where id = $1 returning id`,
      [id],
    );
    expect(await entry(learner)).toEqual([id, 4, days(8).toISOString(), 'CANCELLED']);
    expect(await entry(classmate)).toEqual([id, 2, days(8).toISOString(), 'CANCELLED']);
  });

  it('holds nothing for those who were not chosen or have left', async () => {
    const { harbour, learner } = workshop;
    const left = await makeViewer('Lou Left', [[harbour, 'learner']]);
    const id = await set(days(7));
    expect(await feedOf(left)).toHaveLength(1);
    await rows(
      'update memberships set left_at = greatest(now(), joined_at) where person_id = $1 returning id',
      [left.personId],
    );
    expect(await feedOf(left)).toEqual([]);
    await models().Assignment.update({ forChosenLearners: true }, { where: { id } });
    expect(await feedOf(learner)).toEqual([]);
  });

  it('is kept by the asker alone and answered once for one version', async () => {
    const { learner } = workshop;
    await set(days(7));
    const address = await makeCalendarAddress(learner);
    const first = await ask(address);
    expect(first.headers.get('content-type')).toBe('text/calendar; charset=utf-8');
    expect(first.headers.get('cache-control')).toBe('private, no-cache');
    const etag = first.headers.get('etag') ?? '';
    for (const known of [etag, `W/${etag}`, `"other", ${etag}`]) {
      const again = await ask(address, { 'If-None-Match': known });
      expect(again.status).toBe(304);
      expect(await again.text()).toBe('');
      expect(again.headers.get('etag')).toBe(etag);
    }
    await set(days(8));
    expect((await ask(address, { 'If-None-Match': etag })).status).toBe(200);
  });
});

describe('the calendar as it is written', () => {
  const event: DueEvent = {
    uid: '7b0f6f0e-52c1-4c3b-9a33-0d6c5b3c1a10',
    sequence: 3,
    changedAt: new Date('2026-10-01T09:00:00Z'),
    dueAt: new Date('2026-10-25T00:30:00Z'),
    summary: 'Tuesday; evening, \\ class: “Ovals” — größer, wider, longer than seventy-five octets',
    description: 'One\nTwo; three, four',
    url: 'https://workshop.example/today',
    cancelled: false,
  };

  it('reads back the same moments on both sides of a clock change', () => {
    const later = { ...event, uid: 'b', dueAt: new Date('2026-10-25T01:30:00Z') };
    const spring = { ...event, uid: 'c', dueAt: new Date('2026-03-29T01:30:00Z') };
    const back = read(writeCalendar([event, later, spring]));
    // 01:30 by London's clocks comes twice on that night: an hour lies between the two.
    expect(back.map(({ start }) => start)).toEqual([
      '2026-10-25T00:30:00.000Z',
      '2026-10-25T01:30:00.000Z',
      '2026-03-29T01:30:00.000Z',
    ]);
    const zone = { timeZone: 'Europe/London', timeStyle: 'short', hourCycle: 'h23' } as const;
    const shown = back.map(({ start }) =>
      new Intl.DateTimeFormat('en-GB', zone).format(new Date(start)),
    );
    expect(shown).toEqual(['01:30', '01:30', '02:30']);
  });

  it('keeps to lines of 75 octets ended by CR LF, and loses no character', () => {
    const body = writeCalendar([event]);
    expect(body.replaceAll('\r\n', '')).not.toMatch(/[\r\n]/);
    for (const line of body.split('\r\n')) expect(Buffer.byteLength(line)).toBeLessThanOrEqual(75);
    expect(read(body)).toMatchObject([
      { summary: event.summary, description: event.description, sequence: 3 },
    ]);
    expect(body).toContain('TRANSP:TRANSPARENT');
    expect(writeCalendar([event])).toBe(body);
  });

  it('marks what was withdrawn as cancelled', () => {
    const [back] = read(writeCalendar([{ ...event, summary: 'Ovals', cancelled: true }]));
    expect(back).toMatchObject({
      status: 'CANCELLED',
      summary: 'Withdrawn: Ovals',
      uid: event.uid,
    });
  });
});
