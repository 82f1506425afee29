import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { signOutByForm } from '../../scripts/machine/sign-in.mjs';
import { methodsOf, readBuilt, type Built } from '../security/built';
import {
  ask,
  callAction,
  outcomeOfAction,
  outcomeOfPage,
  ways,
  type Answer,
} from '../security/call';
import { undescribed } from '../security/described';
import {
  nameOf,
  persons,
  type ActionRow,
  type HandlerRow,
  type PageRow,
  type Person,
} from '../security/endpoint';
import { endpoints } from '../security/endpoints';
import { cookieOf, plantWorkshop, type Planted } from '../security/planted';
import { matrixBuild } from '../support/matrix-build';
import { openOwnSite, type OwnSite } from '../support/own-site';

/**
 * Who gets what from every page, route handler and server action of the production build. With
 * `HORNBEAM_WITHOUT_PROXY=1` the build has no proxy.ts: nothing of it may depend on that file.
 */
const build = matrixBuild();
let built: Built;
let site: OwnSite;
let planted: Planted;

beforeAll(async () => {
  build.make();
  built = readBuilt(build.output);
  site = await openOwnSite(build.distDir, build.folder);
  planted = await plantWorkshop();
  // A build without proxy.ts is made from nothing.
}, 1_200_000);
afterAll(() => site.close());

const pages = endpoints.filter((row): row is PageRow => row.kind === 'page');
const handlers = endpoints.filter((row): row is HandlerRow => row.kind === 'handler');
const actions = endpoints.filter((row): row is ActionRow => row.kind === 'action');
const readers = handlers.filter(({ method }) => method === 'GET');
const titled = <Row extends PageRow | HandlerRow | ActionRow>(rows: readonly Row[]) =>
  rows.map((row, position) => [`${nameOf(row)} (${position + 1})`, row] as const);

const pathOf = (row: PageRow | HandlerRow) => row.at?.(planted) ?? row.route;

/** What an answer holds that this person may not see; what they typed themselves comes back to them. */
function foreignIn({ body }: Answer, person: Person, typed: readonly string[] = []): string[] {
  return Object.values(planted.canaries)
    .filter(({ text, mayBeSeenBy }) => !mayBeSeenBy.includes(person) && body.includes(text))
    .filter(({ text }) => !typed.includes(text))
    .map(({ text }) => text);
}

function requestOf(row: HandlerRow, cookie: string): RequestInit {
  return {
    method: row.method,
    headers: {
      cookie,
      ...(row.body ? { origin: site.address, 'content-type': 'application/json' } : {}),
      ...row.headers?.(planted),
    },
    ...(row.body ? { body: JSON.stringify(row.body(planted)) } : {}),
  };
}

describe('the build and the table', () => {
  it('name the same endpoints', () => {
    const found = [
      ...built.pages.map((route) => `page ${route}`),
      ...built.handlers.flatMap((route) => methodsOf(route).map((method) => `${method} ${route}`)),
      ...built.actions.map(({ file, name }) => `action ${file} ${name}`),
    ];
    expect([...new Set(endpoints.map(nameOf))].sort()).toEqual([...new Set(found)].sort());
    console.info(`${new Set(found).size} endpoints × ${persons.length} persons`);
  });
});

describe.each(titled(pages))('%s', (_title, row) => {
  it.each(Object.entries(ways))(
    'shows each person what is theirs, asked %s',
    async (way, headers) => {
      for (const person of persons) {
        const cookie = planted.cookies[person];
        const answer = await ask(`${site.address}${pathOf(row)}`, {
          headers: { cookie, ...headers },
        });
        expect(foreignIn(answer, person), `${person}: foreign`).toEqual([]);
        expect(answer.headers.get('cache-control'), person).toContain('no-store');
        if (way === 'as a prefetch') continue;
        expect(outcomeOfPage(answer), person).toBe(row.outcome[person]);
        if (row.outcome[person] === 'shown' && row.holds) {
          expect(answer.body, person).toContain(row.holds(planted));
        }
      }
    },
  );
});

describe.each(titled(handlers))('%s', (_title, row) => {
  it('answers each person what is theirs', async () => {
    for (const person of persons) {
      const answer = await ask(
        `${site.address}${pathOf(row)}`,
        requestOf(row, planted.cookies[person]),
      );
      expect(answer.status, `${person}: ${answer.body.slice(0, 300)}`).toBe(row.outcome[person]);
      expect(foreignIn(answer, person), `${person}: foreign`).toEqual([]);
      if (!row.foreign) expect(undescribed(row, answer), person).toEqual([]);
      if (!row.bare) expect(answer.headers.get('cache-control'), person).toContain('no-store');
    }
  });
});

