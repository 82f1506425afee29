import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { exercises, lessons, skills } from '@/content/exercises/registry';
import { answerKey } from '@/lib/marking/answer-key';
import type { ExerciseDefinition, Part, Setting, Variant } from '@/lib/marking/definition';
import { drawVariant } from '@/lib/marking/draw';
import { markResponse } from '@/lib/marking/mark';
import type { Answer } from '@/lib/marking/marking';
import { createSource, type Source } from '@/lib/marking/source';
import { closestPair, numberParts, slipValues, trueValues } from '@/lib/marking/values';
import { roundView } from '@/lib/marking/view';
import { unitSystems } from '@/lib/quantities/unit-system';
import { roundViewSchema } from '@/lib/schemas/round';

const seeds = Number(process.env.HORNBEAM_SEEDS ?? 500);
/** Ten thousand seeds take minutes; a few hundred take seconds. */
vi.setConfig({ testTimeout: 60_000 + 60 * seeds, hookTimeout: 60_000 + 60 * seeds });

const facts = { roundId: 'r', hintsTaken: 0, solutionSeen: false, closed: false, attempts: [] };

/** What a learner would send to give this part a value, a set of options or a setting. */
function asAnswer(
  part: Part,
  variant: Variant,
  value: number | readonly string[] | Setting,
): Answer {
  if (typeof value === 'number') return `${value.toFixed(9)} ${numberUnit(part, variant)}`.trim();
  if (part.kind === 'choice' && Array.isArray(value)) {
    const shown = variant.options[part.key] ?? [];
    return shown.filter(({ option }) => value.includes(option)).map(({ id }) => id);
  }
  return Object.fromEntries(Object.entries(value));
}

function numberUnit(part: Part, variant: Variant): string {
  if (part.kind !== 'number') return '';
  const { unit, dimension } = part.field(variant.units);
  return dimension === 'count' || dimension === 'ratio' ? '' : unit;
}

function wholeNumber(part: Part, variant: Variant, value: number): boolean {
  return (
    part.kind !== 'number' ||
    part.field(variant.units).dimension !== 'count' ||
    Number.isInteger(value)
  );
}

function rightAnswers(definition: ExerciseDefinition, variant: Variant): Record<string, Answer> {
  const truth = trueValues(definition, variant);
  return Object.fromEntries(
    definition.parts.map((part) => {
      const right = part.kind === 'number' ? (truth[part.key] ?? NaN) : part.answer(variant);
      return [part.key, plainCount(part, asAnswer(part, variant, right))];
    }),
  );
}

/** A count is written without places. */
function plainCount(part: Part, answer: Answer): Answer {
  const count = part.kind === 'number' && part.field('metric').dimension === 'count';
  return count && typeof answer === 'string' ? answer.replace(/\.0+$/, '') : answer;
}

function marked(definition: ExerciseDefinition, variant: Variant, answers: Record<string, Answer>) {
  const marking = markResponse(definition, variant, { answers });
  if (marking.outcome === 'refused') throw new Error(JSON.stringify([answers, marking.errors]));
  return marking;
}

