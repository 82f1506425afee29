import { pathToFileURL } from 'node:url';
import { setFlagsFromString } from 'node:v8';
import { runInNewContext } from 'node:vm';
import { involuteOutline } from '@/lib/kinematics/gear/outline';
import { fourBarPosition } from '@/lib/kinematics/linkage/four-bar';
import { nearestTrain, searchInPortions, wheelsFrom } from '@/lib/kinematics/train/search';
import {
  closingError,
  drivenLinkages,
  fourBar,
  oracleStepper,
  ratedStepper,
  stepper,
  swing,
  type Driven,
} from './linkages';

/** One thing that was measured, against what it is to be. */
export interface BenchRow {
  readonly name: string;
  readonly value: string;
  readonly aim: string;
  readonly ok: boolean;
}

const rounds = 7;
const positions = 200;

/**
 * Measures the kinematics library in one run: ratios between two ways of the same work, taken turn
 * about, the best round of each; processor times where a page would feel them.
 */
export async function benchKinematics(): Promise<readonly BenchRow[]> {
  const rows = [closedAgainstGeneral()];
  for (const driven of drivenLinkages) rows.push(await generalAgainstOracle(driven));
  for (const driven of drivenLinkages) rows.push(closing(driven));
  for (const driven of drivenLinkages) {
    rows.push(heapGrowth(driven, 'positions', stepper(driven)));
    rows.push(heapGrowth(driven, 'with speeds and accelerations', ratedStepper(driven)));
  }
  return [...rows, wholeWheel(), twoStages(), threeStages()];
}

function closedAgainstGeneral(): BenchRow {
  const [driven] = drivenLinkages;
  if (!driven) throw new Error('There is no linkage to measure.');
  const drives = swing(driven, positions);
  const general = stepper(driven);
  const closed = () => {
    let sum = 0;
    for (const drive of drives) {
      const found = fourBarPosition(fourBar, drive);
      if (found.outcome === 'closes') sum += found.open.rockerAngle;
    }
    return sum;
  };
  const [quick, whole] = bestOf([
    () => repeat(20, closed),
    () => repeat(20, () => general(drives)),
  ]);
  const ratio = whole / quick;
  return {
    name: 'general solver: time of a position over that of the closed form, four-bar',
    value: ratio.toFixed(2),
    aim: 'at most 10',
    ok: ratio <= 10,
  };
}

async function generalAgainstOracle(driven: Driven): Promise<BenchRow> {
  const drives = swing(driven, positions);
  const general = stepper(driven);
  const oracle = await oracleStepper(driven);
  const [ours, theirs] = bestOf([
    () => repeat(20, () => general(drives)),
    () => oracle.step(drives),
  ]);
  oracle.close();
  const ratio = theirs / (ours / 20);
  return {
    name: `general solver: positions in the time of one of planegcs: ${driven.name}`,
    value: ratio.toFixed(0),
    aim: 'at least 10, better 50',
    ok: ratio >= 10,
  };
}

function closing(driven: Driven): BenchRow {
  const error = closingError(driven, swing(driven, 2000));
  return {
    name: `closing error as a share of the size: ${driven.name}`,
    value: error.toExponential(1),
    aim: 'at most 1e-9',
    ok: error <= 1e-9,
  };
}

/** Bytes by which the heap grows a step of a hundred thousand, once the engine has compiled the step. */
function heapGrowth(driven: Driven, what: string, run: (drives: Float64Array) => number): BenchRow {
  const drives = swing(driven, 5000);
  for (let k = 0; k < 40; k += 1) run(drives);
  setFlagsFromString('--expose-gc');
  const collect: unknown = runInNewContext('gc');
  if (typeof collect === 'function') collect();
  let bytes = Number.POSITIVE_INFINITY;
  for (let pass = 0; pass < 12 && !(bytes < 1); pass += 1) {
    bytes = Math.min(bytes, grownOver(20, () => run(drives)) / (20 * drives.length));
  }
  return {
    name: `heap growth a step, over 100 000 steps, ${what}: ${driven.name}`,
    value: `${bytes.toFixed(2)} bytes`,
    aim: 'under 1 byte',
    ok: bytes < 1,
  };
}

/** Bytes by which the heap grew over some runs; what a collection gave back is left out. */
function grownOver(runs: number, run: () => unknown): number {
  let grown = 0;
  let before = process.memoryUsage().heapUsed;
  for (let k = 0; k < runs; k += 1) {
    run();
    const now = process.memoryUsage().heapUsed;
    grown += Math.max(0, now - before);
    before = now;
  }
  return grown;
}

function wholeWheel(): BenchRow {
  const spec = { module: 3, teeth: 60, pressureAngle: Math.PI / 9 };
  const [time] = bestOf([() => repeat(10, () => involuteOutline(spec).length)]);
  return timed('whole outline of a wheel of 60 teeth', time / 10, 1);
}

const drawer = { ratio: Math.PI, wheels: wheelsFrom(20, 59) };

function twoStages(): BenchRow {
  const [time] = bestOf([() => nearestTrain(drawer, 2)]);
  return timed('ratio search over a drawer of 40 wheels, two stages', time, 50);
}

/** The longest of all portions of a three-stage search, the best of a few searches. */
function threeStages(): BenchRow {
  const longest = Array.from({ length: 3 }, () => {
    const portions = searchInPortions(drawer, 3);
    let most = 0;
    for (let done = false; !done;) {
      most = Math.max(
        most,
        took(() => {
          done = portions.next().done === true;
        }),
      );
    }
    return most;
  });
  return timed('the same in three stages, the longest portion', Math.min(...longest), 50);
}

function timed(name: string, milliseconds: number, most: number): BenchRow {
  return {
    name,
    value: `${milliseconds.toFixed(2)} ms`,
    aim: `under ${most} ms`,
    ok: milliseconds < most,
  };
}

function repeat(times: number, work: () => number): number {
  let sum = 0;
  for (let k = 0; k < times; k += 1) sum += work();
  return sum;
}

/** Processor time of some work, milliseconds: what else the machine does at the time is left out. */
function took(work: () => unknown): number {
  const begun = process.cpuUsage();
  work();
  const { user, system } = process.cpuUsage(begun);
  return (user + system) / 1000;
}

/** The least time of each work, milliseconds, the works taken turn about. */
function bestOf<const Works extends readonly (() => unknown)[]>(works: Works) {
  const best = works.map(() => Number.POSITIVE_INFINITY);
  for (let round = 0; round <= rounds; round += 1) {
    works.forEach((work, k) => {
      const time = took(work);
      if (round > 0) best[k] = Math.min(best[k] ?? time, time);
    });
  }
  return best as { [K in keyof Works]: number };
}

function printed(rows: readonly BenchRow[]): string {
  const widest = (key: 'name' | 'value') => Math.max(...rows.map((row) => row[key].length));
  const [name, value] = [widest('name'), widest('value')];
  return rows
    .map((row) =>
      [row.ok ? 'ok  ' : 'FAR ', row.name.padEnd(name), row.value.padStart(value), row.aim].join(
        '  ',
      ),
    )
    .join('\n');
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  const rows = await benchKinematics();
  process.stdout.write(`${printed(rows)}\n`);
  process.exitCode = rows.every(({ ok }) => ok) ? 0 : 1;
}
