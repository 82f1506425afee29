import { between, type Point } from '@/lib/geometry/point';
import { ruleText } from './measure';
import type { Shape } from './scene';
import { hatch, label, line, outline } from './strokes';
import type { SetPair, SetWheel, TrainSetup } from './train-setup';

/** What does not fit, drawn in madder: open gaps, and teeth that run into each other. */
export function troubles(setup: TrainSetup): readonly Shape[] {
  return setup.pairs.flatMap((pair): readonly Shape[] => {
    if (pair.state.outcome === 'apart') return gap(pair, setup);
    return pair.state.outcome === 'too-close' ? overlap(pair, setup) : [];
  });
}

function gap({ first, second, state }: SetPair, setup: TrainSetup): readonly Shape[] {
  const angle = Math.atan2(second.centre.y - first.centre.y, second.centre.x - first.centre.x);
  const [c, s] = [Math.cos(angle), Math.sin(angle)];
  const rim = ({ centre, pitchRadius }: SetWheel, way: number): Point => ({
    x: centre.x + way * pitchRadius * c,
    y: centre.y + way * pitchRadius * s,
  });
  const [from, to] = [rim(first, 1), rim(second, -1)];
  return [
    ...[first, second].map(({ centre, pitchRadius }): Shape => ({
      kind: 'circle',
      role: 'limit',
      centre,
      radius: pitchRadius,
    })),
    line('limit', from, to),
    label(ruleText(state.gap, setup.spec.units), between(from, to, 0.5), {
      role: 'madder',
      nudge: { x: 0, y: 13 },
    }),
  ];
}

function overlap({ first, second, distance, state }: SetPair, setup: TrainSetup): readonly Shape[] {
  const lens = lensOf(first, second, distance);
  const points = lens.flatMap(({ x, y }) => [x, y]);
  const middle = lens[0] ?? first.centre;
  return [
    outline('clash', lens, true),
    ...hatch(points, setup.spec.module),
    label(ruleText(-state.gap, setup.spec.units), middle, {
      role: 'madder',
      nudge: { x: 0, y: 12 },
    }),
  ];
}

/** The region common to two tip circles. */
function lensOf(first: SetWheel, second: SetWheel, distance: number): readonly Point[] {
  const side = (of: SetWheel, other: SetWheel): Point[] => {
    const [r, q] = [of.tipRadius, other.tipRadius];
    const cosine = (r * r + distance * distance - q * q) / (2 * r * distance);
    const half = Math.acos(Math.min(1, Math.max(-1, cosine)));
    const towards = Math.atan2(other.centre.y - of.centre.y, other.centre.x - of.centre.x);
    return Array.from({ length: 13 }, (_, i) => {
      const angle = towards - half + (half * i) / 6;
      return { x: of.centre.x + r * Math.cos(angle), y: of.centre.y + r * Math.sin(angle) };
    });
  };
  return [...side(first, second), ...side(second, first)];
}
