import type { ReactNode } from 'react';
import { Notice } from '@/components/ui/notice';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { SectionNav } from '@/components/ui/section-nav';
import type { ClassFound } from '@/lib/data/classes';

interface ClassFrameProps {
  readonly found: ClassFound;
  readonly children: ReactNode;
}

/** The frame of a class's pages: its name, and the way between them. */
export function ClassFrame({ found, children }: ClassFrameProps) {
  const { classId, name, learners, instructors, archived } = found;
  const base = `/classes/${classId}`;
  const taught = instructors.length > 0 ? ` · taught by ${instructors.join(' and ')}` : '';
  return (
    <Page>
      <PageHeading
        eyebrow={`Class · ${learners} ${learners === 1 ? 'learner' : 'learners'}${taught}`}
      >
        {name}
      </PageHeading>
      <SectionNav
        label="This class"
        links={[
          { href: base, label: 'Progress' },
          { href: `${base}/work`, label: 'Work' },
          { href: `${base}/sticking-points`, label: 'Sticking points' },
          { href: `${base}/people`, label: 'People' },
          { href: `${base}/settings`, label: 'Settings' },
        ]}
      />
      {archived ? (
        <Notice title="This class is put away.">
          Everything in it can be read, and nothing in it changes. Under Settings it can be taken
          back into use.
        </Notice>
      ) : null}
      {children}
    </Page>
  );
}