describe.each(titled(actions))('%s', (_title, row) => {
  const actionOf = () => {
    const found = built.actions.find(({ file, name }) => file === row.file && name === row.name);
    if (!found) throw new Error(`${nameOf(row)} is not in the build`);
    return found;
  };
  const call = (person: Person, headers: Readonly<Record<string, string>>) =>
    callAction(site.address, planted, {
      row,
      built: actionOf(),
      headers: { cookie: planted.cookies[person], ...headers },
    });

  it('does for each person what is theirs to do', async () => {
    const typed = Object.values(row.form?.(planted) ?? {});
    for (const person of persons) {
      const answer = await call(person, { origin: site.address });
      expect(outcomeOfAction(answer), `${person}: ${answer.body.slice(0, 600)}`).toBe(
        row.outcome[person],
      );
      expect(foreignIn(answer, person, typed), `${person}: foreign`).toEqual([]);
    }
  });

  it('does for a request of unknown origin what it does for nobody', async () => {
    expect(outcomeOfAction(await call('administrator', {}))).toBe(row.outcome.anonymous);
  });

  it('does nothing for a page of another site', async () => {
    for (const origin of ['https://elsewhere.example', 'null']) {
      const answer = await call('administrator', { origin });
      expect(answer.status, origin).toBe(500);
      expect(answer.body, origin).not.toMatch(/"outcome"|\bat .*\.(ts|js)/);
    }
  });
});

describe('a cookie kept after signing out', () => {
  it('is worth what no cookie is worth, everywhere', async () => {
    const cookie = await cookieOf(planted.viewers.administrator.personId);
    await signOutByForm(site.address, cookie);
    for (const row of pages) {
      for (const headers of Object.values(ways)) {
        const answer = await ask(`${site.address}${pathOf(row)}`, {
          headers: { cookie, ...headers },
        });
        expect(foreignIn(answer, 'anonymous'), nameOf(row)).toEqual([]);
        if (!('Next-Router-Prefetch' in headers)) {
          expect(outcomeOfPage(answer), nameOf(row)).toBe(row.outcome.anonymous);
        }
      }
    }
    for (const row of handlers) {
      const answer = await ask(`${site.address}${pathOf(row)}`, requestOf(row, cookie));
      expect(answer.status, nameOf(row)).toBe(row.outcome.anonymous);
    }
  });
});

const writers = handlers.filter((row) => row.body !== undefined && !row.foreign);
describe.each(titled(writers))('%s, written to wrongly,', (_title, row) => {
  const send = (headers: Record<string, string | null>, body?: string) => {
    const request = requestOf(row, planted.cookies['learner of the class']);
    const all = new Headers(request.headers);
    for (const [name, value] of Object.entries(headers)) {
      if (value === null) all.delete(name);
      else all.set(name, value);
    }
    return ask(`${site.address}${pathOf(row)}`, {
      ...request,
      headers: all,
      body: body ?? (request.body as string),
    });
  };
  const badBodies = () => ({
    '{': 400,
    '': 400,
    null: 422,
    '[]': 422,
    '{"unknown":1}': 422,
    [JSON.stringify({ ...(row.body?.(planted) as object), isAdministrator: true })]: 422,
    [`"${'x'.repeat(70_000)}"`]: 413,
  });

  it.each([null, 'null', 'https://elsewhere.example', 'http://127.0.0.1:1'])(
    'from the origin %s, answers a problem and does nothing',
    async (origin) => {
      const answer = await send({ origin });
      expect(answer.status).toBe(403);
      expect(undescribed(row, answer)).toEqual([]);
    },
  );

  it.each([null, 'text/plain', 'multipart/form-data', 'application/x-www-form-urlencoded'])(
    'as %s, answers a problem and does nothing',
    async (type) => {
      const answer = await send({ 'content-type': type });
      expect(answer.status).toBe(415);
      expect(undescribed(row, answer)).toEqual([]);
    },
  );

  it('with a body that does not fit, says so and shows nothing of the code', async () => {
    for (const [body, status] of Object.entries(badBodies())) {
      const answer = await send({}, body);
      expect(answer.status, body.slice(0, 80)).toBe(status);
      expect(undescribed(row, answer), body.slice(0, 80)).toEqual([]);
      expect(answer.body).not.toMatch(/\bat .*\.(ts|js)/);
    }
  });
});

describe('reading handlers', () => {
  it('take no other method', async () => {
    for (const row of readers) {
      const exported = methodsOf(row.route);
      for (const method of ['POST', 'PUT', 'PATCH', 'DELETE'].filter(
        (m) => !exported.includes(m),
      )) {
        const answer = await ask(`${site.address}${pathOf(row)}`, {
          method,
          headers: { cookie: planted.cookies.administrator, origin: site.address },
        });
        expect(answer.status, `${method} ${row.route}`).toBe(405);
      }
    }
  });
});
