import { describe, expect, it } from 'vitest';
import { planetsAssembly } from '@/lib/kinematics/train/assembly';
import {
  bevelDifferentialMeshes,
  carriedWheelMeshes,
  compoundPlanetaryMeshes,
  fergusonMeshes,
  planetaryMeshes,
  revertedEpicyclicMeshes,
} from '@/lib/kinematics/train/epicyclic';
import {
  cartWheels,
  ovalOfPen,
  planetaryDrive,
  planetaryFor,
  planetaryTorques,
} from '@/lib/kinematics/train/planetary';
import { turnsOfMeshes } from '@/lib/kinematics/train/turns';
import { toNumber, written } from '@/lib/numeric/fraction';

function turns(...asked: Parameters<typeof turnsOfMeshes>): ReadonlyMap<string, number> {
  const outcome = turnsOfMeshes(...asked);
  if (outcome.outcome !== 'turns') throw new Error(outcome.outcome);
  return outcome.turns;
}

describe('wheels that are carried round', () => {
  it('turn 1 + A/B outside, 1 − A/B over an idler, 1 − R/B inside a ring', () => {
    const carried = (a: number, b: number, way?: 'outside' | 'over-an-idler' | 'inside-a-ring') =>
      turns(carriedWheelMeshes(a, b, way), { carrier: 1 }, ['fixed']).get('carried');
    // Two turns, not one, for equal wheels (case TN-EW-02).
    expect(carried(40, 40)).toBe(2);
    expect(carried(40, 40, 'over-an-idler')).toBe(0);
    expect(carried(90, 30, 'inside-a-ring')).toBe(-2);
  });

  it('turn a sun twice with a planet that never turns', () => {
    // Sun and planet; case TN-SP-01.
    expect(turns(carriedWheelMeshes(40, 40), { carrier: 18 }, ['carried']).get('fixed')).toBe(36);
  });

  it('creep by paradox, and slow by ten thousand', () => {
    // Norton, Ferguson's paradox; case TN-FE-01 and TN-RE-02.
    const ferguson = turns(fergusonMeshes(100, 20, [99, 101]), { carrier: 100 }, ['fixed']);
    expect(ferguson.get('wheel 1')).toBeCloseTo(-100 / 99, 12);
    expect(ferguson.get('wheel 2')).toBeCloseTo(100 / 101, 12);
    const meshes = revertedEpicyclicMeshes({ fixed: 100, first: 99, second: 100, driven: 101 });
    expect(turns(meshes, { carrier: 9999 }, ['fixed']).get('driven')).toBeCloseTo(-1, 12);
  });

  it('meet in a differential at the mean', () => {
    const sides = turns(bevelDifferentialMeshes(), { left: 60, right: -60 });
    expect(sides.get('carrier')).toBe(0);
    expect(turns(bevelDifferentialMeshes(), { carrier: 100 }, ['left']).get('right')).toBe(200);
  });

  it('step down by nine with a stepped planet', () => {
    // Case TN-CP-01.
    const stepped = turns(compoundPlanetaryMeshes(20, 40, 20, 80), { sun: 9 }, ['ring']);
    expect(stepped.get('carrier')).toBeCloseTo(1, 12);
    expect(turns(planetaryMeshes(40, 20), { sun: 100, carrier: 200 }).get('ring')).toBe(250);
  });
});

describe('a planetary train', () => {
  const states = [
    ['ring', 'sun', 'carrier', '1/3'],
    ['ring', 'carrier', 'sun', '3'],
    ['sun', 'ring', 'carrier', '2/3'],
    ['sun', 'carrier', 'ring', '3/2'],
    ['carrier', 'sun', 'ring', '-1/2'],
    ['carrier', 'ring', 'sun', '-2'],
  ] as const;

  it.each(states)(
    'with the %s held and the %s driven turns the %s by %s',
    (held, driven, output, ratio) => {
      const drive = planetaryDrive({ sunTeeth: 30, planetTeeth: 15, held, driven });
      expect(drive.output).toBe(output);
      expect(written(drive.turns[output])).toBe(ratio);
      expect(toNumber(drive.turns[held])).toBe(0);
      expect(toNumber(drive.turns[driven])).toBe(1);
      expect(drive.ringTeeth).toBe(60);
    },
  );

  it('balances its torques, and puts out the power that is put in', () => {
    const { sun, ring, carrier } = planetaryTorques(30, 15, 2);
    expect([sun, ring, carrier]).toEqual([2, 4, -6]);
    const { turns: speeds } = planetaryDrive({
      sunTeeth: 30,
      planetTeeth: 15,
      held: 'ring',
      driven: 'sun',
    });
    expect(sun * toNumber(speeds.sun) + carrier * toNumber(speeds.carrier)).toBeCloseTo(0, 12);
  });

  it('is designed for a reduction, and refuses one that leaves no planet', () => {
    expect(planetaryFor(4, 24)).toEqual({ ring: 72, planet: 24, whole: true });
    expect(planetaryFor(4.5, 15)).toEqual({ ring: 52.5, planet: 18.75, whole: false });
    expect(() => planetaryFor(2, 24)).toThrow('reduction over 2 is 0');
    const both = { sunTeeth: 30, planetTeeth: 15, held: 'sun', driven: 'sun' } as const;
    expect(() => planetaryDrive(both)).toThrow('driven is sun, which is held');
  });

  it('takes planets that divide sun and ring together and have room', () => {
    // Lesson 9.1: sun 24 with planets of 12: 5 never spaces; with 30, 6 foul.
    const assembly = (planetTeeth: number, planets: number) =>
      planetsAssembly({ sunTeeth: 24, planetTeeth, planets, module: 1 });
    expect([2, 3, 4, 5, 6].map((n) => assembly(12, n).even)).toEqual([
      true,
      true,
      true,
      false,
      true,
    ]);
    expect(assembly(30, 6)).toMatchObject({ ringTeeth: 84, even: true, room: false });
    expect(assembly(30, 6).tipGap).toBeCloseTo(-5, 9);
    expect(assembly(12, 1)).toMatchObject({ even: true, room: true });
    // Case TN-AS-02: uneven places lie on the grid of sun and ring.
    const uneven = planetsAssembly({ sunTeeth: 20, planetTeeth: 31, planets: 4, module: 1 });
    expect(uneven.tipGap).toBeCloseTo(3.06244584051, 9);
    expect(uneven.places.map((place) => (place * 102) / (2 * Math.PI))).toEqual(
      [0, 26, 51, 77].map((step) => expect.closeTo(step, 9)),
    );
  });

  it('draws ovals, and leads a cart round a curve', () => {
    expect(ovalOfPen(40, 15)).toEqual({ long: 55, short: 25 });
    expect(ovalOfPen(40, 40).short).toBe(0);
    expect(cartWheels(10, 600, 1500)).toEqual({ outer: 12, inner: 8 });
    expect(cartWheels(10, 600, 300)).toEqual({ outer: 20, inner: 0 });
    expect(() => cartWheels(10, 600, 200)).toThrow('curveRadius over half the track is -100');
  });
});
