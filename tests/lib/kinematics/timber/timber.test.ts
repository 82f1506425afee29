import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { arcFromChord, arcRise, chordOfArc } from '@/lib/kinematics/timber/arc';
import {
  diameterForSetting,
  dividerSetting,
  teethOnCircle,
} from '@/lib/kinematics/timber/circle-division';
import {
  INCH,
  millimetresFromInches,
  nearestInchFraction,
} from '@/lib/kinematics/timber/inch-fraction';
import {
  kerfBend,
  kerfBendRadius,
  kerfSizes,
  kerfSpacing,
  piecesFromBoard,
} from '@/lib/kinematics/timber/kerf';
import {
  ovalGrowth,
  seasonOpening,
  woodMovement,
  woodMovementByShrinkage,
} from '@/lib/kinematics/timber/movement';
import { segmentedRing } from '@/lib/kinematics/timber/segmented-ring';
import { movementCoefficients } from '@/lib/kinematics/timber/species.data';
import { between, expectNear, outcome, runs, whole } from '@/tests/support/numbers';

describe('a board cut into pieces', () => {
  it('gives as many as fit with their kerfs, and not one more', () => {
    fc.assert(
      fc.property(between(100, 3000), between(5, 90), between(0, 6), (board, piece, kerf) => {
        const { pieces, left } = outcome(piecesFromBoard(board, piece, kerf), 'cut');
        expectNear(pieces * piece + (pieces - 1) * kerf + left, board, 1e-8);
        expect(left).toBeLessThan(piece + kerf);
      }),
      runs,
    );
  });

  it('comes out even where it should: ten pieces of 97 and nine kerfs of 3 from 997', () => {
    expect(piecesFromBoard(997, 97, 3)).toEqual({ outcome: 'cut', pieces: 10, left: 0 });
    expect(outcome(piecesFromBoard(0.3, 0.1, 0), 'cut').pieces).toBe(3);
  });

  it('may be too short for one, by so much', () => {
    expect(piecesFromBoard(90, 95, 3)).toEqual({ outcome: 'too-short', by: 5 });
  });
});

describe('a kerf along a line', () => {
  it('is made up for by what it says to draw', () => {
    const { drawnOutline, drawnHole } = kerfSizes(60, 8, 0.2);
    const cut = kerfSizes(drawnOutline, drawnHole, 0.2);
    expectNear(cut.part, 60, 1e-14);
    expectNear(cut.hole, 8, 1e-14);
  });
});

describe('a board bent by kerfs', () => {
  const board = { thickness: 18, skin: 2, kerf: 3.2 };

  it('turns its skin round its radius: spacing and radius undo each other', () => {
    fc.assert(
      fc.property(between(5, 500), (radius) => {
        expectNear(kerfBendRadius(board, kerfSpacing(board, radius)), radius, 1e-13);
      }),
      runs,
    );
    const { turnPerKerf, exactKerfs } = kerfBend(board, 1.5);
    expectNear(turnPerKerf * exactKerfs, 1.5, 1e-14);
  });

  it('takes whole kerfs upward, and none for no bend', () => {
    expect(kerfBend(board, Math.PI / 2).kerfs).toBe(8);
    expect(kerfBend(board, 3 * kerfBend(board, 1).turnPerKerf).kerfs).toBe(3);
    expect(kerfBend(board, 0)).toMatchObject({ exactKerfs: 0, kerfs: 0 });
  });

  it('needs a skin thinner than itself', () => {
    expect(() => kerfBend({ ...board, skin: 18 }, 1)).toThrow('skin is 18');
    expect(() => kerfSpacing(board, 0)).toThrow('radius is 0');
    expect(() => kerfBendRadius(board, -1)).toThrow('spacing is -1');
    expect(() => piecesFromBoard(1, 1, -1)).toThrow('kerf is -1');
    expect(() => kerfSizes(1, Number.NaN, 0)).toThrow('hole is NaN');
  });
});

