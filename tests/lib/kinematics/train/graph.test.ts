import fc from 'fast-check';
import Fraction from 'fraction.js';
import { describe, expect, it } from 'vitest';
import { analyseTrain } from '@/lib/kinematics/train/graph';
import type { Train, TrainMesh } from '@/lib/kinematics/train/graph';
import { turnsOfAnalysis, turnsOfTrain } from '@/lib/kinematics/train/turns';

const mesh = (
  first: string,
  firstTeeth: number,
  second: string,
  secondTeeth: number,
): TrainMesh => ({
  first,
  firstTeeth,
  second,
  secondTeeth,
});

describe('a train as one linear system', () => {
  it('turns three in a row as lesson 2.1 predicts', () => {
    const train = {
      meshes: [mesh('crank', 16, 'middle', 48), mesh('middle', 48, 'lantern', 16)],
      driven: ['crank'],
    };
    const result = turnsOfTrain(train, { crank: 1 });
    expect(result.outcome === 'turns' && [...result.turns]).toEqual([
      ['crank', 1],
      ['middle', -1 / 3],
      ['lantern', 1],
    ]);
  });

  it('locks three wheels that all mesh with each other, and says by how much', () => {
    const train: Train = {
      meshes: [mesh('a', 20, 'b', 20), mesh('b', 20, 'c', 20), mesh('c', 20, 'a', 20)],
      driven: ['a'],
    };
    expect(turnsOfTrain(train, { a: 3 }).outcome).toBe('locked');
    expect(turnsOfTrain(train, { a: 0 }).outcome).toBe('turns');
    expect(analyseTrain(train).demands).toHaveLength(1);
  });

  it('lets four in a ring turn', () => {
    const train: Train = {
      meshes: [
        mesh('a', 20, 'b', 30),
        mesh('b', 30, 'c', 40),
        mesh('c', 40, 'd', 17),
        mesh('d', 17, 'a', 20),
      ],
      driven: ['a'],
    };
    expect(turnsOfTrain(train, { a: 3 }).outcome).toBe('turns');
  });

  it('leaves a loose wheel standing and names it', () => {
    const train: Train = { meshes: [mesh('a', 20, 'b', 30)], driven: ['a'], loose: ['c'] };
    expect(turnsOfTrain(train, { a: 3 })).toEqual({
      outcome: 'partly-free',
      turns: new Map([
        ['a', 3],
        ['b', -2],
      ]),
      free: ['c'],
      freedom: 1,
    });
  });

  it('knows a differential by its two drives', () => {
    // Lesson 9.3: the carriage goes by the mean of the sides; TN-BD-01.
    const meshes = [
      { ...mesh('left', 20, 'star', 12), carrier: 'carriage' },
      { ...mesh('star', 12, 'right', 20), carrier: 'carriage', sense: 'with' as const },
    ];
    const result = turnsOfTrain({ meshes, driven: ['left', 'right'] }, { left: 120, right: 80 });
    expect(result.outcome === 'turns' && result.turns.get('carriage')).toBe(100);
    expect(turnsOfTrain({ meshes, driven: ['left'] }, { left: 1 })).toMatchObject({
      outcome: 'partly-free',
      freedom: 1,
      free: ['star', 'carriage', 'right'],
    });
  });

  it('takes two drives that agree but for rounding, and refuses two that do not', () => {
    const train: Train = { meshes: [mesh('a', 3, 'b', 7)], driven: ['a', 'b'] };
    expect(turnsOfTrain(train, { a: 1, b: -3 / 7 }).outcome).toBe('turns');
    const locked = turnsOfTrain(train, { a: 1, b: 1 });
    expect(locked.outcome === 'locked' && locked.excess).toBeCloseTo(10 / 7, 12);
  });

  it('refuses nonsense by name', () => {
    expect(() => analyseTrain({ meshes: [mesh('a', 3, 'a', 7)], driven: [] })).toThrow('both a');
    expect(() => analyseTrain({ meshes: [mesh('a', 0, 'b', 7)], driven: [] })).toThrow(
      'firstTeeth is 0',
    );
    expect(() => turnsOfTrain({ meshes: [], driven: ['a'] }, {})).toThrow('drive of a is NaN');
    expect(() =>
      turnsOfAnalysis(analyseTrain({ meshes: [], driven: ['a'] }), [Number.NaN]),
    ).toThrow('value');
  });
});

/** A chain of random meshes, every other wheel carried by an arm. */
const randomTrain = fc
  .array(
    fc.record({
      firstTeeth: fc.integer({ min: 6, max: 120 }),
      secondTeeth: fc.integer({ min: 6, max: 120 }),
      carried: fc.boolean(),
      sense: fc.constantFrom('against' as const, 'with' as const),
    }),
    { minLength: 1, maxLength: 9 },
  )
  .map((links): Train => ({
    meshes: links.map(({ carried, ...link }, index) => ({
      ...link,
      first: `body ${index}`,
      second: `body ${index + 1}`,
      ...(carried ? { carrier: 'arm' } : {}),
    })),
    driven: ['body 0', 'arm'],
  }));

describe('random trains', () => {
  it('agree with exact fractions worked mesh by mesh', () => {
    fc.assert(
      fc.property(
        randomTrain,
        fc.integer({ min: -99, max: 99 }),
        fc.integer({ min: -99, max: 99 }),
        (train, crank, arm) => {
          const result = turnsOfTrain(train, { 'body 0': crank, arm });
          let speed = new Fraction(crank);
          for (const { firstTeeth, secondTeeth, carrier, sense, second } of train.meshes) {
            const frame = new Fraction(carrier === undefined ? 0 : arm);
            const sign = sense === 'with' ? 1 : -1;
            speed = frame.add(
              speed
                .sub(frame)
                .mul(sign * firstTeeth)
                .div(secondTeeth),
            );
            expect(result.outcome).toBe('turns');
            const got =
              result.outcome === 'turns' ? (result.turns.get(second) ?? Number.NaN) : Number.NaN;
            const scale = Math.abs(crank) + Math.abs(arm) + Math.abs(speed.valueOf());
            expect(Math.abs(got - speed.valueOf())).toBeLessThanOrEqual(1e-9 * Math.max(1, scale));
          }
        },
      ),
      { seed: 4, numRuns: 1500 },
    );
  });

  it('share their turns exactly, in fractions', () => {
    fc.assert(
      fc.property(randomTrain, (train) => {
        const { shares } = analyseTrain(train);
        let [own, armed] = [new Fraction(1), new Fraction(0)];
        train.meshes.forEach(({ firstTeeth, secondTeeth, carrier, sense, second }) => {
          const step = new Fraction(sense === 'with' ? firstTeeth : -firstTeeth, secondTeeth);
          own = own.mul(step);
          armed = armed.mul(step);
          if (carrier !== undefined) armed = armed.add(new Fraction(1).sub(step));
          const [a, b] = shares.get(second) ?? [];
          expect(`${a?.numerator}/${a?.denominator}`).toBe(`${own.s * own.n}/${own.d}`);
          expect(`${b?.numerator}/${b?.denominator}`).toBe(`${armed.s * armed.n}/${armed.d}`);
        });
      }),
      { seed: 5, numRuns: 500 },
    );
  });
});
