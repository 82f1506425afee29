import { z } from 'zod';

/**
 * The environment, as a schema that is read once, when it is first needed. A message names
 * every variable that is missing or malformed, and never shows a value.
 */

const postgresAddress = z
  .url({ protocol: /^postgres(ql)?$/, error: 'must be an address such as postgres://…' })
  .describe('where the records are');

const databaseSchema = z.object({
  DATABASE_URL: postgresAddress,
  DATABASE_MIGRATION_URL: postgresAddress.optional(),
  DATABASE_POOL: z.coerce.number().int().min(1).max(200).default(10),
});

const siteSchema = z.object({
  NEXTAUTH_URL: z
    .url({ protocol: /^https?$/, error: 'must be the address of the site' })
    .refine((address) => address.startsWith('https:') || isLoopback(address), {
      error: 'must begin with https:// unless the site is on this machine only',
    }),
  NEXTAUTH_SECRET: z.string().min(32, { error: 'must have at least 32 characters' }),
  TRUSTED_PROXIES: z.coerce.number().int().min(0).max(5).default(0),
  SMTP_URL: z.url({ protocol: /^smtps?$/, error: 'must be an address such as smtp://…' }),
  MAIL_FROM: z.string().min(3),
});

const storageSchema = z.object({
  S3_ENDPOINT: z.url({ protocol: /^https?$/ }),
  S3_REGION: z.string().min(1).default('us-east-1'),
  S3_BUCKET: z.string().min(1),
  S3_ACCESS_KEY_ID: z.string().min(1),
  S3_SECRET_ACCESS_KEY: z.string().min(1),
});

/** What a connection to the database needs. */
export interface DatabaseEnvironment {
  readonly url: string;
  /** The owner's address, for migrations; the same as `url` unless another is given. */
  readonly migrationUrl: string;
  /** The role that runs the application, when it is not the owner itself. */
  readonly applicationRole: string | undefined;
  /** The largest number of connections that one process opens. */
  readonly pool: number;
}

/** What the site needs beside its database. */
export interface SiteEnvironment {
  /** The address under which people reach the site, without a final slash. */
  readonly address: string;
  readonly secure: boolean;
  readonly secret: string;
  /** How many proxies stand in front and write the caller's address. */
  readonly trustedProxies: number;
  readonly mail: { readonly url: string; readonly from: string };
}

/** Says what is missing or malformed in the environment. */
export class EnvironmentError extends Error {
  override name = 'EnvironmentError';
}

type Source = Readonly<Record<string, string | undefined>>;

const duringBuild: Source = {
  DATABASE_URL: 'postgres://build@127.0.0.1:1/build',
  NEXTAUTH_URL: 'http://127.0.0.1:1',
  NEXTAUTH_SECRET: 'only-while-the-pages-are-being-built',
  SMTP_URL: 'smtp://127.0.0.1:1',
  MAIL_FROM: 'build@localhost',
};

let database: DatabaseEnvironment | undefined;
let site: SiteEnvironment | undefined;

/** The database's part of the environment. Throws `EnvironmentError`. */
export function databaseEnvironment(): DatabaseEnvironment {
  database ??= readDatabaseEnvironment(currentSource());
  return database;
}

/** The site's part of the environment. Throws `EnvironmentError`. */
export function siteEnvironment(): SiteEnvironment {
  site ??= readSiteEnvironment(currentSource());
  return site;
}

/** The part of the site's environment that one-time links need. Throws `EnvironmentError`. */
export function linkEnvironment(): Pick<SiteEnvironment, 'address' | 'secret'> {
  const read = parse(
    siteSchema.pick({ NEXTAUTH_URL: true, NEXTAUTH_SECRET: true }),
    currentSource(),
  );
  return { address: withoutSlash(read.NEXTAUTH_URL), secret: read.NEXTAUTH_SECRET };
}

/** Forgets what was read, so that a test can change the environment. */
export function forgetEnvironment(): void {
  database = undefined;
  site = undefined;
}

/** Reads everything at once, so that one message names everything that is wrong. */
export function checkEnvironment(source: Source = currentSource()): void {
  const complaints = [databaseSchema, siteSchema].flatMap((schema) => complaintsOf(schema, source));
  if (Object.keys(storageSchema.shape).some((name) => source[name])) {
    complaints.push(...complaintsOf(storageSchema, source));
  }
  if (complaints.length > 0) throw refused(complaints);
}

/** Reads the database's part of `source`. Throws `EnvironmentError`. */
export function readDatabaseEnvironment(source: Source): DatabaseEnvironment {
  const read = parse(databaseSchema, source);
  const migrationUrl = read.DATABASE_MIGRATION_URL ?? read.DATABASE_URL;
  const role = decodeURIComponent(new URL(read.DATABASE_URL).username);
  const owner = decodeURIComponent(new URL(migrationUrl).username);
  return {
    url: read.DATABASE_URL,
    migrationUrl,
    applicationRole: role !== '' && role !== owner ? role : undefined,
    pool: read.DATABASE_POOL,
  };
}

/** Reads the site's part of `source`. Throws `EnvironmentError`. */
export function readSiteEnvironment(source: Source): SiteEnvironment {
  const read = parse(siteSchema, source);
  return {
    address: withoutSlash(read.NEXTAUTH_URL),
    secure: read.NEXTAUTH_URL.startsWith('https:'),
    secret: read.NEXTAUTH_SECRET,
    trustedProxies: read.TRUSTED_PROXIES,
    mail: { url: read.SMTP_URL, from: read.MAIL_FROM },
  };
}

function currentSource(): Source {
  return process.env.NEXT_PHASE === 'phase-production-build' ? duringBuild : process.env;
}

function parse<Schema extends z.ZodObject>(schema: Schema, source: Source): z.output<Schema> {
  const result = schema.safeParse(given(source));
  if (!result.success) throw refused(complaintsOf(schema, source));
  return result.data;
}

function complaintsOf(schema: z.ZodObject, source: Source): string[] {
  const values = given(source);
  const result = schema.safeParse(values);
  if (result.success) return [];
  return result.error.issues.map((issue) => {
    const name = String(issue.path[0]);
    return values[name] === undefined ? `${name} is missing` : `${name} ${reason(issue.message)}`;
  });
}

function reason(message: string): string {
  return message.startsWith('must') ? message : `is malformed (${message})`;
}

/** An empty variable counts as one that is not set. */
function given(source: Source): Source {
  return Object.fromEntries(Object.entries(source).filter(([, value]) => value !== ''));
}

function refused(complaints: readonly string[]): EnvironmentError {
  return new EnvironmentError(`The environment is not complete: ${complaints.join('; ')}.`);
}

function withoutSlash(address: string): string {
  return address.replace(/\/+$/, '');
}

function isLoopback(address: string): boolean {
  return ['127.0.0.1', 'localhost', '[::1]'].includes(new URL(address).hostname);
}
