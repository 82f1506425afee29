import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  centreDistance,
  gearPair,
  meshPhase,
  meshState,
  pitchLineSpeed,
} from '@/lib/kinematics/gear/mesh';
import { rackTravel } from '@/lib/kinematics/gear/rack';

const turn = 2 * Math.PI;
/** How far `angle` lies from the nearest multiple of `step`. */
const offGrid = (angle: number, step: number) => Math.abs(angle - step * Math.round(angle / step));

describe('the centres of two wheels', () => {
  it('are half the module times the teeth together, or apart inside a ring', () => {
    // Lesson 2.1's check: 12 and 36, 10 and 40 teeth of module 4.
    expect(centreDistance({ module: 4, firstTeeth: 12, secondTeeth: 36 })).toBe(96);
    expect(centreDistance({ module: 4, firstTeeth: 10, secondTeeth: 40 })).toBe(100);
    expect(centreDistance({ module: 3, firstTeeth: 20, secondTeeth: 60, ring: 'second' })).toBe(60);
    expect(centreDistance({ module: 3, firstTeeth: 60, secondTeeth: 20, ring: 'first' })).toBe(60);
    expect(() =>
      centreDistance({ module: 3, firstTeeth: 60, secondTeeth: 20, ring: 'second' }),
    ).toThrow('ring teeth over pinion teeth is -40');
  });

  it('state gap and overlap, and whether the tips still touch', () => {
    const mesh = { module: 4, firstTeeth: 12, secondTeeth: 36 };
    expect(meshState(mesh, 96)).toEqual({ outcome: 'meshes', gap: 0, gapInModules: 0 });
    expect(meshState(mesh, 99)).toEqual({
      outcome: 'apart',
      gap: 3,
      gapInModules: 0.75,
      tips: 'touch',
    });
    expect(meshState(mesh, 104)).toMatchObject({ outcome: 'apart', gap: 8, tips: 'miss' });
    expect(meshState(mesh, 94)).toEqual({ outcome: 'too-close', gap: -2, gapInModules: -0.5 });
    expect(meshState(mesh, 96.3, 0.5).outcome).toBe('meshes');
    expect(meshState({ ...mesh, ring: 'second' }, 50)).toMatchObject({
      outcome: 'too-close',
      gap: -2,
    });
    expect(() => meshState(mesh, 0)).toThrow('distance is 0');
  });
});

describe('a pair of wheels', () => {
  it('turns round sense and speed, and multiplies torque', () => {
    expect(gearPair({ module: 5, firstTeeth: 16, secondTeeth: 48 })).toEqual({
      centreDistance: 160,
      turns: -1 / 3,
      torqueRatio: 3,
    });
    expect(gearPair({ module: 1, firstTeeth: 20, secondTeeth: 60, ring: 'second' }).turns).toBe(
      1 / 3,
    );
    expect(pitchLineSpeed({ module: 5, teeth: 16 }, -3 * Math.PI)).toBeCloseTo(376.991118431, 8);
  });

  it('moves a rack by one pitch circumference a turn', () => {
    // Case GR-RK-01.
    expect(rackTravel({ module: 3, teeth: 20 }, turn)).toBeCloseTo(188.495559215, 8);
    expect(rackTravel({ module: 3, teeth: 20 }, -turn / 2)).toBeCloseTo(-94.2477796077, 8);
  });
});

describe('the phase of a mesh', () => {
  const counts = fc.integer({ min: 5, max: 120 });
  const angles = fc.double({ min: -50, max: 50, noNaN: true });

  it('sets a space of the second round each tooth of the first, whatever the places', () => {
    fc.assert(
      fc.property(counts, counts, angles, angles, (firstTeeth, secondTeeth, firstAngle, line) => {
        const phase = meshPhase({ firstTeeth, secondTeeth }, firstAngle, line);
        // Turn the first until a tooth points along the line: the second must show a space.
        const toTooth = Math.round(((line - firstAngle) * firstTeeth) / turn) * (turn / firstTeeth);
        const advance = line - firstAngle - toTooth;
        const then = phase - (advance * firstTeeth) / secondTeeth;
        const space = line + Math.PI - turn / 2 / secondTeeth;
        expect(offGrid(then - space, turn / secondTeeth)).toBeLessThan(1e-9);
        expect(meshPhase({ firstTeeth, secondTeeth }, firstAngle + advance, line)).toBeCloseTo(
          then,
          9,
        );
      }),
      { seed: 2, numRuns: 2000 },
    );
  });

  it('sets a pinion into a ring alike from either side', () => {
    fc.assert(
      fc.property(counts, counts, angles, angles, (pinion, more, angle, line) => {
        const ring = pinion + more;
        const ringAngle = meshPhase(
          { firstTeeth: pinion, secondTeeth: ring, ring: 'second' },
          angle,
          line,
        );
        const back = meshPhase(
          { firstTeeth: ring, secondTeeth: pinion, ring: 'first' },
          ringAngle,
          line + Math.PI,
        );
        expect(offGrid(back - angle, turn / pinion)).toBeLessThan(1e-7);
      }),
      { seed: 3, numRuns: 2000 },
    );
  });

  it('runs on without jumps, against the first outside and with it inside', () => {
    const at = (angle: number) => meshPhase({ firstTeeth: 12, secondTeeth: 36 }, angle, 0.3);
    expect(at(30 * turn) - at(0)).toBeCloseTo(-10 * turn, 9);
    const inside = (angle: number) =>
      meshPhase({ firstTeeth: 12, secondTeeth: 36, ring: 'second' }, angle, 0.3);
    expect(inside(30 * turn) - inside(0)).toBeCloseTo(10 * turn, 9);
    expect(() => meshPhase({ firstTeeth: 12, secondTeeth: 36 }, Number.NaN, 0)).toThrow(
      'firstAngle',
    );
  });
});
