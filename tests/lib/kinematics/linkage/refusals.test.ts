import { describe, expect, it } from 'vitest';
import { hartLinkage } from '@/lib/kinematics/linkage/hart';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';
import { planLinkage } from '@/lib/kinematics/linkage/solver/plan-linkage';
import { togglePress } from '@/lib/kinematics/linkage/toggle';
import { trammelLinkage } from '@/lib/kinematics/linkage/trammel-linkage';

const crank: Linkage = {
  points: { O: { x: 0, y: 0 }, A: { x: 0, y: 40 }, B: { x: 90, y: 0 } },
  fixed: ['O', 'B'],
  bars: [{ ends: ['O', 'A'], length: 40 }],
  drivers: [{ kind: 'angle', from: 'O', to: 'A' }],
};

describe('what is no linkage', () => {
  it.each([
    ['a bar to no point', { ...crank, bars: [{ ends: ['O', 'Z'], length: 4 }] }, 'point is Z'],
    ['a driver that turns no body', { ...crank, bars: [] }, 'driver turns O to A'],
    [
      'a plate whose points are in one place',
      { ...crank, plates: [{ shape: { A: { x: 0, y: 0 }, O: { x: 0, y: 0 } } }] },
      'expected two points apart',
    ],
    [
      'a driver that slides a point without a groove',
      { ...crank, drivers: [{ kind: 'slide', point: 'A' }] },
      'driver slides A',
    ],
  ] as const)('%s is refused by name', (_what, linkage, told) => {
    expect(() => planLinkage(linkage)).toThrow(RangeError);
    expect(() => planLinkage(linkage)).toThrow(told);
  });

  it('a trammel with its pins in one place, or a Hart cell with short long bars', () => {
    expect(() => trammelLinkage({ uprightPin: 50, levelPin: 50 })).toThrow('two pins apart');
    expect(() => hartLinkage({ long: 70, short: 80, share: 0.5 }, 30)).toThrow('long − short');
    expect(() => togglePress(0.1, 2)).toThrow('togglePress: second is 2');
  });
});
