import type { BenchTable, Plot, Readout } from './bench-model';
import { fixedNumber, ruleText, shortNumber } from './measure';
import { fewestSoundTeeth } from './train-scene';
import type { SetPair, SetWheel, TrainSetup } from './train-setup';

/** A slower end turned by hand feels locked beyond this ratio. */
const feelsLocked = 12;

/** Turns to the right that a wheel has made with the crank at `drive`. */
export function turnsRight(setup: TrainSetup, wheel: SetWheel, drive: number): number {
  return setup.stuck ? 0 : ((wheel.ratio ?? 0) * -drive) / (2 * Math.PI);
}

/** The wheel at the end that the crank does not turn by hand. */
export function lastWheel({ wheels, crank, arbors }: TrainSetup): SetWheel | undefined {
  return crank === arbors.length - 1 && crank > 0 ? wheels[0] : wheels.at(-1);
}

/** The title strip of a train. */
export function trainReadouts(setup: TrainSetup, drive: number): readonly Readout[] {
  const hidden = new Set(setup.spec.hide ?? []);
  const last = lastWheel(setup);
  const crank = -drive / (2 * Math.PI);
  const output = last ? turnsRight(setup, last, drive) : 0;
  const readouts: Readout[] = [{ key: 'crank', label: 'Crank, turns', value: turned(crank, true) }];
  if (!hidden.has('turns')) {
    const value = turned(output, !hidden.has('sense'));
    readouts.push({ key: 'turns', label: 'Last wheel, turns', value });
  }
  if (!hidden.has('ratio')) {
    readouts.push({ key: 'ratio', label: 'Last for one of crank', value: ratioText(last) });
  }
  return readouts;
}

function ratioText(wheel: SetWheel | undefined): string {
  if (!wheel || wheel.ratioText === null || wheel.ratio === null) return 'nothing turns it';
  const decimal = shortNumber(Math.abs(wheel.ratio), 4);
  return wheel.ratioText === decimal ? decimal : `${wheel.ratioText} = ${decimal}`;
}

function turned(turns: number, sense: boolean): string {
  const size = fixedNumber(Math.abs(turns), 2);
  if (!sense || Number(size) === 0) return size;
  return `${size} ${turns > 0 ? 'right' : 'left'}`;
}

/** The state of a train in words. */
export function describeTrain(setup: TrainSetup, drive: number): string {
  const hidden = new Set(setup.spec.hide ?? []);
  const last = lastWheel(setup);
  const parts = [`${setup.arbors.length} arbors.`, ...chain(setup, drive)];
  if (last && !hidden.has('turns')) {
    const made = turnsInWords(turnsRight(setup, last, drive), !hidden.has('sense'));
    parts.push(`The last wheel, ${last.teeth} teeth, has made ${made}.`);
  }
  if (last && last.ratio !== null && !setup.stuck && !hidden.has('ratio')) {
    const meshes = setup.pairs.filter(({ inTrain }) => inTrain).length;
    const crank = shortNumber(Math.abs(1 / last.ratio), 3);
    const turns = crank === '1' ? 'turn' : 'turns';
    parts.push(
      `One turn of it for ${crank} ${turns} of the crank, ${meshes} ${meshes === 1 ? 'mesh' : 'meshes'}.`,
    );
  }
  return parts.join(' ');
}

function chain(setup: TrainSetup, drive: number): string[] {
  const hidden = new Set(setup.spec.hide ?? []);
  const crankTurns = turnsInWords(-drive / (2 * Math.PI), true);
  const sentences: string[] = [];
  for (const wheel of setup.wheels) {
    const onCrank = wheel.arbor === setup.crank && wheel.wheel === 0;
    if (onCrank) {
      const made = setup.stuck ? 'cannot be turned' : `has made ${crankTurns}`;
      sentences.push(`Wheel ${wheel.number}, ${wheel.teeth} teeth, on the crank, ${made}.`);
    }
    const pair = setup.pairs.find(({ first, inTrain }) => inTrain && first === wheel);
    if (!pair) continue;
    const away = hidden.has('centres') ? '' : `, ${ruleText(pair.distance, setup.spec.units)} away`;
    const name = sentences.length === 1 && onCrank ? 'It' : `Wheel ${wheel.number}`;
    const { second } = pair;
    const verb = pair.state.outcome === 'meshes' ? 'meshes with' : 'stands beside';
    sentences.push(
      `${name} ${verb} wheel ${second.number}, ${second.teeth} teeth, ${beside(setup, second)} on its arbor${away}.`,
    );
  }
  return sentences;
}

function beside(setup: TrainSetup, wheel: SetWheel): string {
  const other = setup.wheels.find(
    (candidate) => candidate.arbor === wheel.arbor && candidate !== wheel,
  );
  if (!other) return 'alone';
  const fast = setup.arbors[wheel.arbor]?.fast ?? true;
  return `${fast ? 'fast with' : 'loose beside'} wheel ${other.number}, ${other.teeth} teeth,`;
}

