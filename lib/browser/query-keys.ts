import type { UnitSystem } from '@/lib/quantities/unit-system';

/** The names under which answers of the server are kept in the page. */
export const queryKeys = {
  /** Every round of one person at one exercise. */
  rounds: (personId: string | null, exerciseId: string) => ['round', personId, exerciseId] as const,
  /** A round belongs to one person, and each unit system has its own. */
  round: (personId: string | null, exerciseId: string, units: UnitSystem) =>
    ['round', personId, exerciseId, units] as const,
  progress: (personId: string | null) => ['progress', personId] as const,
  classProgress: (classId: string, names: 'shown' | 'hidden') =>
    ['class-progress', classId, names] as const,
  waiting: () => ['waiting-answers'] as const,
};
