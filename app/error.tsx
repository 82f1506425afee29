'use client';

import { ErrorMessage } from './_components/error-message';

interface ErrorPageProps {
  readonly error: Error & { digest?: string };
  readonly reset: () => void;
}

export default function ErrorPage({ error, reset }: ErrorPageProps) {
  return <ErrorMessage id={error.digest} onRetry={reset} />;
}