describe.each([...exercises.values()].map((definition) => [definition.id, definition] as const))(
  '%s',
  (_id, definition) => {
    let drawn: readonly Variant[] = [];

    beforeAll(() => {
      drawn = Array.from({ length: seeds }, (_, seed) => seed + 1).flatMap((seed) =>
        unitSystems.map((units) => drawVariant(definition, seed, units)),
      );
    });

    afterAll(() => {
      drawn = [];
    });

    it('is drawn alike from the same seed, and is plain JSON', () => {
      for (const variant of drawn.slice(0, 6)) {
        expect(drawVariant(definition, variant.seed, variant.units)).toEqual(variant);
        expect(JSON.parse(JSON.stringify(variant))).toEqual(variant);
      }
    });

    it('keeps a fair share of its draws, and every slip five tolerances away', () => {
      for (const units of unitSystems) {
        const kept = drawn.filter((variant) => variant.units === units);
        const draws = kept.reduce((sum, variant) => sum + variant.draws, 0);
        const closest = Math.min(...kept.map((variant) => closestPair(definition, variant)));
        if (process.env.HORNBEAM_REPORT !== undefined) {
          process.stdout.write(
            `${definition.id} ${units}: kept ${Math.round((100 * kept.length) / draws)} %, closest ${closest.toFixed(1)}\n`,
          );
        }
        expect(kept.length / draws).toBeGreaterThan(0.05);
        expect(closest).toBeGreaterThanOrEqual(5 * (1 - 1e-6));
      }
    });

    it('marks its own answer right, and nothing less', () => {
      for (const variant of drawn) {
        const marking = marked(definition, variant, rightAnswers(definition, variant));
        expect(marking).toMatchObject({ verdict: 'right', score: 1, closesRound: true });
        expect(marking.skills.every(({ right }) => right)).toBe(true);
      }
    });

    it('recognises every slip by its own advice', () => {
      for (const variant of drawn.slice(0, definition.kind === 'design' ? 40 : 200)) {
        const truth = trueValues(definition, variant);
        const right = rightAnswers(definition, variant);
        for (const part of definition.parts) {
          for (const [id, answer] of slipsOf(part, variant, truth)) {
            const marking = marked(definition, variant, {
              ...right,
              [part.key]: plainCount(part, answer),
            });
            expect(marking.verdict).not.toBe('right');
            expect(marking.score).toBeLessThan(1);
            const slipped = marking.parts.filter(({ key }) => key.startsWith(part.key));
            const found = slipped.find(({ slip }) => slip !== undefined);
            expect([variant.seed, variant.units, answer, found?.slip]).toEqual([
              variant.seed,
              variant.units,
              answer,
              id,
            ]);
            expect(found?.message?.length).toBeGreaterThan(20);
          }
        }
      }
    });

    it('answers whatever is sent: nothing that can be read makes it stumble', () => {
      const noise = createSource(20260301);
      for (const variant of drawn.slice(0, 60)) {
        const answers = Object.fromEntries(
          definition.parts.map((part) => [part.key, anything(part, variant, noise)]),
        );
        const marking = markResponse(definition, variant, { answers });
        expect(['marked', 'refused']).toContain(marking.outcome);
        expect(JSON.stringify(marking)).not.toMatch(/NaN|Infinity|undefined/);
      }
    });

    it('never scores less for one part put right', () => {
      for (const variant of drawn.slice(0, 50)) {
        const right = rightAnswers(definition, variant);
        const truth = trueValues(definition, variant);
        let answers: Record<string, Answer> = { ...right };
        for (const part of definition.parts) {
          const [slip] = slipsOf(part, variant, truth);
          if (slip !== undefined) answers = { ...answers, [part.key]: plainCount(part, slip[1]) };
        }
        let score = marked(definition, variant, answers).score;
        for (const part of definition.parts) {
          answers = { ...answers, [part.key]: right[part.key] ?? '' };
          const next = marked(definition, variant, answers).score;
          expect(next).toBeGreaterThanOrEqual(score - 1e-12);
          score = next;
        }
        expect(score).toBe(1);
      }
    });

    it('shows nothing of the answer and of no slip', () => {
      for (const variant of drawn.slice(0, 60)) {
        const view = roundView(definition, variant, facts);
        expect(roundViewSchema.parse(view)).toEqual(view);
        const text = JSON.stringify(view);
        expect(view.hints).toEqual([]);
        expect(view.solution).toBeUndefined();
        const key = answerKey(definition, variant);
        for (const advice of key.parts.flatMap(({ slips }) => slips.map((slip) => slip.advice))) {
          expect(text).not.toContain(JSON.stringify(advice).slice(1, -1));
        }
        for (const part of definition.parts) {
          for (const { id } of part.slips) expect(text).not.toContain(`"${id}"`);
          if (part.kind === 'choice') {
            for (const { option } of part.options) expect(text).not.toContain(`"${option}"`);
          }
        }
        expect(text).not.toContain('"seed"');
      }
    });

    it('gives no answer away in its first two hints', () => {
      for (const variant of drawn.slice(0, 50)) {
        const truth = trueValues(definition, variant);
        const [idea, formula] = definition.hints(variant);
        for (const part of numberParts(definition)) {
          const answer = (truth[part.key] ?? NaN).toFixed(3);
          expect(`${idea} ${formula}`).not.toContain(answer);
        }
        const plainHints = new Set(
          drawn
            .filter(({ units }) => units === variant.units)
            .slice(0, 20)
            .map((each) => definition.hints(each)[0]),
        );
        expect(plainHints.size).toBeLessThanOrEqual(3);
      }
    });

    it('shuffles its options: the right one stands everywhere alike', () => {
      for (const part of definition.parts) {
        if (part.kind !== 'choice') continue;
        const places = part.options.map(() => 0);
        for (const variant of drawn) {
          const shown = variant.options[part.key] ?? [];
          const place = shown.findIndex(({ option }) => part.answer(variant).includes(option));
          places[place] = (places[place] ?? 0) + 1;
          expect(new Set(shown.map(({ id }) => id)).size).toBe(part.options.length);
        }
        const expected = drawn.length / part.options.length;
        for (const count of places)
          expect(Math.abs(count - expected)).toBeLessThan(5 * Math.sqrt(expected));
      }
    });

    it('reads well: no value is missing, endless or undefined in any text', () => {
      for (const variant of drawn.slice(0, 60)) {
        const text = JSON.stringify([
          roundView(definition, variant, { ...facts, hintsTaken: 3, solutionSeen: true }),
          answerKey(definition, variant),
        ]);
        expect(text).not.toMatch(/NaN|Infinity|undefined|\[object/);
      }
    });

    it('names skills of its lesson, each shown by a part', () => {
      const shown = definition.parts.flatMap((part) =>
        part.kind === 'setting' || part.kind === 'design'
          ? part.criteria.flatMap((criterion) => criterion.skills ?? part.skills)
          : part.skills,
      );
      expect([...new Set(shown)].sort()).toEqual([...definition.skills].sort());
      for (const skill of definition.skills)
        expect(skills.get(skill)?.lesson).toBe(definition.lesson);
    });
  },
);

/** Something that a browser might send, sensible or not. */
function anything(part: Part, variant: Variant, noise: Source): Answer {
  const number = () => noise.pick([0, 1, -1, 0.5, 7, 12, 30, 96, 100, 250, 900, -900, 1e9]);
  switch (part.kind) {
    case 'number':
      return `${number()}`;
    case 'choice':
      return (variant.options[part.key] ?? []).slice(0, noise.whole(0, 2)).map(({ id }) => id);
    case 'setting':
      return Object.fromEntries(
        part
          .controls(variant.units)
          .map((control) => [
            control.name,
            control.kind === 'one-of' ? noise.pick(control.values) : number(),
          ]),
      );
    case 'design':
      return Object.fromEntries(
        part
          .fields(variant)
          .map((field) => [
            field.key,
            field.kind === 'stock'
              ? noise.pick(field.choices.map(({ value }) => value))
              : `${number()}`,
          ]),
      );
  }
}

function slipsOf(part: Part, variant: Variant, truth: Record<string, number>): [string, Answer][] {
  if (part.kind === 'number') {
    return slipValues(part, variant, truth)
      .filter(({ value }) => wholeNumber(part, variant, value))
      .map(({ id, value }) => [id, asAnswer(part, variant, value)]);
  }
  if (part.kind === 'choice') {
    return part.slips.map((slip) => [slip.id, asAnswer(part, variant, slip.options(variant))]);
  }
  return part.slips.flatMap((slip): [string, Answer][] => {
    const example = slip.example(variant);
    return example === null ? [] : [[slip.id, asAnswer(part, variant, example)]];
  });
}

describe('the registry', () => {
  it('holds every exercise and prediction that a lesson names, of three kinds at least', () => {
    for (const lesson of lessons) {
      const own = lesson.exercises.map((id) => exercises.get(id));
      expect(own.every((definition) => definition?.lesson === lesson.id)).toBe(true);
      expect(own.length).toBeGreaterThanOrEqual(5);
      expect(exercises.get(lesson.prediction)?.kind).toBe('prediction');
      const kinds = new Set([...own.map((definition) => definition?.kind), 'prediction']);
      expect(kinds.size).toBeGreaterThanOrEqual(3);
    }
  });

  it('has an exercise for every skill', () => {
    const shown = new Set([...exercises.values()].flatMap((definition) => definition.skills));
    expect([...shown].sort()).toEqual([...skills.keys()].sort());
  });
});
