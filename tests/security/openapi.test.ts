import { Validator } from '@seriousme/openapi-schema-validator';
import { beforeAll, describe, expect, it } from 'vitest';
import { describeApi } from '@/app/api/_http/openapi';
import { operations } from '@/app/api/_http/operations';
import { forgetEnvironment } from '@/lib/env';
import { pathOf, undescribed } from './described';
import { handlers } from './handlers';

beforeAll(() => {
  process.env.NEXTAUTH_URL = 'http://127.0.0.1:5455';
  process.env.NEXTAUTH_SECRET = 'a secret of the tests, long enough to be taken';
  process.env.SMTP_URL = 'smtp://127.0.0.1:1';
  process.env.MAIL_FROM = 'Hornbeam <hornbeam@localhost>';
  forgetEnvironment();
});

describe('the description of the API', () => {
  it('is OpenAPI 3.1 by the standard’s own schema', async () => {
    const result = await new Validator().validate(structuredClone({ ...describeApi() }));
    expect(result.errors).toBeUndefined();
    expect(result.valid).toBe(true);
  });

  it('describes every handler of ours, and no other', () => {
    const described = operations.map(({ method, path }) => `${method.toUpperCase()} ${path}`);
    const ours = handlers
      .filter(({ foreign }) => !foreign)
      .map(({ method, route }) => `${method} ${pathOf(route)}`);
    expect([...new Set(described)].sort()).toEqual([...new Set(ours)].sort());
    expect(new Set(described).size).toBe(described.length);
  });

  it('lets nothing pass that it does not name', () => {
    const row = handlers.find(({ route }) => route === '/api/health/live');
    if (!row) throw new Error('There is no health handler.');
    const answer = (status: number, type: string, body: unknown) =>
      undescribed(row, {
        status,
        headers: new Headers({ 'content-type': type }),
        body: JSON.stringify(body),
      });
    expect(answer(200, 'application/json', { status: 'live' })).toEqual([]);
    expect(answer(200, 'application/json', { status: 'live', more: 1 })).toHaveLength(1);
    expect(answer(200, 'application/json', { status: 'ready' })).toHaveLength(1);
    expect(answer(200, 'text/html', { status: 'live' })).toHaveLength(1);
    expect(answer(418, 'application/problem+json', {})).toHaveLength(1);
  });
});
