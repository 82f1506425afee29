import { describe, expect, it } from 'vitest';
import { crankSliderLinkage } from '@/lib/kinematics/linkage/crank-slider';
import { fourBarLinkage } from '@/lib/kinematics/linkage/four-bar-linkage';
import { transmissionExtremes } from '@/lib/kinematics/linkage/four-bar-strokes';
import {
  invertedLinkage,
  slottedLeverLinkage,
} from '@/lib/kinematics/linkage/inverted-crank-slider';
import { peaucellierLinkage } from '@/lib/kinematics/linkage/peaucellier';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';
import {
  branchOf,
  carryOnLinkage,
  placeLinkage,
  startPose,
} from '@/lib/kinematics/linkage/solver/solver';
import { outcome } from '@/tests/support/numbers';
import { planned } from './planned';

const inverted = { crank: 30, frame: 110, arm: 20 };
const far = { crank: 90, frame: 40, arm: 25 };

/** Linkages without a change point, each with the drive from which it is led and the sweep. */
const linkages: readonly (readonly [string, Linkage, number, number])[] = [
  ['inverted, left', invertedLinkage(inverted), 0.3, 2 * Math.PI],
  ['inverted, right', invertedLinkage(inverted, { side: 'right' }), 0.3, 2 * Math.PI],
  ['inverted, all round, left', invertedLinkage(far), 0.3, 4 * Math.PI],
  ['inverted, all round, right', invertedLinkage(far, { side: 'right' }), 0.3, 4 * Math.PI],
  ['slotted lever', slottedLeverLinkage(40, 100, 200), 1, 2 * Math.PI],
  ['crank and slider, right', crankSliderLinkage({ crank: 40, rod: 90, offset: 8 }), 0.3, 6],
  [
    'crank and slider, left',
    crankSliderLinkage({ crank: 40, rod: 90, offset: 8 }, { side: 'left' }),
    0.3,
    6,
  ],
  [
    'four-bar, crossed',
    fourBarLinkage(
      { crank: 40, coupler: 120, rocker: 80, frame: 100 },
      { side: 'crossed', point: { distance: 60, angle: 0.4 } },
    ),
    0.3,
    6,
  ],
  [
    'Peaucellier’s cell',
    peaucellierLinkage({ long: 120, short: 50, crank: 40, centreDistance: 40 }),
    -0.9,
    1.8,
  ],
];

describe('a linkage carried on in the direction of travel', () => {
  it.each(linkages)(
    '%s: stays on its assembly all the way, and goes back',
    (_name, linkage, from, sweep) => {
      const plan = planned(linkage);
      const own = branchOf(plan);
      const carried = branchOf(plan);
      const steps = 360;
      for (const way of [1, -1]) {
        const start = way > 0 ? from : from + sweep;
        const at = (k: number) => [start + (way * k * sweep) / steps];
        const wanted = startPose(plan);
        let [before, now] = [startPose(plan), startPose(plan)];
        expect(placeLinkage(plan, at(0), own, before)).toBe(0);
        expect(placeLinkage(plan, at(1), own, now)).toBe(0);
        for (let k = 2; k <= steps; k += 1) {
          const next = startPose(plan);
          expect(carryOnLinkage(plan, at(k), before, now, carried, next)).toBe(0);
          placeLinkage(plan, at(k), own, wanted);
          const off = next.reduce(
            (most, x, i) => Math.max(most, Math.abs(x - (wanted[i] ?? 0))),
            0,
          );
          expect(off).toBeLessThan(1e-9);
          [before, now] = [now, next];
        }
        expect([...carried]).toEqual([...own]);
      }
    },
  );
});

describe('the worst transmission angle', () => {
  it('is taken from whichever extreme lies nearer to the line', () => {
    const sharp = outcome(
      transmissionExtremes({ crank: 40, coupler: 120, rocker: 80, frame: 100 }),
      'extremes',
    );
    expect(sharp.worst).toBe(sharp.least);
    const blunt = outcome(
      transmissionExtremes({ crank: 40, coupler: 75, rocker: 75, frame: 100 }),
      'extremes',
    );
    // 140 across two sides of 75: 2·asin(70/75)
    expect(blunt.most).toBeCloseTo(2 * Math.asin(70 / 75), 12);
    expect(blunt.worst).toBeCloseTo(Math.min(2 * Math.asin(30 / 75), Math.PI - blunt.most), 12);
    expect(blunt.worst).toBeLessThan(blunt.least);
  });
});
