import { requireMeasure } from '@/lib/numeric/moderate';
import { findRoot } from '@/lib/numeric/root';
import { LENGTH_TOLERANCE, sqrtClamped } from '@/lib/numeric/tolerance';
import { TURN, wrapTurn } from '@/lib/geometry/angle';
import {
  crankSliderPosition,
  requireSlider,
  type CrankSlider,
} from '@/lib/kinematics/linkage/crank-slider';

export interface SliderStroke {
  /** Farthest and nearest place of the slider (on the right), along its line. */
  readonly outer: number;
  readonly inner: number;
  readonly stroke: number;
  /** Crank angle at either, radians from 0 to 2π. */
  readonly crankOuter: number;
  readonly crankInner: number;
  /** Time of the slow stroke over the quick one, 1 or more. */
  readonly timeRatio: number;
}

export type SliderStrokeOutcome =
  | ({ readonly outcome: 'turns-fully' } & SliderStroke)
  /** The rod is too short for a whole turn. */
  | { readonly outcome: 'rod-too-short'; readonly by: number };

/**
 * Ends, stroke and time ratio of a slider on the right of its crank.
 *
 * Outcomes: `turns-fully`; `rod-too-short` by crank + |offset| − rod. Throws `RangeError` for crank
 * or rod that are not positive. Source: right triangles with sides rod ± crank.
 * @example sliderStroke({ crank: 40, rod: 120, offset: 20 }) // → { outcome: 'turns-fully', outer: 158.745079, inner: 77.459667, stroke: 81.285412, crankOuter: 0.125328, crankInner: 3.394273, timeRatio: 1.084501 }
 * @example sliderStroke({ crank: 40, rod: 50, offset: -20 }) // → { outcome: 'rod-too-short', by: 10 }
 */
export function sliderStroke(mechanism: CrankSlider): SliderStrokeOutcome {
  const { crank, rod, offset } = requireSlider('sliderStroke', mechanism);
  const by = crank + Math.abs(offset) - rod;
  if (by > LENGTH_TOLERANCE * (rod + crank)) return { outcome: 'rod-too-short', by };
  const [long, short] = [rod + crank, Math.max(rod - crank, 0)];
  const outer = sqrtClamped((long - offset) * (long + offset));
  const inner = sqrtClamped((short - offset) * (short + offset));
  const atOuter = Math.atan2(offset, outer);
  const atInner = Math.atan2(offset, inner);
  const lacking = Math.abs(atInner - atOuter);
  return {
    outcome: 'turns-fully',
    outer,
    inner,
    stroke: outer - inner,
    crankOuter: wrapTurn(atOuter),
    crankInner: wrapTurn(atInner + Math.PI),
    timeRatio: (Math.PI + lacking) / (Math.PI - lacking),
  };
}

export interface SliderTravel {
  readonly travel: number;
  /** By the usual two terms, `r(1 − cos θ) + r² sin² θ/(2l)`. */
  readonly approximate: number;
  /** Lean of the rod from the slider's line, radians. */
  readonly lean: number;
}

export type SliderTravelOutcome =
  | ({ readonly outcome: 'closes' } & SliderTravel)
  | { readonly outcome: 'does-not-close'; readonly by: number };

/**
 * Travel of an in-line slider from its far end, with the crank turned by `angle` from there.
 *
 * Outcome `does-not-close` with the length that the rod is short. Source: exact geometry; the two
 * terms are the square root's first.
 * @example sliderTravel({ crank: 50, rod: 200 }, radians(60)) // → { outcome: 'closes', travel: 29.743758, approximate: 29.6875, lean: 0.218234 }
 */
export function sliderTravel(
  mechanism: Omit<CrankSlider, 'offset'>,
  angle: number,
): SliderTravelOutcome {
  const { crank, rod } = requireSlider('sliderTravel', {
    crank: mechanism.crank,
    rod: mechanism.rod,
  });
  const found = crankSliderPosition({ crank, rod }, angle);
  if (found.outcome === 'does-not-close') return found;
  const rise = crank * Math.sin(angle);
  const back = 2 * crank * Math.sin(angle / 2) ** 2;
  const reach = sqrtClamped((rod - rise) * (rod + rise));
  return {
    outcome: 'closes',
    travel: back + (rise * rise) / (rod + reach),
    approximate: back + (rise * rise) / (2 * rod),
    lean: Math.atan2(rise, reach),
  };
}

export type FastestOutcome =
  | {
      readonly outcome: 'found';
      /** Crank's turn from the far end, radians, under a quarter turn. */
      readonly crankAngle: number;
      /** Slider's speed there for a crank speed of 1 radian a second. */
      readonly speed: number;
    }
  | { readonly outcome: 'rod-too-short'; readonly by: number };

/**
 * Where an in-line slider is fastest, and how fast.
 *
 * Outcome `rod-too-short` where the rod is no longer than the crank. Source: with
 * y = sin² θ and n = rod/crank, the cubic y³ − n²y² − n⁴y + n⁴ = 0.
 * @example fastestSlider({ crank: 50, rod: 200 }) // → { outcome: 'found', crankAngle: 1.339034, speed: 51.544135 }
 */
export function fastestSlider(mechanism: Omit<CrankSlider, 'offset'>): FastestOutcome {
  const { crank, rod } = requireSlider('fastestSlider', {
    crank: mechanism.crank,
    rod: mechanism.rod,
  });
  if (rod <= crank) return { outcome: 'rod-too-short', by: crank - rod };
  const m = (crank / rod) ** 2;
  const found = findRoot((y) => m * m * y * y * y - m * y * y - y + 1, 0, 1);
  const y = found.outcome === 'found' ? found.x : 1;
  const sine = Math.sqrt(y);
  const cosine = sqrtClamped(1 - y);
  const reach = Math.sqrt(1 - m * y);
  return {
    outcome: 'found',
    crankAngle: Math.atan2(sine, cosine),
    speed: crank * sine * (1 + ((crank / rod) * cosine) / reach),
  };
}

/**
 * Side push of a rod on the slider's guide, as a share of the push along it: tan of the rod's lean.
 * @example sidePush(radians(20)) // → 0.363970
 */
export function sidePush(lean: number): number {
  requireMeasure('sidePush', 'lean', lean);
  if (Math.abs(lean) >= TURN / 4) {
    throw new RangeError(`sidePush: lean is ${lean}; expected less than a quarter turn`);
  }
  return Math.tan(Math.abs(lean));
}