function turnsInWords(turns: number, sense: boolean): string {
  const size = shortNumber(Math.abs(turns), 2);
  const noun = size === '1' ? 'turn' : 'turns';
  if (!sense || size === '0') return `${size} ${noun}`;
  return `${size} ${noun} to the ${turns > 0 ? 'right' : 'left'}`;
}

/** What does not work in a train, each in a sentence with its amount. */
export function trainLimits(setup: TrainSetup): readonly string[] {
  const last = lastWheel(setup);
  const limits = setup.pairs.flatMap((pair) => pairLimit(pair, setup));
  if (setup.ring) {
    limits.push('Each wants its neighbours to turn against it; three in a ring cannot.');
  }
  const loose = setup.arbors.some(({ wheels, fast }) => wheels.length > 1 && !fast);
  if (loose) limits.push('Loose on its arbor: nothing is passed on.');
  if (setup.wheels.some(({ teeth }) => teeth < fewestSoundTeeth)) {
    limits.push('Small pinions: unit 3 tells what they need.');
  }
  const out = Math.abs(last?.ratio ?? 0);
  if (out > feelsLocked && !setup.spec.hide?.includes('ratio')) {
    limits.push(
      `Turning from here the crank will feel locked: ${shortNumber(out, 2)} turns out for each of yours.`,
    );
  }
  return limits;
}

function pairLimit({ first, second, state }: SetPair, { spec }: TrainSetup): string[] {
  const which = `Wheels ${first.number} and ${second.number}:`;
  if (state.outcome === 'apart') {
    const teeth = state.tips === 'touch' ? 'touch only at their tips' : 'miss';
    return [
      `${which} ${ruleText(state.gap, spec.units)} between the pitch circles: the teeth ${teeth}.`,
    ];
  }
  if (state.outcome !== 'too-close') return [];
  return [`${which} ${ruleText(-state.gap, spec.units)} too close: cannot be put in.`];
}

/** Arbor by arbor, and mesh by mesh. */
export function trainTables(setup: TrainSetup, drive: number, pace: number): readonly BenchTable[] {
  const hidden = new Set(setup.spec.hide ?? []);
  const shown = (key: string, text: string) => (hidden.has(key) ? [] : [text]);
  const arbors = setup.arbors.map((arbor, index) => {
    const wheel = setup.wheels.filter((candidate) => candidate.arbor === index).at(-1);
    const turns = wheel ? turnsRight(setup, wheel, drive) : 0;
    const rate = setup.stuck ? 0 : Math.abs(wheel?.ratio ?? 0);
    return [
      String(index + 1),
      arbor.wheels.map(({ teeth }) => teeth).join(' and '),
      ...shown('turns', turned(turns, !hidden.has('sense'))),
      ...shown('ratio', shortNumber(rate * pace, 2)),
    ];
  });
  const meshes = setup.pairs
    .filter(({ inTrain }) => inTrain)
    .map(({ first, second, distance }) => [
      `${first.number} and ${second.number}`,
      ...shown('teeth', shortNumber(Math.abs(turnsRight(setup, first, drive)) * first.teeth, 1)),
      ...shown('centres', ruleText(distance, setup.spec.units)),
    ]);
  return [
    {
      caption: 'Each arbor',
      head: [
        'Arbor',
        'Teeth',
        ...shown('turns', 'Turns'),
        ...shown('ratio', `rpm at ${pace} on the crank`),
      ],
      rows: arbors,
    },
    {
      caption: 'Each mesh',
      head: ['Wheels', ...shown('teeth', 'Teeth passed'), ...shown('centres', 'Centres')],
      rows: meshes,
    },
  ];
}

/** Turns of each arbor against turns of the crank, ten either way. */
export function trainPlot(setup: TrainSetup): Plot | null {
  const hidden = setup.spec.hide ?? [];
  if (setup.stuck || hidden.includes('ratio') || hidden.includes('turns')) return null;
  const range = 10;
  const ends = setup.arbors.map((_, index) =>
    setup.wheels.filter(({ arbor }) => arbor === index).at(-1),
  );
  const steepest = Math.max(1, ...ends.map((wheel) => Math.abs(wheel?.ratio ?? 0)));
  const top = steepest * range;
  const ratios = ends.map((wheel) => wheel?.ratio ?? 0);
  return {
    title: 'Turns of each arbor against turns of the crank',
    across: {
      label: 'crank, turns to the right',
      least: -range,
      most: range,
      ticks: [-10, -5, 0, 5, 10],
    },
    up: {
      label: 'turns to the right',
      least: -top,
      most: top,
      ticks: [-top, -top / 2, 0, top / 2, top],
    },
    lines: ratios.map((ratio, index) => ({
      label: `arbor ${index + 1}`,
      role: index === setup.crank ? 'brass' : index === ratios.length - 1 ? 'chalk' : 'ink',
      dashed: index !== setup.crank && index !== ratios.length - 1,
      points: [
        { x: -range, y: -ratio * range },
        { x: range, y: ratio * range },
      ],
    })),
    now: (drive) => {
      const x = -drive / (2 * Math.PI);
      return ratios.map((ratio) => ({ x, y: ratio * x }));
    },
  };
}
