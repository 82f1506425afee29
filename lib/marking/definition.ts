import type { Field } from '@/lib/quantities/field';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import type { Source } from './source';
import type { Tolerance } from './tolerance';

/** The six kinds of exercise. */
export type ExerciseKind = 'number' | 'choice' | 'setting' | 'design' | 'prediction' | 'build';

/** What a draw settles: plain values, stored with the round as they were drawn. */
export type Givens = Readonly<Record<string, number | string | boolean>>;

/** An option as it stands in one round: its random id, and which of the definition's options it is. */
export interface ShuffledOption {
  readonly id: string;
  readonly option: string;
}

/** One exercise with its drawn parameters: plain JSON, kept with the round. */
export interface Variant<G extends Givens = Givens> {
  readonly exerciseId: string;
  readonly version: number;
  readonly units: UnitSystem;
  readonly seed: number;
  /** How often the source was drawn before a variant was kept. */
  readonly draws: number;
  readonly givens: G;
  /** The options of each choice part, in the order in which this round shows them. */
  readonly options: Readonly<Record<string, readonly ShuffledOption[]>>;
}

/** A bench as plain data. Marking hands it on and never looks inside. */
export interface Figure {
  readonly bench: string;
}

/** A value the learner is told, in the unit of the round. */
export interface Given {
  readonly symbol: string;
  readonly label: string;
  readonly value: string;
  readonly unit: string;
}

/** The values of earlier number parts: the true ones, or the learner's own for follow-through. */
export type Earlier = Readonly<Record<string, number>>;

/**
 * A setting of a bench's controls, in millimetres, radians, counts and names; or of a design's
 * fields, each in the unit of its field.
 */
export type Setting = Readonly<Record<string, number | string>>;

interface PartBase {
  readonly key: string;
  /** The skills this part shows; they must be among the exercise's own. */
  readonly skills: readonly string[];
  /** Its share of the whole, in proportion to the other parts; 1 unless said otherwise. */
  readonly weight?: number;
}

/** A known wrong turn of a number part, with the value it leads to. */
export interface NumberSlip<G extends Givens = Givens> {
  readonly id: string;
  /** The value the slip gives, in the field's unit, or `null` where it makes no sense. */
  value(variant: Variant<G>, earlier: Earlier): number | null;
  advice(variant: Variant<G>, earlier: Earlier): string;
}

/** A quantity asked for. */
export interface NumberPart<G extends Givens = Givens> extends PartBase {
  readonly kind: 'number';
  label(variant: Variant<G>): string;
  field(units: UnitSystem): Field;
  tolerance(units: UnitSystem): Tolerance;
  /**
   * The right value in the field's unit. `earlier` holds the values of the parts before; a part that
   * uses them is marked with the learner's own where those differ.
   */
  answer(variant: Variant<G>, earlier: Earlier): number;
  readonly slips: readonly NumberSlip<G>[];
}

/** An option of a choice part. `letter` is the one its place in this round gives it: A, B, C … */
export interface ChoiceOption<G extends Givens = Givens> {
  readonly option: string;
  label(variant: Variant<G>, letter: string): string;
  figure?(variant: Variant<G>): Figure;
}

/** A known wrong turn of a choice part: a set of options, all of them chosen. */
export interface ChoiceSlip<G extends Givens = Givens> {
  readonly id: string;
  options(variant: Variant<G>): readonly string[];
  advice(variant: Variant<G>): string;
}

/** One or several of some options. */
export interface ChoicePart<G extends Givens = Givens> extends PartBase {
  readonly kind: 'choice';
  readonly multiple?: boolean;
  label(variant: Variant<G>): string;
  readonly options: readonly ChoiceOption<G>[];
  /** The options that together are right. */
  answer(variant: Variant<G>): readonly string[];
  readonly slips: readonly ChoiceSlip<G>[];
}

