import 'server-only';
import { randomInt } from 'node:crypto';
import { exercises } from '@/content/exercises/registry';
import { answerKey, type AnswerKey } from '@/lib/marking/answer-key';
import { drawVariant } from '@/lib/marking/draw';
import { can } from '@/lib/policy/can';
import type { Viewer } from '@/lib/policy/viewer';
import type { UnitSystem } from '@/lib/quantities/unit-system';

/** Answers and slips of a fresh variant. */
export interface FreshKey extends AnswerKey {
  readonly units: UnitSystem;
  readonly seed: number;
}

/**
 * The answers and slips of a variant drawn for this look, for instructors and administrators; null
 * for anybody else, and for an exercise that is not there.
 */
export function findFreshKey(
  viewer: Viewer,
  exerciseId: string,
  units: UnitSystem = viewer.units,
  seed: number = randomInt(2 ** 31),
): FreshKey | null {
  const definition = exercises.get(exerciseId);
  if (definition === undefined || !can(viewer, 'see answers and slips')) return null;
  return { ...answerKey(definition, drawVariant(definition, seed, units)), units, seed };
}
