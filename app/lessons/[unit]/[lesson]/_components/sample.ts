import 'server-only';
import { exercises } from '@/content/exercises/registry';
import { drawVariant } from '@/lib/marking/draw';
import { roundView } from '@/lib/marking/view';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import type { RoundView } from '@/lib/schemas/round';

const seed = 20_310;

/** Samples never change while the server runs, and drawing one takes many tries. */
const drawn = new Map<string, RoundView>();

/**
 * A round of nobody's, with numbers that are the same for everybody who is not signed in; it cannot
 * be answered. Null for an exercise that is not defined.
 */
export function sampleRound(exerciseId: string, units: UnitSystem): RoundView | null {
  const roundId = `sample-${exerciseId}-${units}`;
  const known = drawn.get(roundId);
  if (known !== undefined) return known;
  const definition = exercises.get(exerciseId);
  if (definition === undefined) return null;
  const sample: RoundView = roundView(definition, drawVariant(definition, seed, units), {
    roundId,
    hintsTaken: 0,
    solutionSeen: false,
    closed: false,
    attempts: [],
  });
  drawn.set(roundId, sample);
  return sample;
}
