import clsx from 'clsx';
import type { ReactNode } from 'react';

interface PageProps {
  readonly children: ReactNode;
  /** `narrow` keeps a form or a message to the width of a line of text. */
  readonly width?: 'page' | 'narrow';
}

/** The main part of a page: where the skip link leads. */
export function Page({ children, width = 'page' }: PageProps) {
  return (
    <main
      id="main"
      tabIndex={-1}
      className={clsx(
        'mx-auto w-full grow px-4 pt-8 pb-16 outline-none sm:px-6 sm:pt-12 print:p-0',
        width === 'page' ? 'max-w-[1148px]' : 'max-w-2xl',
      )}
    >
      {children}
    </main>
  );
}
