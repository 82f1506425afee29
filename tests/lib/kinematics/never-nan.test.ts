import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { freedomOf } from '@/lib/kinematics/linkage/freedom';
import { driveLimits, startDrive } from '@/lib/kinematics/linkage/solver/limits';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';
import type { Plan } from '@/lib/kinematics/linkage/solver/plan';
import { planLinkage } from '@/lib/kinematics/linkage/solver/plan-linkage';
import {
  branchOf,
  carryOnLinkage,
  moveLinkage,
  placeLinkage,
  rateLinkage,
  solveLinkage,
  startPose,
} from '@/lib/kinematics/linkage/solver/solver';
import { linkageCalls, moreCalls } from './sample-calls';

/**
 * NaN and Infinity never leave the library. Every exported function of lib/kinematics has a sound
 * call, from its own `@example` or from the list beside this test; the call's numbers are then
 * replaced at random, by nonsense too. The function may refuse with a RangeError, or answer with
 * finite numbers throughout.
 */
const helpers = import.meta.glob<Record<string, unknown>>(
  ['/lib/numeric/**/*.ts', '/lib/geometry/**/*.ts'],
  { eager: true },
);
const modules = import.meta.glob<Record<string, unknown>>('/lib/kinematics/**/*.ts', {
  eager: true,
});

type Call = readonly unknown[];
const calls = new Map<string, Call[]>();
let gathering = true;

/** Lets a function record what it is called with. */
function recording(key: string, run: (...given: Call) => unknown) {
  return (...given: Call): unknown => {
    if (gathering) calls.set(key, [...(calls.get(key) ?? []), structuredCloneIfPlain(given)]);
    return run(...given);
  };
}

function structuredCloneIfPlain(given: Call): Call {
  try {
    return structuredClone(given);
  } catch {
    return given;
  }
}

function isFunction(value: unknown): value is (...given: Call) => unknown {
  return typeof value === 'function';
}

const exported = Object.entries(modules).flatMap(([file, own]) =>
  Object.entries(own)
    .filter((entry): entry is [string, (...given: Call) => unknown] => isFunction(entry[1]))
    .map(([name, run]) => ({ key: `${file} ${name}`, file, name, run })),
);

function namesOf(file: string): Record<string, unknown> {
  return Object.fromEntries(
    exported
      .filter((one) => one.file === file)
      .map(({ key, name, run }) => [name, recording(key, run)]),
  );
}

const scope: Record<string, unknown> = Object.assign(
  {},
  ...Object.values(helpers),
  ...Object.values(modules),
  ...Object.keys(modules).map(namesOf),
);

function evaluate(text: string, own: Record<string, unknown>): unknown {
  const names = { ...scope, ...own };
  return new Function(...Object.keys(names), `"use strict"; return (${text});`)(
    ...Object.values(names),
  );
}

for (const file of Object.keys(modules)) {
  const text = readFileSync(`.${file}`, 'utf8');
  for (const [, expression = ''] of text.matchAll(/@example (.+?) \/\/ → /g)) {
    evaluate(expression, namesOf(file));
  }
}
for (const expression of moreCalls) evaluate(expression, {});

/**
 * Guards hand on or throw what they were given; there is nothing in them to go wrong. The workings
 * of the solver see only what a plan holds: they are fed through its plans, further down.
 */
const tested = exported.filter(
  ({ key, name }) =>
    !name.startsWith('require') && !key.startsWith('/lib/kinematics/linkage/solver/'),
);

const nonsense = [Number.NaN, Infinity, -Infinity, 0, -0, -1, 2.5, 1e300, -1e300, 1e-300, 5e-324];
const instead = (value: number) =>
  fc.oneof(
    { weight: 4, arbitrary: fc.constant(value) },
    {
      weight: 2,
      arbitrary: fc.double({ min: -3, max: 3, noNaN: true }).map((x) => value * 10 ** x),
    },
    { weight: 1, arbitrary: fc.constantFrom(...nonsense) },
    { weight: 1, arbitrary: fc.integer({ min: -2, max: 60 }) },
    { weight: 1, arbitrary: fc.constant(-value) },
  );

