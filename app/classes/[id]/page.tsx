import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { ClassProgress } from '@/components/progress/class-progress';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { listAssignments } from '@/lib/data/assignments';
import { findClass } from '@/lib/data/classes';
import { can } from '@/lib/policy/can';
import { AddMember } from './_components/add-member';
import { Assignments } from './_components/assignments';
import { Members } from './_components/members';
import { SetLesson } from './_components/set-lesson';

export const metadata: Metadata = { title: 'Class' };

interface ClassPageProps {
  readonly params: Promise<{ readonly id: string }>;
}

export default async function ClassPage({ params }: ClassPageProps) {
  const { id } = await params;
  const viewer = await requireViewer();
  const [found, assignments] = await Promise.all([
    findClass(viewer, id),
    listAssignments(viewer, id),
  ]);
  if (found === null) notFound();
  const learners = found.members.filter(({ role }) => role === 'learner').length;
  const mayChange = can(viewer, 'change who is in a class', id);
  return (
    <Page>
      <PageHeading eyebrow={`Class · ${learners} ${learners === 1 ? 'learner' : 'learners'}`}>
        {found.name}
      </PageHeading>
      <Section title="How everybody stands">
        <ClassProgress classId={id} />
      </Section>
      <div className="grid gap-x-11 lg:grid-cols-[1.55fr_1fr]">
        <div className="min-w-0">
          <Section title="What is set">
            <Assignments classId={id} timeZone={found.timeZone} assignments={assignments} />
          </Section>
          <Section title="Who is in the class">
            <Members classId={id} members={found.members} mayRemove={mayChange} />
          </Section>
        </div>
        <div className="min-w-0">
          <Section title="Set a lesson">
            <SetLesson classId={id} timeZone={found.timeZone} />
          </Section>
          {mayChange ? (
            <Section title="Put somebody into it">
              <AddMember classId={id} viewer={viewer} members={found.members} />
            </Section>
          ) : null}
        </div>
      </div>
    </Page>
  );
}
