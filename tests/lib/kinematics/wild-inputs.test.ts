import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gripOf, gripOnWheels, wrapForGrip } from '@/lib/kinematics/belt/grip';
import {
  centresForLinks,
  chainLength,
  sprocketDiameter,
  toothedPulleyDiameter,
} from '@/lib/kinematics/belt/chain';
import { beltRoundMany } from '@/lib/kinematics/belt/many-wheels';
import { beltSpeed, beltTurns, drivenDiameter } from '@/lib/kinematics/belt/speed';
import {
  evenPaces,
  slackOnStep,
  speedRange,
  stepForLoop,
  steppedCones,
} from '@/lib/kinematics/belt/stepped-cones';
import { toothedBelt } from '@/lib/kinematics/belt/toothed-belt';
import {
  bandsawBlade,
  beltLoop,
  centresForLoop,
  centresForWrap,
} from '@/lib/kinematics/belt/two-wheels';
import { bevelCones, bevelWheel } from '@/lib/kinematics/gear/bevel';
import {
  centresChanged,
  openingForBacklash,
  shiftedPair,
  shiftSumForCentres,
} from '@/lib/kinematics/gear/centres';
import { wheelFromPitch, wholeTeethRound } from '@/lib/kinematics/gear/circular-pitch';
import { contactOf, rackContactRatio, ringContact } from '@/lib/kinematics/gear/contact';
import {
  fewestTeethForPair,
  fewestTeethForRack,
  largestWheel,
  leastShift,
} from '@/lib/kinematics/gear/interference';
import {
  involute,
  involuteInverse,
  pressureAngleAt,
  unwindCord,
} from '@/lib/kinematics/gear/involute';
import {
  lanternCarrying,
  lanternPoint,
  lanternPointedRadius,
  lanternSizes,
} from '@/lib/kinematics/gear/lantern';
import { lanternWheelOutline } from '@/lib/kinematics/gear/lantern-outline';
import {
  betweenPins,
  overPins,
  rackOverPin,
  shiftFromSpan,
  spanMeasurement,
  teethToSpan,
} from '@/lib/kinematics/gear/measurement';
import {
  centreDistance,
  gearPair,
  meshPhase,
  meshState,
  pitchLineSpeed,
} from '@/lib/kinematics/gear/mesh';
import { involuteOutline, toothLimits } from '@/lib/kinematics/gear/outline';
import { gearProportions } from '@/lib/kinematics/gear/proportions';
import { rackOutline, rackPlace, rackTeethForTravel, rackTravel } from '@/lib/kinematics/gear/rack';
import { ringOutline, ringPassage, ringProportions } from '@/lib/kinematics/gear/ring';
import {
  basicRack,
  diametralSizes,
  moduleFromDiametralPitch,
  moduleOfFoundWheel,
  moduleSeries,
  nearestModule,
} from '@/lib/kinematics/gear/standards';
import {
  baseThickness,
  chordalTooth,
  pointedRadius,
  toothThickness,
} from '@/lib/kinematics/gear/thickness';
import { toothForce } from '@/lib/kinematics/gear/tooth-force';
import { wormDrive, wormEfficiency, wormHolding, wormRatio } from '@/lib/kinematics/gear/worm';
import { planetsAssembly } from '@/lib/kinematics/train/assembly';
import { changeWheelRatio } from '@/lib/kinematics/train/change-wheels';
import { beatOfPendulum, clockBeats, pendulumForBeat } from '@/lib/kinematics/train/clock';
import { driftOf, rungWithin } from '@/lib/kinematics/train/continued-fraction';
import { huntingTeeth } from '@/lib/kinematics/train/hunting';
import { trainOfLayout, wheelPairs } from '@/lib/kinematics/train/layout';
import {
  cartWheels,
  ovalOfPen,
  planetaryDrive,
  planetaryFor,
  planetaryTorques,
} from '@/lib/kinematics/train/planetary';
import { arborTurns, compoundTrain, idlerBetween, simpleTrain } from '@/lib/kinematics/train/ratio';
import { closingWheel, revertedTeeth } from '@/lib/kinematics/train/reverted';
import { nearestTrain } from '@/lib/kinematics/train/search';
import { turnsOfMeshes } from '@/lib/kinematics/train/turns';

