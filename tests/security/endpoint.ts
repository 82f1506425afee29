import type { Planted } from './planted';

/** Who asks: every endpoint is tried as each of them. */
export const persons = [
  'anonymous',
  'learner of the class',
  'learner of another',
  'instructor of the class',
  'instructor of another',
  'administrator',
  'disabled account',
] as const;
export type Person = (typeof persons)[number];

/** What asking for a page comes to; `sent on` is a redirection to anywhere but signing in. */
export type PageOutcome = 'shown' | 'missing' | 'forbidden' | 'sign in' | 'sent on';

/** What calling a server action comes to, as the state that it answers tells. */
export type ActionOutcome = 'done' | 'refused' | 'sign in' | 'sent on';

type ByPerson<Outcome> = Readonly<Record<Person, Outcome>>;

/** A page: `route` as the build names it, `at` where it is asked for. */
export interface PageRow {
  readonly kind: 'page';
  readonly route: string;
  readonly at?: (planted: Planted) => string;
  readonly outcome: ByPerson<PageOutcome>;
  /** Something that stands on the page when it is shown, so that an empty one does not pass. */
  readonly holds?: (planted: Planted) => string;
}

/** One method of a route handler, with the status that it answers. */
export interface HandlerRow {
  readonly kind: 'handler';
  readonly method: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  readonly route: string;
  readonly at?: (planted: Planted) => string;
  readonly outcome: ByPerson<number>;
  /** The JSON that a writing handler is sent. */
  readonly body?: (planted: Planted) => unknown;
  readonly headers?: (planted: Planted) => Readonly<Record<string, string>>;
  /** Of another form than ours: no JSON, no problem details; only who gets what is tried. */
  readonly foreign?: true;
  /** Holds nothing of anybody's: it may be kept by whoever asks. */
  readonly bare?: true;
}

/** A server action: `file` and `name` as the build knows it. */
export interface ActionRow {
  readonly kind: 'action';
  readonly file: string;
  readonly name: string;
  /** A page that mounts it. */
  readonly on: (planted: Planted) => string;
  /** What is bound to it before the form: fresh for every call. */
  readonly bound?: (planted: Planted) => readonly unknown[] | Promise<readonly unknown[]>;
  /** The fields of the form; `null` for an action that takes only what is bound. */
  readonly form: ((planted: Planted) => Readonly<Record<string, string>>) | null;
  readonly outcome: ByPerson<ActionOutcome>;
}

export type Endpoint = PageRow | HandlerRow | ActionRow;

/** The same for everybody. */
export function forEverybody<Outcome>(outcome: Outcome): ByPerson<Outcome> {
  return only(persons, outcome, outcome, outcome);
}

/** One thing for who is signed in, another for who is not, or no longer. */
export function forSignedIn<Outcome>(outcome: Outcome, signedOut: Outcome): ByPerson<Outcome> {
  return only(persons, outcome, outcome, signedOut);
}

/** For these persons; else for the others who are signed in; else for who is not, or no longer. */
export function only<Outcome>(
  allowed: readonly Person[],
  outcome: Outcome,
  otherwise: Outcome,
  signedOut: Outcome,
): ByPerson<Outcome> {
  const of = (person: Person): Outcome => {
    if (person === 'anonymous' || person === 'disabled account') return signedOut;
    return allowed.includes(person) ? outcome : otherwise;
  };
  return {
    anonymous: of('anonymous'),
    'learner of the class': of('learner of the class'),
    'learner of another': of('learner of another'),
    'instructor of the class': of('instructor of the class'),
    'instructor of another': of('instructor of another'),
    administrator: of('administrator'),
    'disabled account': of('disabled account'),
  };
}

/** Whoever teaches the class, and the administrator. */
export const staffOfTheClass: readonly Person[] = ['instructor of the class', 'administrator'];

/** Whoever teaches any class, and the administrator. */
export const anyStaff: readonly Person[] = [...staffOfTheClass, 'instructor of another'];

/** What an endpoint is called: for pages and handlers the route, for actions file and name. */
export function nameOf(endpoint: Endpoint): string {
  switch (endpoint.kind) {
    case 'page':
      return `page ${endpoint.route}`;
    case 'handler':
      return `${endpoint.method} ${endpoint.route}`;
    case 'action':
      return `action ${endpoint.file} ${endpoint.name}`;
  }
}
