import { lengthUnit, type Dimension, type Unit } from './units';
import type { UnitSystem } from './unit-system';

/** What an answer field takes: what it measures, in which unit, and how it is said. */
export interface Field {
  readonly dimension: Dimension;
  /** The unit of a bare number, and of the value that reading gives. */
  readonly unit: Unit;
  /** How many decimal places the field asks for. */
  readonly places?: number;
  /** What is counted ("teeth"), or for a ratio its two members ("crank", "lantern"). */
  readonly of?: readonly string[];
}

/** A length in the person's own unit. */
export function lengthField(units: UnitSystem, places?: number): Field {
  return { dimension: 'length', unit: lengthUnit(units), places };
}

/** A whole number of something: teeth, turns, pins. */
export function countField(noun: string): Field {
  return { dimension: 'count', unit: '', of: [noun] };
}

/** A ratio, always said as turns of one thing for one turn of another. */
export function ratioField(turning: string, forOneTurnOf: string): Field {
  return { dimension: 'ratio', unit: '', of: [turning, forOneTurnOf] };
}

/** How many times as large one thing is as another. */
export const scaleField: Field = { dimension: 'scale', unit: '' };

/** A number without a unit. */
export const plainField: Field = { dimension: 'plain', unit: '' };

/** Turns per minute. */
export const turningField: Field = { dimension: 'turning', unit: 'rpm' };
