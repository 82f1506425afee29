import 'server-only';
import type { Field } from '@/lib/quantities/field';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import { pantographFigures } from './drawing-and-copying/pantograph.figures';
import { trammelFigures } from './drawing-and-copying/trammel-and-oval.figures';
import { trainFigures } from './toothed-wheels/train-of-toothed-wheels.figures';

/** One step of a worked example: what is done, and what comes out. */
export interface WorkedStep {
  readonly text: string;
  readonly value: string;
  /** What it comes to, where that is one quantity: a learner's own is compared with it. */
  readonly result?: { readonly value: number; readonly field: Field };
}

/** A worked example with the numbers drawn for this reader; its last steps fade first. */
export interface WorkedExample {
  readonly question: string;
  readonly givens: readonly {
    readonly symbol: string;
    readonly label: string;
    readonly value: string;
    readonly unit: string;
  }[];
  readonly steps: readonly WorkedStep[];
  /** A way to see for oneself that the result holds. */
  readonly check?: string;
}

/** The numbers of a lesson: those of its prose by name, and its worked example. */
export interface LessonFigures {
  readonly values: Readonly<Record<string, { readonly text: string }>>;
  readonly worked: WorkedExample;
}

/** How one lesson works out its numbers. */
export type FiguresOf = (units: UnitSystem, seed: number) => LessonFigures;

const figuresByLesson: Readonly<Record<string, FiguresOf>> = {
  'train-of-toothed-wheels': trainFigures,
  'trammel-and-oval': trammelFigures,
  pantograph: pantographFigures,
};

/**
 * The numbers that a lesson's prose and worked example show, in one unit system. The worked example
 * is drawn from `seed`; the prose does not depend on it.
 * Throws a `RangeError` for a lesson that has no figures.
 */
export function lessonFigures(lessonId: string, units: UnitSystem, seed: number): LessonFigures {
  const figuresOf = figuresByLesson[lessonId];
  if (figuresOf === undefined) throw new RangeError(`lessonFigures: no lesson called ${lessonId}`);
  return figuresOf(units, seed);
}
