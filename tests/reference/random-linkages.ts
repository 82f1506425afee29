import fc from 'fast-check';
import { distance, polar, type Point } from '@/lib/geometry/point';
import { crankSliderLinkage } from '@/lib/kinematics/linkage/crank-slider';
import { fourBarLinkage } from '@/lib/kinematics/linkage/four-bar-linkage';
import { hartLinkage } from '@/lib/kinematics/linkage/hart';
import {
  invertedLinkage,
  slottedLeverLinkage,
} from '@/lib/kinematics/linkage/inverted-crank-slider';
import { tongsLinkage } from '@/lib/kinematics/linkage/lazy-tongs';
import { pantographLinkage } from '@/lib/kinematics/linkage/pantograph-linkage';
import { truePantograph } from '@/lib/kinematics/linkage/pantograph-making';
import { peaucellierLinkage } from '@/lib/kinematics/linkage/peaucellier';
import { scottRussellLinkage } from '@/lib/kinematics/linkage/scott-russell';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';
import { trammelLinkage } from '@/lib/kinematics/linkage/trammel-linkage';
import { wattLinkage } from '@/lib/kinematics/linkage/watt';

/** A linkage drawn at random, with a drive at which it is to be tried. */
export interface Drawn {
  readonly linkage: Linkage;
  readonly drive: readonly number[];
}

const length = (least: number, most: number) => fc.double({ min: least, max: most, noNaN: true });
const turn = fc.double({ min: -Math.PI, max: Math.PI, noNaN: true });

/** A bar whose length is that of the pose. */
function bar(points: Readonly<Record<string, Point>>, a: string, b: string) {
  const [from, to] = [points[a], points[b]];
  if (!from || !to) throw new Error(`no point ${a} or ${b}`);
  return { ends: [a, b] as const, length: distance(from, to) };
}

function plate(points: Readonly<Record<string, Point>>, names: readonly string[]) {
  return {
    shape: Object.fromEntries(names.map((name) => [name, points[name] ?? { x: 0, y: 0 }])),
  };
}

/** A six-bar (Stephenson's third): a four-bar with a plate, from which two more bars hang. */
function sixBar(jitter: readonly number[], driven: 'crank' | 'far'): Linkage {
  const move = (x: number, y: number, k: number): Point => ({
    x: x + 12 * (jitter[2 * k] ?? 0),
    y: y + 12 * (jitter[2 * k + 1] ?? 0),
  });
  const points = {
    O2: { x: 0, y: 0 },
    O4: move(100, 0, 0),
    O6: move(190, 20, 1),
    A: move(20, 35, 2),
    B: move(115, 80, 3),
    P: move(80, 110, 4),
    C: move(165, 100, 5),
  };
  return {
    points,
    fixed: ['O2', 'O4', 'O6'],
    bars: [
      bar(points, 'O2', 'A'),
      bar(points, 'O4', 'B'),
      bar(points, 'P', 'C'),
      bar(points, 'O6', 'C'),
    ],
    plates: [plate(points, ['A', 'B', 'P'])],
    drivers: [
      driven === 'crank'
        ? { kind: 'angle', from: 'O2', to: 'A' }
        : { kind: 'angle', from: 'O6', to: 'C' },
    ],
  };
}

function sixBarDrawn(driven: 'crank' | 'far'): fc.Arbitrary<Drawn> {
  const jitter = fc.array(length(-1, 1), { minLength: 12, maxLength: 12 });
  return fc.tuple(jitter, length(-0.1, 0.1)).map(([drawn, moved]) => {
    const linkage = sixBar(drawn, driven);
    const [from, to] = driven === 'crank' ? ['O2', 'A'] : ['O6', 'C'];
    const [a, b] = [linkage.points[from ?? ''], linkage.points[to ?? '']];
    if (!a || !b) throw new Error('no driver');
    return { linkage, drive: [Math.atan2(b.y - a.y, b.x - a.x) + moved] };
  });
}

