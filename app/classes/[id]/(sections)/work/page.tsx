import type { Metadata } from 'next';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { listAssignments } from '@/lib/data/assignments';
import { requireClass, type ClassPageProps } from '../../_components/class-of-page';
import { Assignments } from './_components/assignments';
import { SetLesson } from './_components/set-lesson';

export const metadata: Metadata = { title: 'Work that is set' };

export default async function WorkPage({ params }: ClassPageProps) {
  const { classId, timeZone } = await requireClass((await params).id);
  const assignments = await listAssignments(await requireViewer(), classId);
  return (
    <div className="grid gap-x-11 lg:grid-cols-[1.55fr_1fr]">
      <Section title="What is set">
        <Assignments classId={classId} timeZone={timeZone} assignments={assignments} />
      </Section>
      <Section title="Set a lesson">
        <SetLesson classId={classId} timeZone={timeZone} />
      </Section>
    </div>
  );
}
