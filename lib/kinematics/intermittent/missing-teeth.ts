import { finiteResult } from '@/lib/numeric/finite-result';
import { requireCount, requireWithin } from '@/lib/numeric/require';

/** A driver whose full circle would carry `fullTeeth`, with `teethLeft` of them, and its wheel. */
export interface MissingTeeth {
  readonly fullTeeth: number;
  readonly teethLeft: number;
  readonly wheelTeeth: number;
}

/** What a driver with missing teeth does to its wheel in one turn. */
export interface MissingTeethMotion {
  /** The wheel's step. */
  readonly step: number;
  /** The parts of the driver's turn in which the wheel moves and rests. */
  readonly movingShare: number;
  readonly restShare: number;
  /** Turns of the driver for one round of the wheel, whole or not. */
  readonly turnsForRound: number;
}

/** The motion, or why the pair cannot work. */
export type MissingTeethOutcome =
  | ({ readonly outcome: 'steps'; readonly hollows: number } & MissingTeethMotion)
  /** The hollows for the rests do not come round: the first one comes late by `late`. */
  | ({ readonly outcome: 'hollows-do-not-fit'; readonly late: number } & MissingTeethMotion)
  /** More teeth are left than the circle has, by `by`. */
  | { readonly outcome: 'too-many-teeth'; readonly by: number };

/**
 * What a driver with missing teeth does: each tooth that is left passes one tooth.
 *
 * Radians. `hollows-do-not-fit` if the teeth left do not divide those of the wheel: after the last
 * whole step of a round the next hollow comes `late` by that angle of the wheel.
 *
 * @throws RangeError for counts that are none.
 * @see step 2π·k/v, moving share k/u, v/k hollows: exact counting.
 * @example missingTeeth({ fullTeeth: 24, teethLeft: 6, wheelTeeth: 48 }) // → { outcome: 'steps', step: 0.785398, restShare: 0.75, turnsForRound: 8, hollows: 8 }
 */
export function missingTeeth(pair: MissingTeeth): MissingTeethOutcome {
  const { fullTeeth, teethLeft, wheelTeeth } = pair;
  requireCount('missingTeeth', 'fullTeeth', fullTeeth);
  requireCount('missingTeeth', 'teethLeft', teethLeft);
  requireCount('missingTeeth', 'wheelTeeth', wheelTeeth);
  const by = teethLeft - fullTeeth;
  if (by > 0) return { outcome: 'too-many-teeth', by };
  const motion = {
    step: (2 * Math.PI * teethLeft) / wheelTeeth,
    movingShare: teethLeft / fullTeeth,
    restShare: -by / fullTeeth,
    turnsForRound: wheelTeeth / teethLeft,
  };
  const over = wheelTeeth % teethLeft;
  if (over !== 0) {
    const late = (2 * Math.PI * (teethLeft - over)) / wheelTeeth;
    return { outcome: 'hollows-do-not-fit', late, ...motion };
  }
  return { outcome: 'steps', hollows: motion.turnsForRound, ...motion };
}

/** The teeth of a driver for a number of places, or how the wish does not come out even. */
export type DriverTeeth =
  | { readonly outcome: 'found'; readonly teethLeft: number; readonly fullTeeth: number }
  /** The wheel's teeth are not a multiple of the places: `over` teeth are left over. */
  | { readonly outcome: 'places-do-not-divide'; readonly over: number }
  /** The circle is not a whole number of teeth; the nearest whole one, and the rest it gives. */
  | {
      readonly outcome: 'circle-not-whole';
      readonly teethLeft: number;
      readonly exact: number;
      readonly nearest: number;
      readonly restShare: number;
    };

/** A circle that was meant to be whole misses it by rounding only. */
const wholeTolerance = 1e-9;

/**
 * The driver that stops a wheel of `wheelTeeth` at `places` places in a round and rests for
 * `restShare` of its own turn: the inverse of `missingTeeth`.
 *
 * @throws RangeError for counts that are none, or a share not from 0 up to (but not) 1.
 * @see k = v/S, u = k/(1 − f).
 * @example driverTeeth(48, 8, 0.75) // → { outcome: 'found', teethLeft: 6, fullTeeth: 24 }
 */
export function driverTeeth(wheelTeeth: number, places: number, restShare: number): DriverTeeth {
  requireCount('driverTeeth', 'wheelTeeth', wheelTeeth);
  requireCount('driverTeeth', 'places', places);
  requireWithin('driverTeeth', 'restShare', restShare, 0, 1 - Number.EPSILON);
  const over = wheelTeeth % places;
  if (over !== 0) return { outcome: 'places-do-not-divide', over };
  const teethLeft = wheelTeeth / places;
  const exact = teethLeft / (1 - restShare);
  const nearest = Math.max(teethLeft, Math.round(exact));
  if (Math.abs(exact - nearest) <= wholeTolerance * exact) {
    return { outcome: 'found', teethLeft, fullTeeth: nearest };
  }
  const rest = 1 - teethLeft / nearest;
  return finiteResult('driverTeeth', {
    outcome: 'circle-not-whole',
    teethLeft,
    exact,
    nearest,
    restShare: rest,
  });
}
