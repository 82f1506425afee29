import { toothedPulleyDiameter } from '@/lib/kinematics/belt/chain';
import { beltLoop, centresForLoop } from '@/lib/kinematics/belt/two-wheels';
import { requireSize } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';

/** Two pulleys and a toothed belt. */
export interface ToothedBeltSpec {
  readonly pitch: number;
  readonly firstTeeth: number;
  readonly secondTeeth: number;
}

export type ToothedBeltLength =
  | {
      readonly outcome: 'belt';
      /** Along the pitch line. */
      readonly length: number;
      /** In pitches; rarely whole. */
      readonly exactTeeth: number;
      /** The nearest whole belt, and the centres that suit it. */
      readonly teeth: number;
      readonly centreDistance: number;
    }
  | { readonly outcome: 'wheels-meet'; readonly overlap: number }
  | { readonly outcome: 'loop-too-short'; readonly lacking: number };

/**
 * Length of a toothed belt on two pulleys, the nearest whole belt, and the centres for it.
 *
 * - `belt`; `wheels-meet` at these centres; `loop-too-short` when no centres suit the whole belt.
 *
 * @throws RangeError for nonsense.
 * Source: pitch circles p·z/π as an open belt.
 * @example toothedBelt({ pitch: 5, firstTeeth: 20, secondTeeth: 40 }, 100).outcome // → 'belt'
 */
export function toothedBelt(spec: ToothedBeltSpec, centreDistance: number): ToothedBeltLength {
  const pitch = requireSize('toothedBelt', 'pitch', spec.pitch);
  requireCount('toothedBelt', 'firstTeeth', spec.firstTeeth, 3);
  requireCount('toothedBelt', 'secondTeeth', spec.secondTeeth, 3);
  const wheels = {
    first: toothedPulleyDiameter(pitch, spec.firstTeeth),
    second: toothedPulleyDiameter(pitch, spec.secondTeeth),
    lay: 'open' as const,
  };
  const loop = beltLoop({ ...wheels, centreDistance });
  if (loop.outcome !== 'loop') return loop;
  const exactTeeth = loop.length / pitch;
  const teeth = Math.round(exactTeeth);
  const centres = centresForLoop(wheels, teeth * pitch);
  if (centres.outcome !== 'centres') return centres;
  return {
    outcome: 'belt',
    length: loop.length,
    exactTeeth,
    teeth,
    centreDistance: centres.distance,
  };
}
