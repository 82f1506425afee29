'use client';

import { PegRail } from '@/components/progress/peg-rail';
import { usePegs } from '@/lib/browser/use-pegs';
import type { PegView } from '@/lib/schemas/round';

interface LessonPegsProps {
  readonly personId: string;
  readonly pegs: readonly PegView[];
}

/** The pegs of a lesson's skills; they move as answers are marked. */
export function LessonPegs({ personId, pegs }: LessonPegsProps) {
  return <PegRail pegs={usePegs(personId, pegs)} words />;
}
