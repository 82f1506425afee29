'use client';

import { ErrorMessage } from '@/app/_components/error-message';

interface LessonErrorProps {
  readonly error: Error & { digest?: string };
  readonly reset: () => void;
}

/** A lesson that could not be shown; what was typed into it is still in the tab. */
export default function LessonError({ error, reset }: LessonErrorProps) {
  return <ErrorMessage id={error.digest} onRetry={reset} />;
}