/** One thing that a setting or design must satisfy, marked on its own. */
export interface Criterion<G extends Givens = Givens> {
  readonly key: string;
  readonly weight?: number;
  readonly skills?: readonly string[];
  label(variant: Variant<G>): string;
  met(setting: Setting, variant: Variant<G>): boolean;
  /** What is amiss, in the learner's own numbers, when it is not met. */
  message(setting: Setting, variant: Variant<G>): string;
}

/** A known wrong turn of a setting or design: a condition on what was set. */
export interface SettingSlip<G extends Givens = Givens> {
  readonly id: string;
  holds(setting: Setting, variant: Variant<G>): boolean;
  advice(variant: Variant<G>, setting: Setting): string;
  /** One setting that makes this slip, for the answer key and the tests; `null` where there is none. */
  example(variant: Variant<G>): Setting | null;
}

/** A control that is part of the answer, with what it may hold. */
export type Control =
  | {
      readonly name: string;
      /** A count takes whole numbers only. */
      readonly kind: 'number' | 'count';
      readonly least: number;
      readonly most: number;
    }
  | { readonly name: string; readonly kind: 'one-of'; readonly values: readonly string[] };

interface MarkedByCriteria<G extends Givens> extends PartBase {
  label(variant: Variant<G>): string;
  readonly criteria: readonly Criterion<G>[];
  readonly slips: readonly SettingSlip<G>[];
  /** One right setting; criteria decide, so others may be right as well. */
  answer(variant: Variant<G>): Setting;
  /** What was set, in words and in the round's unit. */
  echo(setting: Setting, variant: Variant<G>): string;
}

/** A bench to be set until it does what was asked. */
export interface SettingPart<G extends Givens = Givens> extends MarkedByCriteria<G> {
  readonly kind: 'setting';
  controls(units: UnitSystem): readonly Control[];
}

/** A free choice in a design: one from the stock, or a quantity written in. */
export type DesignField =
  | {
      readonly kind: 'stock';
      readonly key: string;
      readonly label: string;
      readonly choices: readonly { readonly value: number; readonly label: string }[];
    }
  | {
      readonly kind: 'quantity';
      readonly key: string;
      readonly label: string;
      readonly field: Field;
    };

/** A specification to be met with free choices. */
export interface DesignPart<G extends Givens = Givens> extends MarkedByCriteria<G> {
  readonly kind: 'design';
  fields(variant: Variant<G>): readonly DesignField[];
}

/** One thing asked. */
export type Part<G extends Givens = Givens> =
  NumberPart<G> | ChoicePart<G> | SettingPart<G> | DesignPart<G>;

/**
 * One exercise, defined once. Its functions are pure: the same variant gives the same words and
 * values. They are written as methods, so that a definition with givens of its own may stand in the
 * registry beside all others.
 */
export interface ExerciseDefinition<G extends Givens = Givens> {
  readonly id: string;
  /** Raised whenever stored variants would be read differently. */
  readonly version: number;
  readonly kind: ExerciseKind;
  readonly lesson: string;
  readonly title: string;
  readonly skills: readonly string[];
  /** One draw, or `null` when the draw's own constraint does not hold. */
  draw(source: Source, units: UnitSystem): G | null;
  prompt(variant: Variant<G>): string;
  givens(variant: Variant<G>): readonly Given[];
  readonly parts: readonly Part<G>[];
  figure?(variant: Variant<G>): Figure;
  /** The idea, the formula, the first line of working. */
  hints(variant: Variant<G>): readonly [string, string, string];
  /** The whole reasoning with this variant's numbers, line by line. */
  solution(variant: Variant<G>): readonly string[];
  /** What to look at once a prediction has been made. */
  afterwards?(variant: Variant<G>): string;
}

/** A definition with its own givens, as the registry takes it. */
export function defineExercise<G extends Givens>(
  definition: ExerciseDefinition<G>,
): ExerciseDefinition<G> {
  return definition;
}