describe('a circle divided', () => {
  it('steps round with the dividers and comes back to its start', () => {
    fc.assert(
      fc.property(between(1, 500), whole(2, 300), (diameter, divisions) => {
        const chord = dividerSetting(diameter, divisions);
        expectNear(2 * Math.asin(chord / diameter) * divisions, 2 * Math.PI, 1e-7);
        expectNear(diameterForSetting(chord, divisions), diameter, 1e-12);
      }),
      runs,
    );
    expect(dividerSetting(40, 1)).toBe(0);
  });

  it('carries the most teeth that are nowhere too close', () => {
    fc.assert(
      fc.property(between(20, 500), between(3, 40), (diameter, pitch) => {
        const fits = outcome(teethOnCircle(diameter, pitch), 'fits');
        expect(fits.pitch).toBeGreaterThanOrEqual(pitch * (1 - 1e-8));
        expect(fits.nextDiameter).toBeGreaterThan(diameter * (1 - 1e-8));
        expect(outcome(teethOnCircle(fits.nextDiameter, pitch), 'fits').teeth).toBe(fits.teeth + 1);
      }),
      runs,
    );
  });

  it('may be too small for a tooth', () => {
    const small = outcome(teethOnCircle(5, 20), 'too-small');
    expect(outcome(teethOnCircle(5 + small.by, 20), 'fits').teeth).toBe(1);
    expect(() => teethOnCircle(0, 1)).toThrow('diameter is 0');
    expect(() => teethOnCircle(1e300, 1e-300)).toThrow(RangeError);
    expect(() => dividerSetting(1, 2.5)).toThrow('divisions is 2.5');
    expect(() => diameterForSetting(1, 1)).toThrow('divisions is 1');
  });
});

describe('a ring of segments', () => {
  it('closes: mitres make a turn, edges make the polygon', () => {
    fc.assert(
      fc.property(
        whole(3, 64),
        between(50, 500),
        between(1, 24),
        (segments, acrossFlats, width) => {
          const sizes = outcome(segmentedRing({ segments, acrossFlats, width }), 'cut');
          expectNear(2 * segments * sizes.mitre, 2 * Math.PI, 1e-13);
          expectNear(
            (sizes.longEdge - sizes.shortEdge) / 2,
            width * Math.tan(sizes.mitre),
            1e-9,
            acrossFlats,
          );
          expectNear(Math.hypot(sizes.longEdge, acrossFlats), sizes.acrossCorners, 1e-12);
          expect(sizes.largestDisc).toBe(acrossFlats);
          expectNear(
            Math.hypot(sizes.shortEdge, acrossFlats - 2 * width),
            sizes.smallestHole,
            1e-11,
          );
        },
      ),
      runs,
    );
  });

  it('cannot be cut from a strip that fills it', () => {
    expect(segmentedRing({ segments: 8, acrossFlats: 100, width: 53 })).toEqual({
      outcome: 'strip-too-wide',
      by: 3,
    });
    expect(() => segmentedRing({ segments: 2, acrossFlats: 100, width: 5 })).toThrow(
      'segments is 2',
    );
  });
});

describe('an arc', () => {
  it('goes from chord and rise to radius and angle and back', () => {
    fc.assert(
      fc.property(between(1, 2000), between(0.001, 0.5), (chord, part) => {
        const arc = arcFromChord(chord, part * chord);
        expectNear(
          outcome(arcRise(arc.radius * (1 + 1e-15), chord), 'spans').rise,
          part * chord,
          1e-6,
        );
        const back = chordOfArc(arc.radius, arc.angle);
        expectNear(back.chord, chord, 1e-10);
        expectNear(back.rise, part * chord, 1e-10);
      }),
      runs,
    );
  });

  it('is half a circle when the rise is half the chord, and more beyond', () => {
    expect(arcFromChord(10, 5)).toMatchObject({ radius: 5, angle: Math.PI });
    expect(arcFromChord(10, 12).angle).toBeGreaterThan(Math.PI);
  });

  it('cannot span more than its diameter', () => {
    expect(arcRise(10, 23)).toEqual({ outcome: 'chord-too-long', by: 3 });
    expect(() => arcFromChord(0, 1)).toThrow('chord is 0');
    expect(() => chordOfArc(1, 7)).toThrow('angle is 7');
  });
});

