import Link from 'next/link';
import type { LearnerProgress } from '@/lib/schemas/class-progress';

interface LearnerLinkProps {
  readonly classId: string;
  readonly learner: Pick<LearnerProgress, 'learnerId' | 'name'>;
}

/** A learner's name, leading to what they have done in this class. */
export function LearnerLink({ classId, learner }: LearnerLinkProps) {
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
