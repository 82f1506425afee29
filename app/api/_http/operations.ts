import * as z from 'zod/mini';
import { classProgressSchema } from '@/lib/schemas/class-progress';
import { problemSchema } from '@/lib/schemas/problem';
import {
  attemptReplySchema,
  attemptRequestSchema,
  helpRequestSchema,
  hintRequestSchema,
  pegViewSchema,
  roundRequestSchema,
  roundViewSchema,
} from '@/lib/schemas/round';

/** What one handler takes and answers; the description of the whole API is made of these. */
export interface Operation {
  readonly method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  /** The path as OpenAPI writes it. */
  readonly path: string;
  readonly summary: string;
  readonly signedIn: boolean;
  readonly request?: z.ZodMiniType;
  /** Must be sent: a UUID that makes repeating the request harmless. */
  readonly idempotent?: true;
  readonly success: { readonly status: number; readonly schema: z.ZodMiniType };
  /** The problems beside those that every operation of its kind can answer. */
  readonly problems?: readonly number[];
}

/** Schemas that have a name of their own in the description. */
export const named = {
  AttemptReply: attemptReplySchema,
  AttemptRequest: attemptRequestSchema,
  ClassProgress: classProgressSchema,
  HelpRequest: helpRequestSchema,
  HintRequest: hintRequestSchema,
  Peg: pegViewSchema,
  Problem: problemSchema,
  Round: roundViewSchema,
  RoundRequest: roundRequestSchema,
} as const;

const ok = (schema: z.ZodMiniType) => ({ status: 200, schema });

export const operations: readonly Operation[] = [
  {
    method: 'post',
    path: '/api/attempts',
    summary: 'Marks a response to a round and keeps it.',
    signedIn: true,
    idempotent: true,
    request: attemptRequestSchema,
    success: { status: 201, schema: attemptReplySchema },
    problems: [404, 409, 429],
  },
  {
    method: 'post',
    path: '/api/exercises/{id}/round',
    summary: 'Opens the round of whoever asks, or answers the one that is open.',
    signedIn: true,
    request: roundRequestSchema,
    success: ok(roundViewSchema),
    problems: [404],
  },
  {
    method: 'post',
    path: '/api/exercises/{id}/hints',
    summary: 'Takes a hint of a round by its number; asking again takes no more.',
    signedIn: true,
    request: hintRequestSchema,
    success: ok(roundViewSchema),
    problems: [404],
  },
  {
    method: 'post',
    path: '/api/exercises/{id}/solution',
    summary: 'Shows the worked solution of a round, which closes it.',
    signedIn: true,
    request: helpRequestSchema,
    success: ok(roundViewSchema),
    problems: [404],
  },
  {
    method: 'get',
    path: '/api/progress',
    summary: 'The pegs of whoever asks.',
    signedIn: true,
    success: ok(z.strictObject({ pegs: z.array(pegViewSchema) })),
  },
  {
    method: 'get',
    path: '/api/classes/{id}/progress',
    summary:
      'The progress of a class, for its instructors and the administrator; with ?names=hidden nothing of it tells who is who.',
    signedIn: true,
    success: ok(classProgressSchema),
    problems: [404, 422],
  },
  {
    method: 'get',
    path: '/api/health/live',
    summary: 'The process answers.',
    signedIn: false,
    success: ok(z.strictObject({ status: z.literal('live') })),
  },
  {
    method: 'get',
    path: '/api/health/ready',
    summary: 'The database answers too, and has the shape that the code expects.',
    signedIn: false,
    success: ok(z.strictObject({ status: z.literal('ready') })),
    problems: [503],
  },
  {
    method: 'get',
    path: '/api/openapi.json',
    summary: 'This description.',
    signedIn: false,
    success: ok(z.looseObject({ openapi: z.string() })),
  },
];
