import { exercises, lessons } from '@/content/exercises/registry';
import { createAttempt } from '@/lib/data/attempts';
import { openRound, showSolution, takeHint } from '@/lib/data/rounds';
import { drawVariant } from '@/lib/marking/draw';
import { createSource, type Source } from '@/lib/marking/source';
import type { Viewer } from '@/lib/policy/viewer';
import { habits, type Manner } from './manner';
import type { DemoClass } from './people.data';
import { rightResponse, slippedResponse } from './respond';

const DAY = 86_400_000;
const MINUTE = 60_000;

/** Somebody whose weeks before `now` are to be lived through. */
export interface Life {
  readonly viewer: Viewer;
  readonly manner: Manner;
  readonly seed: number;
  readonly set: DemoClass['set'];
}

/**
 * Lives through a learner's weeks visit by visit, with the same functions that answer a browser:
 * what is set first, then again what went before. The same seed gives the same weeks.
 */
export async function liveThrough({ viewer, manner, seed, set }: Life, now: Date): Promise<void> {
  const source = createSource(seed);
  const habit = habits[manner];
  const rounds = new Map<string, number>();
  const first = Math.max(0, ...set.map(({ daysAgo }) => daysAgo));
  let day = first - source.whole(0, Math.min(4, habit.gap[1]));
  while (day > 0) {
    let at = visitAt(now, day, source);
    const open = set.filter(({ daysAgo }) => daysAgo >= day);
    for (const exerciseId of visitPlan(open, rounds, source.whole(...habit.exercises), source)) {
      const taken = rounds.get(exerciseId) ?? 0;
      at = await tryExercise({ viewer, exerciseId, taken, manner, source, at });
      rounds.set(exerciseId, taken + 1);
    }
    day -= source.whole(...habit.gap);
  }
}

/** The evening of a day, or its morning; always before now. */
function visitAt(now: Date, daysAgo: number, source: Source): Date {
  const midnight = Math.floor((now.getTime() - daysAgo * DAY) / DAY) * DAY;
  const hour = source.pick([8, 12, 17, 18, 18, 19, 19, 20]);
  return new Date(midnight + hour * 60 * MINUTE + source.whole(0, 45) * MINUTE);
}

/** The exercises of a visit: the latest set work not yet begun, then those tried least. */
function visitPlan(
  open: DemoClass['set'],
  rounds: ReadonlyMap<string, number>,
  room: number,
  source: Source,
): string[] {
  const wanted = [...open]
    .sort((one, other) => one.daysAgo - other.daysAgo)
    .flatMap((work) => [
      ...work.lessons.flatMap(exercisesOf),
      ...(work.exercises ?? []).filter((id) => exercises.has(id)),
    ]);
  const begun = (id: string) => rounds.get(id) ?? 0;
  const fresh = wanted.filter((id) => begun(id) === 0);
  const again = source
    .shuffle(wanted.filter((id) => begun(id) > 0 && exercises.get(id)?.kind !== 'prediction'))
    .sort((one, other) => begun(one) - begun(other));
  const half = Math.ceil(room / 2);
  return [...fresh.slice(0, again.length > 0 ? half : room), ...again].slice(0, room);
}

function exercisesOf(lessonId: string): string[] {
  const lesson = lessons.find(({ id }) => id === lessonId);
  if (lesson === undefined) return [];
  return [lesson.prediction, ...lesson.exercises].filter((id) => exercises.has(id));
}

interface Try {
  readonly viewer: Viewer;
  readonly exerciseId: string;
  /** How many rounds of it went before. */
  readonly taken: number;
  readonly manner: Manner;
  readonly source: Source;
  readonly at: Date;
}

/** One exercise, from opening its round until it is right, given up or left; answers the time after. */
async function tryExercise({ viewer, exerciseId, taken, manner, source, at }: Try): Promise<Date> {
  const habit = habits[manner];
  const definition = exercises.get(exerciseId);
  if (definition === undefined) return at;
  let time = at;
  const later = (least: number, most: number) => {
    time = new Date(time.getTime() + source.whole(least * 60, most * 60) * 1000);
    return time;
  };
  const chance = (share: number) => source.whole(1, 100) <= share;
  const seed = source.whole(0, 2 ** 31 - 1);
  const round = await openRound(viewer, { exerciseId }, later(1, 3), seed);
  if (round === null || round.closed) return time;
  // A round left open at an earlier visit has the numbers of that visit.
  const standing = standingSeeds.get(round.roundId) ?? seed;
  standingSeeds.set(round.roundId, standing);
  const variant = drawVariant(definition, standing, round.units);
  const favourite = source.pick([0, 0, 0, 1, 1, 2]);
  for (let tries = 1; tries <= 4; tries += 1) {
    const right = chance(Math.min(97, habit.right + 9 * taken + 14 * (tries - 1)));
    const slipped = slippedResponse(definition, variant, favourite + tries - 1);
    const response = right || slipped === null ? rightResponse(definition, variant) : slipped;
    const result = await createAttempt(
      viewer,
      { roundId: round.roundId, response: unshared(response) },
      uuidFrom(source),
      later(1, 6),
    );
    if (result.outcome !== 'kept' || result.reply.round.closed) return time;
    if (chance(habit.leaves)) return time;
    if (tries >= 2 && chance(habit.solution)) {
      await showSolution(viewer, exerciseId, round.roundId, later(1, 2));
      return time;
    }
    const { roundId, hints } = result.reply.round;
    if (chance(habit.hint)) await takeHint(viewer, exerciseId, roundId, hints.length + 1);
  }
  return time;
}

const standingSeeds = new Map<string, number>();

type Sent = Parameters<typeof createAttempt>[1]['response'];

/** The same response with nothing in it that is read-only. */
function unshared({ answers }: ReturnType<typeof rightResponse>): Sent {
  return {
    answers: Object.fromEntries(
      Object.entries(answers).map(([key, answer]) => [
        key,
        typeof answer === 'string' ? answer : isList(answer) ? [...answer] : { ...answer },
      ]),
    ),
  };
}

function isList(answer: unknown): answer is readonly string[] {
  return Array.isArray(answer);
}

/** A UUID out of the seeded source, so that a history can be lived through again. */
function uuidFrom(source: Source): string {
  const digits = (count: number) =>
    Array.from({ length: count }, () => source.whole(0, 15).toString(16)).join('');
  return `${digits(8)}-${digits(4)}-4${digits(3)}-8${digits(3)}-${digits(12)}`;
}
