import Link from 'next/link';
import type { LearnerProgress } from '@/lib/schemas/class-progress';

interface LearnerLinkProps {
  readonly classId: string;
  readonly learner: Pick<LearnerProgress, 'learnerId' | 'name'>;
  /** Without names there is nobody to lead to. */
  readonly hidden?: boolean;
}

/** A learner's name, leading to what they have done in this class. */
export function LearnerLink({ classId, learner, hidden = false }: LearnerLinkProps) {
  if (hidden) return <span className="whitespace-nowrap">{learner.name}</span>;
  return (
    <Link
      href={`/classes/${classId}/learners/${learner.learnerId}`}
      prefetch={false}
      className="link link-target min-w-32"
    >
      {learner.name}
    </Link>
  );
}
