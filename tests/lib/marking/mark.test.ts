import { describe, expect, it } from 'vitest';
import { exercises } from '@/content/exercises/registry';
import { answerKey } from '@/lib/marking/answer-key';
import { defineExercise, type Givens, type Variant } from '@/lib/marking/definition';
import { DrawsUsedUp, drawVariant } from '@/lib/marking/draw';
import { markResponse } from '@/lib/marking/mark';
import type { LearnersResponse } from '@/lib/marking/marking';
import { createSource } from '@/lib/marking/source';
import { within } from '@/lib/marking/tolerance';
import { trueValues } from '@/lib/marking/values';
import { roundView } from '@/lib/marking/view';
import { lengthField } from '@/lib/quantities/field';
import type { UnitSystem } from '@/lib/quantities/unit-system';

function exercise(id: string) {
  const definition = exercises.get(id);
  if (definition === undefined) throw new Error(`no exercise ${id}`);
  return definition;
}

/** A variant with givens of our own choosing. */
function variantOf(id: string, givens: Givens, units: UnitSystem = 'metric'): Variant {
  return { ...drawVariant(exercise(id), 1, units), givens };
}

function mark(
  id: string,
  givens: Givens,
  answers: LearnersResponse['answers'],
  units?: UnitSystem,
) {
  const marking = markResponse(exercise(id), variantOf(id, givens, units), { answers });
  if (marking.outcome === 'refused') throw new Error(JSON.stringify(marking.errors));
  return marking;
}

const window = { length: 540, width: 420 };

