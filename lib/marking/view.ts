import { expects } from '@/lib/quantities/expects';
import type { Dimension, Unit } from '@/lib/quantities/units';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import type {
  DesignField,
  ExerciseDefinition,
  ExerciseKind,
  Figure,
  Given,
  Part,
  Variant,
} from './definition';
import { shownOptions } from './mark-choice';

/** How many hints every exercise has: the idea, the formula, the first line of working. */
export const hintsTotal = 3;

/** What the record says about a round. */
export interface RoundFacts<A> {
  readonly roundId: string;
  /** Hints taken, across both unit systems. */
  readonly hintsTaken: number;
  readonly solutionSeen: boolean;
  readonly closed: boolean;
  readonly attempts: readonly A[];
}

/** A field of a number, as it is shown and read. */
interface QuantityView {
  readonly key: string;
  readonly label: string;
  readonly dimension: Dimension;
  readonly unit: Unit;
  readonly expects: string;
}

/** One thing asked, as its learner sees it. */
export type PartShown =
  | (QuantityView & { kind: 'number'; places?: number; of?: string[] })
  | {
      kind: 'choice';
      key: string;
      label: string;
      multiple: boolean;
      options: { id: string; label: string; figure?: Figure }[];
    }
  | { kind: 'setting'; key: string; label: string; controls: string[]; criteria: string[] }
  | {
      kind: 'design';
      key: string;
      label: string;
      fields: (
        | (QuantityView & { kind: 'quantity' })
        | { kind: 'stock'; key: string; label: string; choices: { value: number; label: string }[] }
      )[];
      criteria: string[];
    };

/** A round as its learner sees it: nothing of the answer and of no slip. */
export interface RoundShown<A> {
  roundId: string;
  exerciseId: string;
  version: number;
  kind: ExerciseKind;
  units: UnitSystem;
  title: string;
  prompt: string;
  givens: Given[];
  parts: PartShown[];
  figure?: Figure;
  hints: string[];
  hintsTotal: number;
  attempts: A[];
  closed: boolean;
  unaided: boolean;
  solution?: string[];
}

/**
 * A round as its learner sees it. The worked solution is there only once it was asked for or the
 * round was closed; only the hints that were taken are in it.
 */
export function roundView<A>(
  definition: ExerciseDefinition,
  variant: Variant,
  facts: RoundFacts<A>,
): RoundShown<A> {
  const { id, version, kind, title } = definition;
  const figure = definition.figure?.(variant);
  const solved = facts.solutionSeen || (facts.closed && kind !== 'prediction');
  return {
    roundId: facts.roundId,
    exerciseId: id,
    version,
    kind,
    units: variant.units,
    title,
    prompt: definition.prompt(variant),
    givens: [...definition.givens(variant)],
    parts: definition.parts.map((part) => partView(part, variant)),
    ...(figure === undefined ? {} : { figure }),
    hints: definition.hints(variant).slice(0, Math.min(hintsTotal, facts.hintsTaken)),
    hintsTotal,
    attempts: [...facts.attempts],
    closed: facts.closed,
    unaided: isUnaided(facts),
    ...(solved ? { solution: [...definition.solution(variant)] } : {}),
  };
}

/** Whether a round still counts as done alone: the third hint and the solution give that up. */
export function isUnaided(facts: { hintsTaken: number; solutionSeen: boolean }): boolean {
  return facts.hintsTaken < hintsTotal && !facts.solutionSeen;
}

function partView(part: Part, variant: Variant): PartShown {
  const { key } = part;
  const label = part.label(variant);
  switch (part.kind) {
    case 'number': {
      const field = part.field(variant.units);
      const { dimension, unit, places, of } = field;
      return {
        kind: 'number',
        key,
        label,
        dimension,
        unit,
        ...(places === undefined ? {} : { places }),
        ...(of === undefined ? {} : { of: [...of] }),
        expects: expects(field),
      };
    }
    case 'choice':
      return {
        kind: 'choice',
        key,
        label,
        multiple: part.multiple === true,
        options: shownOptions(part, variant).map(({ id, label: said, definition }) => {
          const figure = definition.figure?.(variant);
          return { id, label: said, ...(figure === undefined ? {} : { figure }) };
        }),
      };
    case 'setting': {
      const controls = part.controls(variant.units).map(({ name }) => name);
      return { kind: 'setting', key, label, controls, criteria: criteria(part, variant) };
    }
    case 'design':
      return {
        kind: 'design',
        key,
        label,
        fields: part.fields(variant).map(fieldView),
        criteria: criteria(part, variant),
      };
  }
}

function fieldView(field: DesignField) {
  const { key, label } = field;
  if (field.kind === 'stock') {
    return {
      kind: field.kind,
      key,
      label,
      choices: field.choices.map((choice) => ({ ...choice })),
    };
  }
  const { dimension, unit } = field.field;
  return { kind: field.kind, key, label, dimension, unit, expects: expects(field.field) };
}

function criteria(part: Extract<Part, { kind: 'setting' | 'design' }>, variant: Variant): string[] {
  return part.criteria.map((criterion) => criterion.label(variant));
}