/** Linkages of every family of the lessons, each drawn from its own ranges. */
export const drawnLinkages: Readonly<Record<string, fc.Arbitrary<Drawn>>> = {
  'four-bar': fc
    .tuple(length(20, 60), length(60, 140), length(60, 140), length(60, 140), turn, fc.boolean())
    .map(([crank, coupler, rocker, frame, angle, open]) => ({
      linkage: fourBarLinkage(
        { crank, coupler, rocker, frame },
        { side: open ? 'open' : 'crossed', point: { distance: crank, angle: 0.7 } },
      ),
      drive: [angle],
    })),
  'six-bar, driven at its crank': sixBarDrawn('crank'),
  'six-bar, driven where no dyad begins': sixBarDrawn('far'),
  'crank and slider': fc
    .tuple(length(20, 60), length(80, 200), length(-15, 15), turn, fc.boolean())
    .map(([crank, rod, offset, angle, right]) => ({
      linkage: crankSliderLinkage({ crank, rod, offset }, { side: right ? 'right' : 'left' }),
      drive: [angle],
    })),
  'slotted lever': fc
    .tuple(length(20, 60), length(70, 150), length(150, 300), turn)
    .map(([crank, centres, lever, angle]) => ({
      linkage: slottedLeverLinkage(crank, centres, lever),
      drive: [angle],
    })),
  'inverted crank and slider': fc
    .tuple(length(20, 40), length(80, 150), length(10, 35), turn, fc.boolean())
    .map(([crank, frame, arm, angle, left]) => ({
      linkage: invertedLinkage({ crank, frame, arm }, { side: left ? 'left' : 'right' }),
      drive: [angle],
    })),
  trammel: fc
    .tuple(length(50, 200), length(-200, 40), length(-60, 60), length(1.1, 2), turn)
    .map(([uprightPin, levelPin, beside, grooveAngle, angle]) => ({
      linkage: trammelLinkage({ uprightPin, levelPin, beside, grooveAngle }),
      drive: [angle],
    })),
  pantograph: fc
    .tuple(
      length(250, 400),
      length(250, 400),
      length(0.2, 0.8),
      turn,
      length(0.35, 0.9),
      fc.constantFrom(
        'middle-to-end' as const,
        'end-to-middle' as const,
        'across-the-middle' as const,
      ),
    )
    .map(([first, second, share, angle, reach, setUp]) => {
      const arm = setUp === 'end-to-middle' ? 1 : share;
      const at = polar(
        arm * (Math.abs(first - second) + reach * (first + second - Math.abs(first - second))),
        angle,
      );
      return {
        linkage: pantographLinkage(truePantograph(first, second, share * first), setUp),
        drive: [at.x, at.y],
      };
    }),
  'Watt’s linkage': fc
    .tuple(length(80, 140), length(80, 140), length(40, 80), length(-0.4, 0.4))
    .map(([arm1, arm2, link, angle]) => ({
      linkage: wattLinkage({ arm1, arm2, link }),
      drive: [angle],
    })),
  'Peaucellier’s cell': fc
    .tuple(length(110, 140), length(45, 60), length(45, 50), length(-0.9, 0.9))
    .map(([long, short, crank, angle]) => ({
      linkage: peaucellierLinkage({ long, short, crank, centreDistance: crank }),
      drive: [angle],
    })),
  'Hart’s inversor': fc
    .tuple(length(140, 170), length(70, 90), length(0.35, 0.65), length(-0.6, 0.6))
    .map(([long, short, share, angle]) => ({
      linkage: hartLinkage({ long, short, share }, 30),
      drive: [angle],
    })),
  'Scott Russell’s linkage': fc
    .tuple(length(50, 80), length(90, 140), turn)
    .map(([crank, rod, angle]) => ({
      linkage: scottRussellLinkage({ crank, rod }),
      drive: [angle],
    })),
  'lazy tongs': fc
    .tuple(fc.integer({ min: 2, max: 8 }), length(80, 200), length(0.4, 1.2))
    .map(([stages, long, angle]) => ({
      linkage: tongsLinkage({ stages, bar: long }),
      drive: [angle],
    })),
};