describe('marking numbers', () => {
  it('finds the curriculum’s numbers: 12/36, 10/40 at 12 turns give one, with the crank', () => {
    const givens = { z1: 12, z2: 36, z3: 10, z4: 40, turns: 40 };
    const { turns } = trueValues(
      exercise('turns-through-pairs'),
      variantOf('turns-through-pairs', givens),
    );
    expect(turns).toBeCloseTo(3.3333333, 6);
  });

  it('takes what is within the tolerance, in whatever unit it is written', () => {
    const marking = mark('pins-for-an-oval', window, {
      far: '270.5',
      near: '8 17/64 in',
      apart: '60',
    });
    expect(marking.parts.map(({ right }) => right)).toEqual([true, true, true]);
    expect(marking.parts[1]?.echo).toBe('8 17/64 in = 209.9 mm');
    expect(marking).toMatchObject({ verdict: 'right', score: 1, closesRound: true });
  });

  it('gives credit by parts', () => {
    const marking = mark('pins-for-an-oval', window, { far: '270', near: '199', apart: '60' });
    expect(marking).toMatchObject({
      verdict: 'partly',
      closesRound: false,
      message: '2 of 3 right.',
    });
    expect(marking.score).toBeCloseTo(2 / 3, 12);
    expect(marking.parts[1]).toMatchObject({
      right: false,
      message: 'Not yet: this is too small.',
    });
  });

  it('marks a later part with the learner’s own earlier values', () => {
    const marking = mark('pins-for-an-oval', window, { far: '280', near: '210', apart: '70' });
    expect(marking.parts.map(({ right }) => right)).toEqual([false, true, true]);
    expect(marking.parts[2]?.message).toContain('your own');
    expect(marking.verdict).toBe('partly');
  });

  it('takes the true value too, where an earlier part went wrong', () => {
    const marking = mark('pins-for-an-oval', window, { far: '280', near: '210', apart: '60' });
    expect(marking.parts[2]?.right).toBe(true);
  });

  it('does not stumble over an earlier value that makes no sense', () => {
    const givens = { toothSize: 4, first: 12, last: 20, distance: 160 };
    const marking = mark('wheel-that-reaches', givens, { teeth: '-24', centres: '72' });
    expect(marking.parts.map(({ right }) => right)).toEqual([false, true]);
    expect(mark('wheel-that-reaches', givens, { teeth: '-24', centres: '71' }).verdict).toBe(
      'wrong',
    );
  });

  it('names the slip and gives its advice with the learner’s numbers', () => {
    const marking = mark('pins-for-an-oval', window, { far: '540', near: '420', apart: '120' });
    expect(marking.parts[0]).toMatchObject({ slip: 'full-axes' });
    expect(marking.parts[0]?.message).toContain('540 mm');
    // Apart follows from the learner’s own far and near pin.
    expect(marking.parts[2]?.right).toBe(true);
  });

  it('recognises millimetres in a field of inches, and inches in one of millimetres', () => {
    const inch = { length: 20, width: 12 };
    const answers = { far: '254', near: '6', apart: '4' };
    expect(mark('pins-for-an-oval', inch, answers, 'inch').parts[0]).toMatchObject({
      right: false,
      slip: 'wrong-unit',
    });
    const metric = mark('pins-for-an-oval', window, { far: '10.63', near: '210', apart: '60' });
    expect(metric.parts[0]?.slip).toBe('wrong-unit');
    expect(metric.parts[0]?.message).toContain('10.63 in');
  });

  it('tells a near miss from a wrong turn', () => {
    const marking = mark('pins-for-an-oval', window, { far: '271', near: '210', apart: '60' });
    expect(marking.parts[0]?.message).toContain('Very near');
  });

  it('refuses what cannot be read, part by part, and marks nothing', () => {
    const variant = variantOf('pins-for-an-oval', window);
    const answers = { far: '10 5/8', near: '1,250' };
    const marking = markResponse(exercise('pins-for-an-oval'), variant, { answers });
    expect(marking).toMatchObject({ outcome: 'refused' });
    if (marking.outcome === 'refused') {
      expect(marking.errors.map(({ key }) => key)).toEqual(['far', 'near', 'apart']);
      expect(marking.errors[0]?.message).toContain('10 5/8 in');
    }
  });

  it('takes no answer from the prototype of an object', () => {
    const variant = variantOf('pins-for-an-oval', window);
    const answers: LearnersResponse['answers'] = JSON.parse('{"__proto__": {"far": "270"}}');
    expect(markResponse(exercise('pins-for-an-oval'), variant, { answers }).outcome).toBe(
      'refused',
    );
  });

  it('refuses a variant of another exercise or of an older version', () => {
    const variant = variantOf('pins-for-an-oval', window);
    const answers = { answers: {} };
    expect(() => markResponse(exercise('oval-from-pins'), variant, answers)).toThrow(RangeError);
    expect(() =>
      markResponse(exercise('pins-for-an-oval'), { ...variant, version: 0 }, answers),
    ).toThrow(RangeError);
  });
});

describe('marking choices', () => {
  const definition = exercise('which-copies-true');
  const variant = drawVariant(definition, 3, 'metric');
  const ids = (variant.options.bench ?? []).map(({ id }) => id);

  it('wants one option of this round', () => {
    const outcome = (chosen: readonly string[]) =>
      markResponse(definition, variant, { answers: { bench: chosen } }).outcome;
    expect(outcome([])).toBe('refused');
    expect(outcome(ids.slice(0, 2))).toBe('refused');
    expect(outcome(['same-share'])).toBe('refused');
    expect(outcome([...ids.slice(0, 1), 'elsewhere'])).toBe('refused');
    expect(outcome(ids.slice(0, 1))).toBe('marked');
  });

  it('gives other ids and another order to another round', () => {
    const other = drawVariant(definition, 4, 'metric').options.bench ?? [];
    expect(other.some(({ id }) => ids.includes(id))).toBe(false);
  });
});

