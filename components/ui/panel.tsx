import clsx from 'clsx';
import type { ReactNode } from 'react';

interface PanelProps {
  readonly children: ReactNode;
  readonly className?: string;
}

/** A framed part of a page: a hairline, no shadow. */
export function Panel({ children, className }: PanelProps) {
  return (
    <div className={clsx('rounded border border-rule bg-paper px-5 py-5', className)}>
      {children}
    </div>
  );
}

interface SectionProps {
  readonly title: ReactNode;
  readonly children: ReactNode;
  readonly className?: string;
}

/** A part of a page under a heading of its own. */
export function Section({ title, children, className }: SectionProps) {
  return (
    <section className={clsx('mb-10 min-w-0', className)}>
      <h2 className="mb-3">{title}</h2>
      {children}
    </section>
  );
}

interface EmptyProps {
  readonly title: ReactNode;
  /** What would fill this place, and how. */
  readonly children: ReactNode;
}

/** What stands where there is nothing yet: it says why and what to do. */
export function Empty({ title, children }: EmptyProps) {
  return (
    <div className="rounded border border-dashed border-pencil px-5 py-6">
      <p className="mb-1 font-heading text-lg font-semibold">{title}</p>
      <div className="max-w-measure text-pencil">{children}</div>
    </div>
  );
}