/** The inputs of one run: wild lengths, counts and angles, most of them sensible. */
class Draw {
  private next = 0;
  constructor(
    private readonly lengths: readonly number[],
    private readonly counts: readonly number[],
    private readonly angles: readonly number[],
  ) {}
  get length(): number {
    return this.lengths[this.next++ % this.lengths.length] ?? 1;
  }
  get count(): number {
    return this.counts[this.next++ % this.counts.length] ?? 1;
  }
  get angle(): number {
    return this.angles[this.next++ % this.angles.length] ?? 1;
  }
  get gear() {
    return {
      module: this.length,
      teeth: this.count,
      pressureAngle: this.angle,
      shift: this.angle - 0.4,
    };
  }
  get pair() {
    return {
      module: this.length,
      firstTeeth: this.count,
      secondTeeth: this.count,
      pressureAngle: this.angle,
      firstShift: this.angle - 0.4,
    };
  }
  get mesh() {
    return { module: this.length, firstTeeth: this.count, secondTeeth: this.count };
  }
  get lantern() {
    return {
      pitch: this.length,
      wheelTeeth: this.count,
      pins: this.count,
      pinDiameter: this.length,
      play: this.angle,
    };
  }
  get belt() {
    return {
      first: this.length,
      second: this.length,
      centreDistance: this.length * 3,
      lay: this.angle > 0.3 ? ('open' as const) : ('crossed' as const),
    };
  }
}

const wild = fc.constantFrom(
  0,
  -1,
  Number.NaN,
  Number.POSITIVE_INFINITY,
  1e308,
  1e200,
  1e-200,
  5e-324,
  1e-12,
  1e15,
  0.1,
);
const sensible = fc.double({ min: 0.5, max: 500, noNaN: true });
const mostly = (value: fc.Arbitrary<number>) =>
  fc.oneof({ weight: 5, arbitrary: value }, { weight: 1, arbitrary: wild });
const draws = fc.tuple(
  fc.array(mostly(sensible), { minLength: 4, maxLength: 4 }),
  fc.array(mostly(fc.integer({ min: 3, max: 60 })), { minLength: 4, maxLength: 4 }),
  fc.array(mostly(fc.double({ min: 0.1, max: 0.7, noNaN: true })), { minLength: 4, maxLength: 4 }),
);

