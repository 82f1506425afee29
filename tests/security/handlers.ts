import { randomUUID } from 'node:crypto';
import { forEverybody, forSignedIn, only, staffOfTheClass, type HandlerRow } from './endpoint';
import { wrongResponse } from './planted';

/** Every route handler and method, and the status that it answers each person. */
export const handlers: readonly HandlerRow[] = [
  {
    kind: 'handler',
    method: 'GET',
    route: '/api/floor',
    outcome: forEverybody(200),
    foreign: true,
    bare: true,
  },
  {
    kind: 'handler',
    method: 'POST',
    route: '/api/floor',
    body: () => ({}),
    outcome: forEverybody(200),
    foreign: true,
    bare: true,
  },
  { kind: 'handler', method: 'GET', route: '/api/openapi.json', outcome: forEverybody(200) },
  { kind: 'handler', method: 'GET', route: '/api/health/live', outcome: forEverybody(200) },
  { kind: 'handler', method: 'GET', route: '/api/health/ready', outcome: forEverybody(200) },
  {
    kind: 'handler',
    method: 'GET',
    route: '/api/auth/[...nextauth]',
    at: () => '/api/auth/session',
    outcome: forEverybody(200),
    foreign: true,
  },
  {
    // Without the token of next-auth's own form nobody is signed out.
    kind: 'handler',
    method: 'POST',
    route: '/api/auth/[...nextauth]',
    at: () => '/api/auth/signout',
    body: () => ({}),
    outcome: forEverybody(302),
    foreign: true,
  },
  { kind: 'handler', method: 'GET', route: '/api/progress', outcome: forSignedIn(200, 401) },
  {
    kind: 'handler',
    method: 'GET',
    route: '/api/classes/[id]/progress',
    at: ({ classId }) => `/api/classes/${classId}/progress`,
    outcome: only(staffOfTheClass, 200, 404, 401),
  },
  {
    kind: 'handler',
    method: 'GET',
    route: '/api/classes/[id]/progress',
    at: () => '/api/classes/not-an-id/progress',
    outcome: forSignedIn(404, 401),
  },
  {
    kind: 'handler',
    method: 'POST',
    route: '/api/exercises/[id]/round',
    at: () => '/api/exercises/oval-from-pins/round',
    body: () => ({}),
    outcome: forSignedIn(200, 401),
  },
  {
    kind: 'handler',
    method: 'POST',
    route: '/api/exercises/[id]/hints',
    at: ({ round }) => `/api/exercises/${round.exerciseId}/hints`,
    body: ({ round }) => ({ roundId: round.roundId, hint: 1 }),
    outcome: only(['learner of the class'], 200, 404, 401),
  },
  {
    kind: 'handler',
    method: 'POST',
    route: '/api/attempts',
    body: ({ round }) => ({ roundId: round.roundId, response: wrongResponse }),
    headers: () => ({ 'idempotency-key': randomUUID() }),
    outcome: only(['learner of the class'], 201, 404, 401),
  },
  {
    kind: 'handler',
    method: 'POST',
    route: '/api/exercises/[id]/solution',
    at: ({ roundToShow }) => `/api/exercises/${roundToShow.exerciseId}/solution`,
    body: ({ roundToShow }) => ({ roundId: roundToShow.roundId }),
    outcome: only(['learner of the class'], 200, 404, 401),
  },
];
