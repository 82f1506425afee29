/**
 * What passes between the browser and the server about a round: the round as a learner sees it, the
 * response sent, the attempt that comes back. Written with zod/mini, so that the browser can check
 * what it holds at little weight. Strict throughout: a field that is not named here does not pass.
 */
import * as z from 'zod/mini';
import { dimensions, units } from '@/lib/quantities/units';
import { unitSystems } from '@/lib/quantities/unit-system';

/** The longest answer that is read; anything longer is refused before it is looked at. */
export const answerLength = 60;

const name = z.string().check(z.maxLength(40), z.regex(/^[a-z][a-zA-Z0-9-]*$/));
const typed = z.string().check(z.maxLength(answerLength));

/** A bench as plain data; `lib/scene/bench-spec.ts` says what each kind of bench holds. */
export const figureSchema = z.custom<{ readonly bench: string }>(
  (value) => typeof value === 'object' && value !== null && 'bench' in value,
);

const givenSchema = z.strictObject({
  symbol: z.string(),
  label: z.string(),
  value: z.string(),
  unit: z.string(),
});

const numberPartSchema = z.strictObject({
  kind: z.literal('number'),
  key: name,
  label: z.string(),
  dimension: z.enum(dimensions),
  unit: z.enum(units),
  places: z.optional(z.number()),
  of: z.optional(z.array(z.string())),
  expects: z.string(),
});

const optionSchema = z.strictObject({
  id: z.string(),
  label: z.string(),
  figure: z.optional(figureSchema),
});

const choicePartSchema = z.strictObject({
  kind: z.literal('choice'),
  key: name,
  label: z.string(),
  multiple: z.boolean(),
  options: z.array(optionSchema),
});

const settingPartSchema = z.strictObject({
  kind: z.literal('setting'),
  key: name,
  label: z.string(),
  controls: z.array(z.string()),
  criteria: z.array(z.string()),
});

const stockFieldSchema = z.strictObject({
  kind: z.literal('stock'),
  key: name,
  label: z.string(),
  choices: z.array(z.strictObject({ value: z.number(), label: z.string() })),
});

const quantityFieldSchema = z.strictObject({
  kind: z.literal('quantity'),
  key: name,
  label: z.string(),
  dimension: z.enum(dimensions),
  unit: z.enum(units),
  expects: z.string(),
});

const designPartSchema = z.strictObject({
  kind: z.literal('design'),
  key: name,
  label: z.string(),
  fields: z.array(z.discriminatedUnion('kind', [stockFieldSchema, quantityFieldSchema])),
  criteria: z.array(z.string()),
});

/** One thing asked: a number with a unit, a choice, a setting of the bench, or a design. */
export const partViewSchema = z.discriminatedUnion('kind', [
  numberPartSchema,
  choicePartSchema,
  settingPartSchema,
  designPartSchema,
]);
export type PartView = z.infer<typeof partViewSchema>;

const settingSchema = z.record(name, z.union([z.number(), typed]));

/** What a learner sends, by part: text as typed, ids of options, or a setting. */
export const responseSchema = z.strictObject({
  answers: z.record(
    name,
    z.union([
      typed,
      z.array(z.string().check(z.maxLength(40))).check(z.maxLength(12)),
      settingSchema,
    ]),
  ),
});
export type ExerciseResponse = z.infer<typeof responseSchema>;

/** How one part (or one criterion of a setting or design) was marked. */
export const markedPartSchema = z.strictObject({
  key: z.string(),
  label: z.string(),
  right: z.boolean(),
  echo: z.string(),
  message: z.optional(z.string()),
  slip: z.optional(z.string()),
  chosen: z.optional(z.array(z.string())),
});

/** An attempt as its learner sees it. */
export const attemptViewSchema = z.strictObject({
  attemptId: z.string(),
  createdAt: z.string(),
  verdict: z.enum(['right', 'partly', 'wrong']),
  parts: z.array(markedPartSchema),
  message: z.string(),
  nextStep: z.string(),
  closesRound: z.boolean(),
});
export type AttemptView = z.infer<typeof attemptViewSchema>;

/** The six kinds of exercise. */
export const exerciseKinds = [
  'number',
  'choice',
  'setting',
  'design',
  'prediction',
  'build',
] as const;

/** A round as its learner sees it: what is given and asked, and nothing of the answer. */
export const roundViewSchema = z.strictObject({
  roundId: z.string(),
  exerciseId: z.string(),
  version: z.number(),
  kind: z.enum(exerciseKinds),
  units: z.enum(unitSystems),
  title: z.string(),
  prompt: z.string(),
  givens: z.array(givenSchema),
  parts: z.array(partViewSchema),
  figure: z.optional(figureSchema),
  hints: z.array(z.string()),
  hintsTotal: z.number(),
  attempts: z.array(attemptViewSchema),
  closed: z.boolean(),
  unaided: z.boolean(),
  solution: z.optional(z.array(z.string())),
});
export type RoundView = z.infer<typeof roundViewSchema>;

/** The four states of a peg. */
export const pegStates = ['open', 'started', 'home', 'lifting'] as const;

/** One skill's peg as it is drawn. */
export const pegViewSchema = z.strictObject({
  skill: z.string(),
  name: z.string(),
  state: z.enum(pegStates),
  detail: z.string(),
});
export type PegView = z.infer<typeof pegViewSchema>;

/** Asking for a round; without `units`, in the person's own. */
export const roundRequestSchema = z.strictObject({ units: z.optional(z.enum(unitSystems)) });
export type RoundRequest = z.infer<typeof roundRequestSchema>;

/**
 * Asking for a hint of a round by its number, from 1: a retry or a double press takes the same one
 * hint, and one that was taken before is told again at no price.
 */
export const hintRequestSchema = z.strictObject({
  roundId: z.uuid(),
  hint: z.int().check(z.minimum(1), z.maximum(3)),
});
export type HintRequest = z.infer<typeof hintRequestSchema>;

/** Asking for the worked solution of a round. */
export const helpRequestSchema = z.strictObject({ roundId: z.uuid() });
export type HelpRequest = z.infer<typeof helpRequestSchema>;

/** Sending a response; the `Idempotency-Key` header travels beside it. */
export const attemptRequestSchema = z.strictObject({
  roundId: z.uuid(),
  response: responseSchema,
  answeredAt: z.optional(z.iso.datetime({ offset: true })),
});
export type AttemptRequest = z.infer<typeof attemptRequestSchema>;

/** Whether an attempt counts for work that is set: as which of how many, or why not. */
export const countingSchema = z.strictObject({
  className: z.string(),
  outcome: z.enum(['counted', 'none left', 'closed']),
  /** Attempts that count so far, this one among them if it does. */
  n: z.number(),
  /** How many may count; null for any number. */
  allowed: z.nullable(z.number()),
  late: z.boolean(),
});
export type Counting = z.infer<typeof countingSchema>;

/** What comes back for an attempt. */
export const attemptReplySchema = z.strictObject({
  attempt: attemptViewSchema,
  round: roundViewSchema,
  pegs: z.array(pegViewSchema),
  /** One line for each assignment that asks for the exercise. */
  counting: z.array(countingSchema),
});
export type AttemptReply = z.infer<typeof attemptReplySchema>;