describe('marking settings', () => {
  const givens = { length: 540, width: 420, slider: 60, groove: 190 };
  const set = (farPin: number, nearPin: number, farRunsIn: string) =>
    mark('set-the-pins', givens, { pins: { farPin, nearPin, farRunsIn } });

  it('takes both pins to either side of the pen, and a pin named far for the near one', () => {
    expect(set(270, 210, 'north-south').verdict).toBe('right');
    expect(set(-270, -210, 'north-south').verdict).toBe('right');
    expect(set(210, 270, 'east-west').verdict).toBe('right');
    expect(set(271, 209, 'north-south').verdict).toBe('right');
    expect(set(271.5, 210, 'north-south').verdict).toBe('partly');
  });

  it('marks criterion by criterion, a third each', () => {
    const marking = set(270, 100, 'north-south');
    expect(marking.score).toBeCloseTo(1 / 3, 12);
    expect(marking.parts.map(({ key, right }) => [key, right])).toEqual([
      ['pins.north-south', true],
      ['pins.east-west', false],
      ['pins.grooves', false],
    ]);
  });

  it('says by how much the grooves end too soon with the pen between the pins', () => {
    const marking = set(270, -210, 'north-south');
    const grooves = marking.parts[2];
    expect(grooves).toMatchObject({ right: false, slip: 'pen-between' });
    // Pins 480 apart travel 960; with a slider of 60 that is 1020, and the grooves are 190.
    expect(grooves?.message).toContain('830 mm');
  });

  it('refuses a bench that was not set, or set to nonsense', () => {
    const variant = variantOf('set-the-pins', givens);
    const unset: LearnersResponse['answers'][string][] = [
      {},
      '270',
      ['270'],
      { farPin: NaN, nearPin: 1, farRunsIn: 'east-west' },
      { farPin: 270, nearPin: 210, farRunsIn: 'up' },
    ];
    for (const pins of unset) {
      expect(markResponse(exercise('set-the-pins'), variant, { answers: { pins } }).outcome).toBe(
        'refused',
      );
    }
  });

  it('counts a design’s criteria, and reads what is written into it', () => {
    const definition = exercise('sign-for-the-board');
    const variant = drawVariant(definition, 5, 'metric');
    const [part] = definition.parts;
    if (part?.kind !== 'design') throw new Error('not a design');
    const { bar = '', hole = '', from = '' } = part.answer(variant);
    const layout = { bar, hole: `${hole} holes`, from: `${from} mm` };
    expect(markResponse(definition, variant, { answers: { layout } })).toMatchObject({
      verdict: 'right',
    });
    const away = { ...layout, from: '5000 mm' };
    expect(markResponse(definition, variant, { answers: { layout: away } })).toMatchObject({
      score: 0.8,
    });
    const unread = { ...layout, from: '3/4' };
    expect(markResponse(definition, variant, { answers: { layout: unread } }).outcome).toBe(
      'refused',
    );
  });
});

describe('a prediction', () => {
  const definition = exercise('middle-wheel');
  const variant = drawVariant(definition, 1, 'metric');
  const wrong = (variant.options.lantern ?? []).find(({ option }) => option === 'third-right');

  it('closes its round whatever it was, notes the slip and sends the learner to the bench', () => {
    const marking = markResponse(definition, variant, { answers: { lantern: [wrong?.id ?? ''] } });
    expect(marking).toMatchObject({ verdict: 'wrong', closesRound: true, skills: [] });
    if (marking.outcome === 'marked') {
      expect(marking.parts[0]).toMatchObject({ slip: 'idler-counted' });
      expect(marking.message).toBe('It comes out otherwise.');
      expect(marking.nextStep).toContain('turn the crank');
    }
  });
});

describe('skills', () => {
  it('are shown by the parts that carry them', () => {
    const definition = exercise('lantern-wheel');
    const variant = variantOf('lantern-wheel', { crank: 20, lantern: 40, speed: 30 });
    const right = (variant.options.sense ?? []).find(({ option }) => option === 'with');
    const marking = markResponse(definition, variant, {
      answers: { speed: '15', sense: [right?.id ?? ''] },
    });
    expect(marking).toMatchObject({
      verdict: 'partly',
      skills: [
        { skill: 'train.ratio', right: true },
        { skill: 'train.direction', right: false },
      ],
    });
  });
});

