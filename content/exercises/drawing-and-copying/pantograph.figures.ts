import { pantographCopy } from '@/lib/kinematics/linkage/pantograph';
import { pantographHoles, strayAtPen } from '@/lib/kinematics/linkage/pantograph-making';
import { pantographReach } from '@/lib/kinematics/linkage/pantograph-reach';
import type { PantographSetUp } from '@/lib/scene/bench-spec';
import { rolesOf } from '@/lib/scene/pantograph-setup';
import { createSource } from '@/lib/marking/source';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import { write } from '@/lib/quantities/write';
import type { LessonFigures, WorkedExample } from '../figures';
import { drawSize, givenLength, givenNumber, inUnits, lengthStep, plain, said } from '../sizes';

const degree = Math.PI / 180;
const elbow = { least: 30 * degree, most: 150 * degree };

/** The numbers of the lesson on the pantograph. */
export function pantographFigures(units: UnitSystem, seed: number): LessonFigures {
  const bar = inUnits(units, 400, 16);
  const hole = inUnits(units, 100, 4);
  const drilled = inUnits(units, 0.5, 1 / 64);
  const knock = inUnits(units, 1, 1 / 32);
  const pair = inUnits(units, 0.2, 0.008);
  const { pen } = pantographReach(equalBars(bar, bar / 2), 'middle-to-end', elbow);
  const texts = {
    'reach-bar': said(bar, units),
    'reach-closed': write(elbow.least / degree, '°'),
    'reach-opened': write(elbow.most / degree, '°'),
    'reach-near': said(pen.least, units, inUnits(units, 0, 1)),
    'reach-far': said(pen.most, units, inUnits(units, 0, 1)),
    'role-end': copyScale(units, 'middle-to-end'),
    'role-exchanged': copyScale(units, 'end-to-middle'),
    'role-middle': copyScale(units, 'across-the-middle'),
    'role-middle-back': copyScale(units, 'across-the-middle-from-the-end'),
    knock: said(knock, units),
    'knock-pen': said((scaleOf(3 * hole, hole) - 1) * knock, units),
    'drill-hole': said(hole, units),
    'drill-error': said(drilled, units),
    'drill-true': plain(scaleOf(3 * hole, hole)),
    'drill-scale': plain(scaleOf(3 * hole, hole + drilled)),
    'pair-hole': said(hole, units),
    'pair-error': said(pair, units),
    'pair-share': `${plain(100 * (1 - scaleOf(3 * hole, hole + pair) / scaleOf(3 * hole, hole)), 1)} %`,
  };
  const values = Object.fromEntries(Object.entries(texts).map(([name, text]) => [name, { text }]));
  return { values, worked: holesAndReach(units, seed) };
}

function equalBars(bar: number, hole: number) {
  return { first: bar, second: bar, firstHole: hole, secondHole: hole };
}

/** The scale of two equal bars with both holes alike, the pen at the end. */
function scaleOf(bar: number, hole: number): number {
  const copy = pantographCopy(equalBars(bar, hole), 'middle-to-end');
  return copy.outcome === 'true' ? copy.scale : NaN;
}

/** The scale of the lesson's bench with its pins left alone, as copy to drawing: `3 : 1`. */
function copyScale(units: UnitSystem, setUp: PantographSetUp): string {
  const hole = inUnits(units, 100, 4);
  const copy = pantographCopy(equalBars(3 * hole, hole), rolesOf(setUp));
  const scale = copy.outcome === 'true' ? Math.abs(copy.scale) : NaN;
  return scale >= 1 ? `${plain(scale)} : 1` : `1 : ${plain(1 / scale)}`;
}

const scales = ['3/2', '2', '5/2', '3'] as const;
const scaleValues: Readonly<Record<(typeof scales)[number], number>> = {
  '3/2': 3 / 2,
  '2': 2,
  '5/2': 5 / 2,
  '3': 3,
};

/** Where do the holes go, and how large may the drawing be? */
function holesAndReach(units: UnitSystem, seed: number): WorkedExample {
  const source = createSource(seed);
  const bar = drawSize(source, units, { mm: [400, 600, 20], in: [16, 24, 1] });
  const scale = source.pick(scales);
  const high = drawSize(source, units, { mm: [50, 100, 5], in: [2, 4, 1 / 4] });
  const stray = inUnits(units, 0.5, 1 / 64);
  const k = scaleValues[scale];
  const holes = pantographHoles(bar, bar, k, 'middle-to-end');
  if (holes.outcome !== 'holes') throw new RangeError(`holesAndReach: ${holes.outcome}`);
  const { stylus } = pantographReach(equalBars(bar, holes.firstHole), 'middle-to-end', elbow);
  const say = (value: number) => said(value, units);
  const step = (text: string, value: number) => lengthStep(text, value, units);
  return {
    question: 'Where do the holes go for this scale, and how large may the drawing be?',
    givens: [
      givenLength('L', 'both long bars', bar, units),
      givenNumber('k', 'scale wanted', scale),
      givenLength('H', 'the drawing is high', high, units),
      givenNumber(
        '',
        'the elbow works from',
        `${write(elbow.least / degree, '°')} to ${write(elbow.most / degree, '°')}`,
      ),
      givenLength('ε', 'the stylus may stray by', stray, units),
    ],
    steps: [
      step('The hole on the first bar, from the fixed pin: L ÷ k.', holes.firstHole),
      step('The same share on the second bar, from the elbow.', holes.secondHole),
      {
        text: 'The bar that carries the stylus is as long as that share; the other short bar is what is left of L.',
        value: `${say(holes.stylusBar)} and ${say(holes.otherBar)}`,
      },
      step('The copy is high: k × H.', k * high),
      step(
        'The depth within reach at the stylus, straight out: 2L × (sin of half the widest − sin of half the narrowest) ÷ k.',
        stylus.most - stylus.least,
      ),
      step('What a stray of the stylus becomes at the pen.', strayAtPen(k, stray)),
    ],
    check: `The drawing, ${say(high)} high, has to fit into that depth; and the two short bars together make ${plain(holes.stylusBar + holes.otherBar)} again.`,
  };
}
