import type { ReactNode } from 'react';

/** A hairline ticked like a rule; it says nothing and is hidden from screen readers. */
export function TickedRule() {
  return <div className="ticked" aria-hidden="true" />;
}

interface PageHeadingProps {
  readonly children: ReactNode;
  /** A line above the heading that says where this page belongs. */
  readonly eyebrow?: ReactNode;
}

/** The one heading of a page, with the ticked rule under it. */
export function PageHeading({ children, eyebrow }: PageHeadingProps) {
  return (
    <div className="mb-8">
      {eyebrow ? <p className="mb-1 text-pencil">{eyebrow}</p> : null}
      <h1 className="mb-3">{children}</h1>
      <TickedRule />
    </div>
  );
}