describe('a round as its learner sees it', () => {
  const definition = exercise('grooves-and-bar');
  const variant = drawVariant(definition, 9, 'metric');
  const facts = { roundId: 'r', hintsTaken: 0, solutionSeen: false, closed: false, attempts: [] };
  const view = (change: Partial<typeof facts>) =>
    roundView(definition, variant, { ...facts, ...change });

  it('holds the hints taken and no more', () => {
    expect([0, 1, 2, 3, 9].map((hintsTaken) => view({ hintsTaken }).hints.length)).toEqual([
      0, 1, 2, 3, 3,
    ]);
  });

  it('is unaided until the third hint or the solution', () => {
    expect(view({ hintsTaken: 2 }).unaided).toBe(true);
    expect(view({ hintsTaken: 3 }).unaided).toBe(false);
    expect(view({ solutionSeen: true }).unaided).toBe(false);
  });

  it('holds the solution once it was asked for, or the round is closed', () => {
    expect(view({}).solution).toBeUndefined();
    expect(view({ closed: true }).solution?.length).toBe(3);
    expect(view({ solutionSeen: true, closed: true }).solution?.length).toBe(3);
  });

  it('speaks of inches to those who measure in inches', () => {
    const own = roundView(definition, drawVariant(definition, 9, 'inch'), facts);
    expect(own.givens.every(({ unit }) => unit === 'in')).toBe(true);
    expect(JSON.stringify(own.givens)).not.toContain('mm');
  });
});

describe('the answer key', () => {
  it('holds every answer, what counts as it, and every slip with its advice', () => {
    const key = answerKey(exercise('pins-for-an-oval'), variantOf('pins-for-an-oval', window));
    expect(key.parts[0]).toMatchObject({ answer: '270 mm', accepts: '0.5 mm to either side' });
    expect(key.parts[0]?.slips.map(({ id }) => id)).toEqual([
      'full-axes',
      'far-and-near-swapped',
      'wrong-unit',
    ]);
    expect(key.solution.join(' ')).toContain('270 mm − 210 mm = 60 mm');
  });
});

describe('drawing', () => {
  const stubborn = defineExercise<{ readonly size: number }>({
    id: 'stubborn',
    version: 1,
    kind: 'number',
    lesson: 'none',
    title: 'Stubborn',
    skills: ['none'],
    draw: (source) => ({ size: source.whole(1, 9) }),
    prompt: () => '',
    givens: () => [],
    parts: [
      {
        kind: 'number',
        key: 'size',
        skills: ['none'],
        label: () => 'Size',
        field: (units) => lengthField(units),
        tolerance: () => within(1),
        answer: ({ givens }) => givens.size,
        slips: [{ id: 'too-like', value: ({ givens }) => givens.size + 4.9, advice: () => '' }],
      },
    ],
    hints: () => ['', '', ''],
    solution: () => [],
  });

  it('fails loudly when no draw keeps its slips five tolerances away', () => {
    expect(() => drawVariant(stubborn, 1, 'metric')).toThrow(DrawsUsedUp);
  });

  it('draws evenly, and differently for neighbouring seeds', () => {
    const firsts = Array.from({ length: 3000 }, (_, seed) => createSource(seed).whole(1, 6));
    for (let face = 1; face <= 6; face += 1) {
      const count = firsts.filter((each) => each === face).length;
      expect(Math.abs(count - 500)).toBeLessThan(110);
    }
  });

  it('reaches both ends of a range', () => {
    const source = createSource(1);
    const drawn = new Set(Array.from({ length: 200 }, () => source.step(1.5, 3, 0.25)));
    expect([...drawn].sort((one, other) => one - other)).toEqual([
      1.5, 1.75, 2, 2.25, 2.5, 2.75, 3,
    ]);
  });

  it('has nothing to pick from an empty list', () => {
    expect(() => createSource(1).pick([])).toThrow(RangeError);
  });
});