/** The same call with other numbers in the same places. */
function altered(value: unknown): fc.Arbitrary<unknown> {
  if (typeof value === 'number') return instead(value);
  if (Array.isArray(value)) return fc.tuple(...value.map(altered));
  if (value === null || typeof value !== 'object') return fc.constant(value);
  if (Object.getPrototypeOf(value) !== Object.prototype) return fc.constant(value);
  return fc.record(Object.fromEntries(Object.entries(value).map(([k, v]) => [k, altered(v)])));
}

function isFiniteThroughout(value: unknown): boolean {
  if (typeof value === 'number') return Number.isFinite(value);
  if (value instanceof Map || value instanceof Set) return isFiniteThroughout([...value]);
  if (value === null || typeof value !== 'object') return true;
  return Object.values(value).every(isFiniteThroughout);
}

/**
 * `HORNBEAM_INPUTS` is the number of inputs a module, shared out among its functions; without it
 * each function has a few hundred.
 */
const wanted = Number(process.env.HORNBEAM_INPUTS ?? 0);
const few = 300;

function inputsFor(file: string): number {
  const own = tested.filter((one) => one.file === file).length;
  return wanted > 0 ? Math.ceil(wanted / own) : few;
}

gathering = false;

describe('every exported function of lib/kinematics', () => {
  it('has a sound call to start from', () => {
    const without = tested.filter(({ key }) => !calls.has(key)).map(({ key }) => key);
    expect(without).toEqual([]);
  });

  it.each(tested)(
    '$key refuses with a RangeError or answers with finite numbers',
    ({ key, file, run }) => {
      const samples = calls.get(key) ?? [];
      fc.assert(
        fc.property(fc.oneof(...samples.map((sample) => altered([...sample]))), (given) => {
          refusesOrIsFinite(() => run(...(Array.isArray(given) ? given : [])));
        }),
        { seed: 20_260, numRuns: inputsFor(file) },
      );
    },
  );
});

/** Everything the solver tells of a linkage, all asked at one drive. */
function everythingAbout(linkage: Linkage, drive: readonly number[]): unknown {
  const planned = planLinkage(linkage);
  if (planned.outcome !== 'planned') return planned;
  const { plan } = planned;
  const rest = drive.map(() => 0);
  const placed = solveLinkage(plan, drive);
  const moved = moveLinkage(plan, drive, drive, rest);
  const [pose, branch] = [startPose(plan), branchOf(plan)];
  const before = pose.slice();
  const by = placeLinkage(plan, drive, branch, pose);
  const carried = carryOnLinkage(plan, drive, before, pose.slice(), branch, pose);
  const start = startDrive(plan);
  return [freedomOf(linkage), placed, moved, by, carried, pose, start, rates(plan, drive, pose)];
}

function rates(plan: Plan, drive: readonly number[], pose: Float64Array): unknown {
  const [velocity, acceleration] = [startPose(plan), startPose(plan)];
  const accelerations = drive.map(() => 0);
  const rated = { pose, drive, speeds: drive, accelerations, velocity, acceleration };
  return rateLinkage(plan, rated) ? [velocity, acceleration] : 'dead-centre';
}

const linkages = linkageCalls.map(([call, drive]) => ({
  call,
  linkage: evaluate(call, {}) as Linkage,
  drive,
}));

function refusesOrIsFinite(ask: () => unknown): void {
  let answer: unknown;
  try {
    answer = ask();
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    return;
  }
  if (!isFiniteThroughout(answer)) expect(answer).toBe('finite throughout');
}

/** The solver's own share: a module's worth of inputs for all its linkages together. */
const solverInputs = wanted > 0 ? Math.ceil(wanted / linkages.length) : few;

describe('the general solver', () => {
  it.each(linkages)('tells nothing that is not a number of $call', ({ linkage, drive }) => {
    fc.assert(
      fc.property(altered(linkage), altered([...drive]), (given, led) => {
        refusesOrIsFinite(() => everythingAbout(given as Linkage, led as number[]));
      }),
      { seed: 20_261, numRuns: solverInputs },
    );
  });

  it.each(linkages)('tells finite limits of the drive of $call', ({ linkage }) => {
    fc.assert(
      fc.property(altered(linkage), (given) => {
        refusesOrIsFinite(() => {
          const planned = planLinkage(given as Linkage);
          return planned.outcome === 'planned' ? driveLimits(planned.plan) : planned;
        });
      }),
      { seed: 20_262, numRuns: Math.ceil(solverInputs / 20) },
    );
  });
});
