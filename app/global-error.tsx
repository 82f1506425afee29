'use client';

import { ErrorMessage } from './_components/error-message';
import './globals.css';

interface GlobalErrorProps {
  readonly error: Error & { digest?: string };
  readonly reset: () => void;
}

/** Stands in for the whole document when even its head and foot could not be made. */
export default function GlobalError({ error, reset }: GlobalErrorProps) {
  return (
    <html lang="en-GB">
      <body>
        <title>Something broke · Hornbeam</title>
        <ErrorMessage id={error.digest} onRetry={reset} />
      </body>
    </html>
  );
}
