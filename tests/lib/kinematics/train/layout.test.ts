import { describe, expect, it } from 'vitest';
import { bodyOf, trainOfLayout, wheelPairs } from '@/lib/kinematics/train/layout';
import type { Arbor } from '@/lib/kinematics/train/layout';
import { turnsOfTrain } from '@/lib/kinematics/train/turns';

const wheel = (teeth: number, layer = 0, module = 4) => ({ teeth, layer, module });
const compound = (fast: boolean): readonly Arbor[] => [
  { x: 0, y: 0, wheels: [wheel(12)] },
  { x: 96, y: 0, wheels: [wheel(36), wheel(10, 1)], fast },
  { x: 96, y: 100, wheels: [wheel(40, 1)] },
];

describe('a layout of arbors', () => {
  it('finds which wheels meet and makes the train of them', () => {
    const result = turnsOfTrain(trainOfLayout(compound(true)), { 'arbor 1': 12 });
    expect(result.outcome === 'turns' && [...result.turns.values()]).toEqual([12, -4, 1]);
  });

  it('passes nothing on through a loose pair', () => {
    const arbors = compound(false);
    expect(bodyOf(arbors, { arbor: 1, wheel: 1 })).toBe('arbor 2, wheel 2');
    expect(turnsOfTrain(trainOfLayout(arbors), { 'arbor 1': 12 })).toMatchObject({
      outcome: 'partly-free',
      free: ['arbor 2, wheel 2', 'arbor 3'],
      freedom: 1,
    });
  });

  it('says of each pair in a plane how far it is off, also for two modules', () => {
    const arbors: readonly Arbor[] = [
      { x: 0, y: 0, wheels: [wheel(12)] },
      { x: 0, y: 99, wheels: [wheel(36)] },
      { x: 50, y: 0, wheels: [wheel(10, 0, 5)] },
    ];
    expect(wheelPairs(arbors).map(({ state }) => state)).toMatchObject([
      { outcome: 'apart', gap: 3, tips: 'touch' },
      { outcome: 'unlike-modules', gap: 1 },
      { outcome: 'unlike-modules' },
    ]);
    expect(trainOfLayout(arbors).meshes).toEqual([]);
    expect(trainOfLayout(arbors, 4).meshes).toHaveLength(1);
  });

  it('refuses a layout without a wheel', () => {
    expect(() => trainOfLayout([{ x: 0, y: 0, wheels: [] }])).toThrow('carry no wheel');
  });
});
