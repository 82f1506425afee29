import {
  ellipsePerimeter,
  ellipsePerimeterRamanujan2,
  type EllipseSize,
} from '@/lib/geometry/ellipse';
import { barLength, grooveLength, pinsApart } from '@/lib/kinematics/linkage/trammel-making';
import { trammelForOval, trammelOval, trammelPose } from '@/lib/kinematics/linkage/trammel';
import { findExtremes } from '@/lib/numeric/extremes';
import { createSource } from '@/lib/marking/source';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import { write } from '@/lib/quantities/write';
import type { LessonFigures, WorkedExample } from '../figures';
import { drawSize, givenLength, inUnits, lengthStep, plain, said } from '../sizes';

const degree = Math.PI / 180;

/** The numbers of the lesson on the trammel. */
export function trammelFigures(units: UnitSystem, seed: number): LessonFigures {
  const length = inUnits(units, 600, 24);
  const width = inUnits(units, 360, 14);
  const cutter = inUnits(units, 12, 1 / 2);
  const strip = inUnits(units, 3, 1 / 8);
  const bar = 45 * degree;
  const widest = widestBar(length, width);
  const skewed = askew(length, width, degree);
  const texts = {
    'explore-length': said(length, units),
    'explore-width': said(width, units),
    'explore-bar': angle(bar),
    'explore-pen': angle(penAngle(length, width, bar)),
    'widest-bar': angle(widest),
    'widest-gap': angle(widest - penAngle(length, width, widest)),
    skew: angle(degree),
    'skew-size': within(skewed.size, units, inUnits(units, 2, 3)),
    'skew-turn': write(skewed.turn / degree, '°', 2),
    'edge-flat': shortBy({ semiMajor: 10, semiMinor: 1 }),
    'edge-line': shortBy({ semiMajor: 1, semiMinor: 0 }),
    cutter: said(cutter, units),
    'cutter-error': within(edgeError(length, width, cutter / 2), units, inUnits(units, 1, 3)),
    'strip-thickness': said(strip, units),
    'strip-extra': said(Math.PI * strip, units, inUnits(units, 1, 2)),
  };
  const values = Object.fromEntries(Object.entries(texts).map(([name, text]) => [name, { text }]));
  return { values, worked: porthole(units, seed) };
}

function angle(radians: number): string {
  return write(radians / degree, '°', 1);
}

/** A bound, rounded up, so that what is said to lie within it does. */
function within(size: number, units: UnitSystem, places: number): string {
  return said(Math.ceil(size * 10 ** places) / 10 ** places, units, places);
}

/** The pen's angle seen from the middle, for a bar turned by `bar` from the long axis. */
function penAngle(length: number, width: number, bar: number): number {
  const { pen } = trammelPose(trammelForOval(length, width), bar);
  return Math.atan2(pen.y, pen.x);
}

/** The bar's angle at which the pen's angle falls farthest behind it. */
function widestBar(length: number, width: number): number {
  return findExtremes((bar) => bar - penAngle(length, width, bar), 0, Math.PI / 2).most.at;
}

/** What a groove out of square does to an oval: the change of its size, and how far it lies askew. */
function askew(length: number, width: number, skew: number) {
  const pins = trammelForOval(length, width);
  const { semiMajor, semiMinor, majorAxis } = trammelOval({
    ...pins,
    grooveAngle: Math.PI / 2 - skew,
  });
  const size = Math.max(Math.abs(2 * semiMajor - length), Math.abs(2 * semiMinor - width));
  return { size, turn: Math.min(majorAxis, Math.PI - majorAxis) };
}

/** By how much the closed form for the edge runs short, in per cent with one figure. */
function shortBy(size: EllipseSize): string {
  const exact = ellipsePerimeter(size);
  const share = (100 * (exact - ellipsePerimeterRamanujan2(size))) / exact;
  return `${Number(share.toPrecision(1))} %`;
}

/**
 * How far the edge that a round cutter leaves strays from the oval wanted, when both pins are set
 * nearer by the cutter's radius: the edge runs one radius outside the line of the cutter's middle.
 */
function edgeError(length: number, width: number, radius: number): number {
  const [a, b] = [length / 2, width / 2];
  const [f, n] = [a - radius, b - radius];
  const stray = (t: number) => {
    const across = Math.hypot(n * Math.cos(t), f * Math.sin(t));
    const x = f * Math.cos(t) + (radius * n * Math.cos(t)) / across;
    const y = n * Math.sin(t) + (radius * f * Math.sin(t)) / across;
    const slope = 2 * Math.hypot(x / a ** 2, y / b ** 2);
    return Math.abs((x / a) ** 2 + (y / b) ** 2 - 1) / slope;
  };
  return findExtremes(stray, 0, Math.PI / 2).most.value;
}

/** Which pins, grooves and bar does the porthole need, and how long is its edge? */
function porthole(units: UnitSystem, seed: number): WorkedExample {
  const { length, width, slider, beyond } = drawPorthole(units, seed);
  const pins = trammelForOval(length, width);
  const apart = pinsApart(pins);
  const edge = ellipsePerimeterRamanujan2({ semiMajor: length / 2, semiMinor: width / 2 });
  const step = (text: string, value: number) => lengthStep(text, value, units);
  return {
    question:
      'Which pins, grooves and bar does the museum’s porthole need, and how far is it round the edge?',
    givens: [
      givenLength('ℓ', 'length', length, units),
      givenLength('w', 'width', width, units),
      givenLength('s', 'slider', slider, units),
      givenLength('e', 'wood beyond pen and pin', beyond, units),
    ],
    steps: [
      step('Half of the length: from the pencil to the far pin.', pins.uprightPin),
      step('Half of the width: from the pencil to the near pin.', pins.levelPin),
      step('The pins apart: the difference of the two.', apart),
      step(
        'Each pin travels twice that; add one slider for the groove.',
        grooveLength(pins, slider),
      ),
      step(
        'The bar: from the far pin to the pencil, and wood beyond both.',
        barLength(pins, beyond),
      ),
      step('Round the edge, by the rule.', edge),
    ],
    check: `Round the edge must be more than the round of the mean diameter, ${plain((Math.PI * (length + width)) / 2, 1)}, and less than the box around it, ${plain(2 * (length + width), 1)}.`,
  };
}

/** Three draws in eight fit: so many misses in a row mean that the ranges are wrong. */
const mostTries = 200;

function drawPorthole(units: UnitSystem, seed: number) {
  const source = createSource(seed);
  for (let tries = 0; tries < mostTries; tries += 1) {
    const length = drawSize(source, units, { mm: [400, 700, 20], in: [16, 28, 1] });
    const width = drawSize(source, units, { mm: [240, 420, 20], in: [9, 17, 1] });
    const slider = source.pick(units === 'metric' ? [40, 50, 60] : [1.5, 2, 2.5]);
    const beyond = source.pick(units === 'metric' ? [25, 30] : [1, 1.25]);
    if (width >= 0.5 * length && width <= 0.8 * length) return { length, width, slider, beyond };
  }
  throw new RangeError(`drawPorthole: no fitting oval in ${mostTries} draws of seed ${seed}`);
}