describe('a rule in inches', () => {
  it('finds every one of its own marks again', () => {
    fc.assert(
      fc.property(whole(0, 5000), fc.boolean(), (marks, negative) => {
        const length = {
          negative,
          whole: Math.floor(marks / 64),
          numerator: marks % 64,
          denominator: 64,
        };
        const nearest = nearestInchFraction(millimetresFromInches(length), 64);
        expectNear(millimetresFromInches(nearest), millimetresFromInches(length), 1e-14, 1);
        expectNear(nearest.error, 0, 1e-12, 1);
        expect(nearest.numerator % 2 === 1 || nearest.denominator === 1).toBe(true);
      }),
      runs,
    );
  });

  it('is never off by more than half a mark, and says by how much', () => {
    fc.assert(
      fc.property(
        between(-3000, 3000),
        fc.constantFrom(1, 2, 4, 8, 16, 32, 64, 128),
        (size, finest) => {
          const nearest = nearestInchFraction(size, finest);
          expect(Math.abs(nearest.error)).toBeLessThanOrEqual((INCH / finest / 2) * (1 + 1e-9));
          expectNear(millimetresFromInches(nearest) - size, nearest.error, 1e-9, 1);
        },
      ),
      runs,
    );
  });

  it('takes the larger of two marks midway, and no sign for nothing', () => {
    expect(nearestInchFraction(INCH * 1.5, 1).whole).toBe(2);
    expect(nearestInchFraction(-0.01, 16)).toMatchObject({
      negative: false,
      whole: 0,
      numerator: 0,
      denominator: 1,
    });
    expect(nearestInchFraction(-38.1, 16)).toMatchObject({
      negative: true,
      whole: 1,
      numerator: 1,
      denominator: 2,
    });
  });

  it('refuses a rule that is not halved, and lengths without end', () => {
    expect(() => nearestInchFraction(1, 12)).toThrow('finest is 12; expected a power of two');
    expect(() => nearestInchFraction(1e300, 64)).toThrow('marks');
    expect(() =>
      millimetresFromInches({ negative: false, whole: 1, numerator: 1, denominator: 0 }),
    ).toThrow('denominator is 0');
  });
});

describe('wood and its moisture', () => {
  it('moves by the Wood Handbook’s coefficients: red oak 300 mm from 7 to 12 %', () => {
    const { radial, tangential } = movementCoefficients['red oak'];
    expect(woodMovement(300, tangential, 7, 12)).toBeCloseTo(5.535, 12);
    expect(woodMovement(300, radial, 12, 7)).toBeCloseTo(-2.37, 12);
  });

  it('moves more along the rings than across them, in every wood of the table', () => {
    for (const { radial, tangential } of Object.values(movementCoefficients)) {
      expect(tangential).toBeGreaterThan(radial);
      expect(radial).toBeGreaterThan(0.001);
      expect(tangential).toBeLessThan(0.005);
    }
  });

  it('by total shrinkage comes back to where it began', () => {
    fc.assert(
      fc.property(
        between(10, 1000),
        between(2, 15),
        between(0, 30),
        between(0, 30),
        (width, total, from, to) => {
          const wood = { total, fibreSaturation: 30 };
          const there = woodMovementByShrinkage(width, wood, from, to);
          const back = woodMovementByShrinkage(width + there, wood, to, from);
          expectNear(there + back, 0, 1e-12, width);
        },
      ),
      runs,
    );
    // from green to dry it loses its total shrinkage
    expect(woodMovementByShrinkage(100, { total: 8, fibreSaturation: 30 }, 30, 0)).toBeCloseTo(
      -8,
      12,
    );
  });

  it('makes a wheel an oval, along the grain as it was', () => {
    expect(ovalGrowth(90, 0.02, 0)).toBe(0);
    expect(ovalGrowth(90, 0.02, Math.PI / 2)).toBeCloseTo(1.8, 12);
    expect(ovalGrowth(90, 0.02, Math.PI / 4)).toBeCloseTo(0.9, 12);
  });

  it('opens the arbors by the growth of both radii and the wanted backlash', () => {
    const pair = {
      firstDiameter: 60,
      secondDiameter: 180,
      growth: 0.01,
      backlash: 0,
      pressureAngle: 0.35,
    };
    expect(seasonOpening(pair)).toBeCloseTo(1.2, 12);
    expect(seasonOpening({ ...pair, growth: 0, backlash: 0.4 })).toBeCloseTo(
      0.2 / Math.tan(0.35),
      12,
    );
  });

  it('refuses nonsense', () => {
    expect(() => woodMovement(-1, 0.002, 7, 12)).toThrow('width is -1');
    expect(() => woodMovement(1, 0.002, 7, 101)).toThrow('toMoisture is 101');
    expect(() => woodMovementByShrinkage(1, { total: 100, fibreSaturation: 30 }, 1, 2)).toThrow(
      'total is 100',
    );
    expect(() => woodMovementByShrinkage(1, { total: 5, fibreSaturation: 30 }, 1, 31)).toThrow(
      'toMoisture is 31',
    );
    expect(() => ovalGrowth(1, Number.NaN, 0)).toThrow('growth is NaN');
  });
});