const functions: Readonly<Record<string, (d: Draw) => unknown>> = {
  gripOf: (d) => gripOf({ friction: d.angle }, d.angle * 9),
  gripOnWheels: (d) =>
    gripOnWheels({ friction: d.angle, grooveHalfAngle: d.angle }, [d.angle, d.angle], d.length),
  wrapForGrip: (d) => wrapForGrip({ friction: d.angle }, d.length),
  centresForLinks: (d) =>
    centresForLinks({ pitch: d.length, firstTeeth: d.count, secondTeeth: d.count }, d.count * 4),
  chainLength: (d) =>
    chainLength({ pitch: d.length, firstTeeth: d.count, secondTeeth: d.count }, d.length),
  sprocketDiameter: (d) => sprocketDiameter(d.length, d.count),
  toothedPulleyDiameter: (d) => toothedPulleyDiameter(d.length, d.count),
  beltRoundMany: (d) =>
    beltRoundMany([
      { centre: { x: 0, y: 0 }, radius: d.length },
      { centre: { x: d.length * 3, y: d.length }, radius: d.length },
      {
        centre: { x: d.length, y: d.length * 3 },
        radius: d.length,
        side: d.angle > 0.3 ? 'left' : 'right',
      },
    ]),
  beltSpeed: (d) => beltSpeed(d.length, d.angle, d.length),
  beltTurns: (d) =>
    beltTurns(
      [
        { driver: d.length, driven: d.length },
        { driver: d.length, driven: d.length },
      ],
      { thickness: d.length, slip: d.angle },
    ),
  drivenDiameter: (d) => drivenDiameter(d.length, d.angle, { thickness: d.length }),
  evenPaces: (d) => evenPaces(d.length, d.length, 4),
  slackOnStep: (d) =>
    slackOnStep(
      { driver: d.length, driven: d.length },
      { centreDistance: d.length, lay: 'open', length: d.length },
    ),
  speedRange: (d) => speedRange(d.length, d.length),
  stepForLoop: (d) =>
    stepForLoop({ centreDistance: d.length, length: d.length * 4, ratio: d.length, lay: 'open' }),
  steppedCones: (d) =>
    steppedCones({
      centreDistance: d.length * 9,
      firstDriver: d.length,
      ratios: [d.angle, d.angle],
      lay: 'open',
    }),
  toothedBelt: (d) =>
    toothedBelt({ pitch: d.length, firstTeeth: d.count, secondTeeth: d.count }, d.length * 9),
  bandsawBlade: (d) => bandsawBlade(d.length, d.length),
  beltLoop: (d) => beltLoop(d.belt),
  centresForLoop: (d) => centresForLoop(d.belt, d.length * 9),
  centresForWrap: (d) => centresForWrap(d.length, d.length, d.angle),
  bevelCones: (d) =>
    bevelCones({ firstTeeth: d.count, secondTeeth: d.count, shaftAngle: d.angle * 4 }),
  bevelWheel: (d) => bevelWheel({ module: d.length, teeth: d.count }, d.angle),
  centresChanged: (d) => centresChanged(d.pair, d.length * d.count),
  openingForBacklash: (d) => openingForBacklash(d.pair, d.angle),
  shiftedPair: (d) => shiftedPair(d.pair),
  shiftSumForCentres: (d) => shiftSumForCentres(d.pair, d.length * d.count),
  wheelFromPitch: (d) => wheelFromPitch(d.length, d.count),
  wholeTeethRound: (d) => wholeTeethRound(d.length, d.length),
  contactOf: (d) => contactOf(d.pair),
  rackContactRatio: (d) => rackContactRatio(d.gear),
  ringContact: (d) => ringContact(d.pair),
  fewestTeethForPair: (d) =>
    fewestTeethForPair({ pressureAngle: d.angle, addendum: d.length }, d.length),
  fewestTeethForRack: (d) => fewestTeethForRack({ pressureAngle: d.angle, addendum: d.length }),
  largestWheel: (d) => largestWheel({ pressureAngle: d.angle, addendum: d.length }, d.count),
  leastShift: (d) => leastShift({ pressureAngle: d.angle, addendum: d.length }, d.count),
  involute: (d) => involute(d.angle * 2),
  involuteInverse: (d) => involuteInverse(d.length),
  pressureAngleAt: (d) => pressureAngleAt(d.length, d.length),
  unwindCord: (d) => unwindCord(d.length, d.length),
  lanternCarrying: (d) => lanternCarrying(d.lantern),
  lanternPoint: (d) => lanternPoint(d.lantern, d.angle),
  lanternPointedRadius: (d) => lanternPointedRadius(d.lantern),
  lanternSizes: (d) => lanternSizes(d.lantern),
  lanternWheelOutline: (d) => lanternWheelOutline({ ...d.lantern, steps: 3 }),
  betweenPins: (d) => betweenPins(d.gear, d.length),
  overPins: (d) => overPins(d.gear, d.length),
  rackOverPin: (d) => rackOverPin({ module: d.length, pressureAngle: d.angle }, d.length),
  shiftFromSpan: (d) => shiftFromSpan(d.gear, d.count, d.length),
  spanMeasurement: (d) => spanMeasurement(d.gear, d.count),
  teethToSpan: (d) => teethToSpan(d.gear),
  centreDistance: (d) => centreDistance(d.mesh),
  gearPair: (d) => gearPair(d.mesh),
  meshPhase: (d) => meshPhase(d.mesh, d.angle, d.length),
  meshState: (d) => meshState(d.mesh, d.length, d.length),
  pitchLineSpeed: (d) => pitchLineSpeed({ module: d.length, teeth: d.count }, d.length),
  involuteOutline: (d) =>
    involuteOutline({ ...d.gear, backlash: d.angle / 9, flankSteps: 3, filletSteps: 3 }),
  toothLimits: (d) => toothLimits({ ...d.gear, backlash: d.angle / 9 }),
  gearProportions: (d) => gearProportions(d.gear),
  rackOutline: (d) =>
    rackOutline({ module: d.length, teeth: 5, pressureAngle: d.angle, back: d.length }),
  rackPlace: (d) => rackPlace({ module: d.length, teeth: d.count }, d.length),
  rackTeethForTravel: (d) => rackTeethForTravel({ module: d.length }, d.length),
  rackTravel: (d) => rackTravel({ module: d.length, teeth: d.count }, d.length),
  ringOutline: (d) => ringOutline({ ...d.gear, flankSteps: 3 }),
  ringPassage: (d) => ringPassage(d.gear, d.count),
  ringProportions: (d) => ringProportions(d.gear),
  basicRack: (d) => basicRack(d.length, 'A'),
  diametralSizes: (d) => diametralSizes(d.length, d.count),
  moduleFromDiametralPitch: (d) => moduleFromDiametralPitch(d.length),
  moduleOfFoundWheel: (d) => moduleOfFoundWheel(d.length, d.count),
  moduleSeries: (d) => moduleSeries(d.length),
  nearestModule: (d) => nearestModule(d.length),
  baseThickness: (d) => baseThickness(d.gear),
  chordalTooth: (d) => chordalTooth(d.gear),
  pointedRadius: (d) => pointedRadius(d.gear),
  toothThickness: (d) => toothThickness(d.gear, d.length),
  toothForce: (d) => toothForce(d.length, d.length, d.angle),
  wormDrive: (d) =>
    wormDrive({ starts: d.count, wheelTeeth: d.count, module: d.length, wormDiameter: d.length }),
  wormEfficiency: (d) => wormEfficiency(d.angle, d.length, d.angle),
  wormHolding: (d) => wormHolding(d.angle, d.length, d.angle),
  wormRatio: (d) => wormRatio(d.count, d.count),
  planetsAssembly: (d) =>
    planetsAssembly({
      sunTeeth: d.count,
      planetTeeth: d.count,
      planets: Math.min(d.count, 99),
      module: d.length,
    }),
  changeWheelRatio: (d) => changeWheelRatio(d.length, d.length),
  beatOfPendulum: (d) => beatOfPendulum(d.length),
  clockBeats: (d) =>
    clockBeats(
      [
        [d.count, d.count],
        [d.count, d.count],
      ],
      d.count,
    ),
  pendulumForBeat: (d) => pendulumForBeat(d.length),
  driftOf: (d) => driftOf(d.length, d.length, d.length),
  rungWithin: (d) => rungWithin(d.length, d.angle),
  huntingTeeth: (d) => huntingTeeth(d.count, d.count),
  wheelPairs: (d) =>
    wheelPairs([
      { x: 0, y: 0, wheels: [{ module: d.length, teeth: d.count }] },
      { x: d.length, y: d.length, wheels: [{ module: 2, teeth: d.count }] },
    ]),
  trainOfLayout: (d) =>
    trainOfLayout([
      { x: 0, y: 0, wheels: [{ module: 2, teeth: d.count }] },
      { x: d.length, y: 0, wheels: [{ module: 2, teeth: d.count }] },
    ]),
  cartWheels: (d) => cartWheels(d.length, d.length, d.length),
  ovalOfPen: (d) => ovalOfPen(d.length, d.length),
  planetaryDrive: (d) =>
    planetaryDrive({ sunTeeth: d.count, planetTeeth: d.count, held: 'ring', driven: 'sun' }),
  planetaryFor: (d) => planetaryFor(d.length, d.count),
  planetaryTorques: (d) => planetaryTorques(d.count, d.count, d.length),
  arborTurns: (d) =>
    arborTurns(
      [
        [d.count, d.count],
        [d.count, d.count],
      ],
      d.length,
    ),
  compoundTrain: (d) =>
    compoundTrain([
      [d.count, d.count],
      [d.count, d.count],
    ]),
  idlerBetween: (d) =>
    idlerBetween({ module: d.length, first: d.count, last: d.count, distance: d.length }),
  simpleTrain: (d) => simpleTrain([d.count, d.count, d.count]),
  closingWheel: (d) =>
    closingWheel({
      firstModule: d.length,
      firstPinion: d.count,
      firstWheel: d.count,
      secondModule: d.length,
      secondPinion: d.count,
    }),
  revertedTeeth: (d) => revertedTeeth(d.length, d.length, Math.min(d.count, 99)),
  nearestTrain: (d) =>
    nearestTrain(
      {
        ratio: d.length,
        wheels: [d.count, d.count, d.count, d.count],
        module: d.length,
        widest: d.length,
      },
      2,
    ),
  turnsOfMeshes: (d) =>
    turnsOfMeshes(
      [{ first: 'a', firstTeeth: d.count, second: 'b', secondTeeth: d.count, carrier: 'c' }],
      { a: d.length, c: d.length },
    ),
};

/** The first number in an answer that is not finite, as a path; null if all are. */
function unsound(value: unknown, path = ''): string | null {
  if (typeof value === 'number') return Number.isFinite(value) ? null : `${path} is ${value}`;
  if (value instanceof Map) return unsound([...value.values()], path);
  if (typeof value !== 'object' || value === null) return null;
  for (const [key, part] of Object.entries(value)) {
    const found = unsound(part, `${path}.${key}`);
    if (found) return found;
  }
  return null;
}

describe('whatever they are given', () => {
  it.each(Object.entries(functions))('%s answers in numbers or refuses by name', (_name, f) => {
    fc.assert(
      fc.property(draws, ([lengths, counts, angles]) => {
        let answer: unknown;
        try {
          answer = f(new Draw(lengths, counts, angles));
        } catch (error) {
          if (!(error instanceof RangeError)) throw error;
          expect(error.message).toMatch(/^\w+: /);
          return;
        }
        expect(unsound(answer)).toBeNull();
      }),
      { seed: 41, numRuns: Number(process.env.HORNBEAM_INPUTS ?? 4000) / 10 },
    );
  });
});
