import type { ReactNode } from 'react';

interface SectionProps {
  /** Where the rule margin leads; one of the front matter's sections. */
  readonly id: string;
  readonly title: string;
  readonly children: ReactNode;
}

/** A part of a lesson under its own heading, with its place on the rule margin. */
export function Section({ id, title, children }: SectionProps) {
  return (
    <section id={id} aria-labelledby={`${id}-title`} className="mt-14 scroll-mt-6 first:mt-0">
      <h2 id={`${id}-title`} className="mb-3">
        {title}
      </h2>
      {children}
    </section>
  );
}

/** The opening of a lesson: the thing to make. The page's one heading stands above it. */
export function Hook({ id, children }: Omit<SectionProps, 'title'>) {
  return (
    <section id={id} aria-label="The thing to make" className="scroll-mt-6 text-xl text-pencil">
      {children}
    </section>
  );
}
