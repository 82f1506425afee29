import { z } from 'zod';
import type { ZodMiniType } from 'zod/mini';
import { sessionCookieName } from '@/lib/auth/cookie';
import { named, operations, type Operation } from './operations';

/** JSON that is already checked by whoever made it. */
type Json = Readonly<Record<string, unknown>>;

/** The API, described in OpenAPI 3.1 from the schemas that its handlers read and answer by. */
export function describeApi(): Json {
  const paths: Record<string, Record<string, unknown>> = {};
  for (const operation of operations) {
    paths[operation.path] = {
      ...paths[operation.path],
      [operation.method]: describeOperation(operation),
    };
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Hornbeam',
      version: '1',
      description:
        'What the pages of Hornbeam fetch and send. Writing requests must come from a page of the site (`Origin`) and are JSON; an unknown key is an error; errors are problem details (RFC 9457).',
    },
    servers: [{ url: '/' }],
    paths,
    components: {
      schemas: namedSchemas(),
      securitySchemes: {
        session: { type: 'apiKey', in: 'cookie', name: sessionCookieName() },
      },
    },
  };
}

function describeOperation(operation: Operation): Json {
  const { summary, signedIn, request, success } = operation;
  return {
    summary,
    security: signedIn ? [{ session: [] }] : [],
    parameters: parametersOf(operation),
    ...(request && {
      requestBody: { required: true, content: { 'application/json': { schema: refTo(request) } } },
    }),
    responses: {
      [success.status]: {
        description: 'As asked.',
        content: { 'application/json': { schema: refTo(success.schema) } },
      },
      ...Object.fromEntries(
        problemsOf(operation).map((status) => [
          status,
          {
            description: meanings[status] ?? 'It did not succeed.',
            content: { 'application/problem+json': { schema: refTo(named.Problem) } },
          },
        ]),
      ),
    },
  };
}

/** The path's own parameters, and the key of a request that may be repeated. */
function parametersOf({ path, idempotent }: Operation): Json[] {
  const inPath = [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => ({
    name,
    in: 'path',
    required: true,
    schema: { type: 'string' },
  }));
  const key = {
    name: 'Idempotency-Key',
    in: 'header',
    required: true,
    schema: { type: 'string', format: 'uuid' },
  };
  return idempotent ? [...inPath, key] : inPath;
}

/** Every problem that an operation can answer. */
export function problemsOf({ signedIn, request, problems = [] }: Operation): number[] {
  const always = signedIn ? [401, 500, 503] : [];
  const ofWriting = request ? [400, 403, 413, 415, 422] : [];
  return [...new Set([...always, ...ofWriting, ...problems])].sort((one, other) => one - other);
}

const meanings: Readonly<Record<number, string>> = {
  400: 'The body is not JSON, or a header is missing.',
  401: 'Nobody is signed in.',
  403: 'The request did not come from a page of this site.',
  404: 'It is not there, or not for whoever asks: the two look alike.',
  409: 'It has changed meanwhile.',
  413: 'The body is too large.',
  415: 'The body is not declared as JSON.',
  422: 'The body does not fit the schema, or cannot be read as an answer.',
  500: 'A surprise, which is in the log under the id given.',
  503: 'The records cannot be reached just now.',
};

const nameOfSchema = new Map<ZodMiniType, string>(
  Object.entries(named).map(([name, schema]) => [schema, name]),
);

function refTo(schema: ZodMiniType): unknown {
  const name = nameOfSchema.get(schema);
  return name === undefined ? plain(z.toJSONSchema(schema, options)) : { $ref: refOf(name) };
}

const refOf = (name: string) => `#/components/schemas/${name}`;
const options = { target: 'draft-2020-12', unrepresentable: 'any' } as const;

/** The named schemas, in which one refers to another by name. */
function namedSchemas(): Json {
  const registry = z.registry<{ id: string }>();
  for (const [id, schema] of Object.entries(named)) registry.add(schema, { id });
  const { schemas } = z.toJSONSchema(registry, { ...options, uri: refOf });
  return Object.fromEntries(Object.entries(schemas).map(([id, schema]) => [id, plain(schema)]));
}

/** Without the marks that a schema carries only when it stands alone. */
function plain(schema: object): Json {
  const { $schema: _dialect, $id: _id, ...rest } = { $schema: '', $id: '', ...schema };
  return rest;
}
