import type { Metadata } from 'next';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { listAssignments } from '@/lib/data/assignments';
import { ClassFrame } from '../_components/class-frame';
import { requireClass, type ClassPageProps } from '../_components/class-of-page';
import { Assignments } from './_components/assignments';
import { SetLesson } from './_components/set-lesson';

export const metadata: Metadata = { title: 'Work that is set' };

export default async function WorkPage(props: ClassPageProps) {
  const found = await requireClass(props);
  const { classId, timeZone } = found;
  const assignments = await listAssignments(await requireViewer(), classId);
  return (
    <ClassFrame found={found}>
      <div className="grid gap-x-11 lg:grid-cols-[1.55fr_1fr]">
        <Section title="What is set">
          <Assignments classId={classId} timeZone={timeZone} assignments={assignments} />
        </Section>
        {found.archived ? null : (
          <Section title="Set a lesson">
            <SetLesson classId={classId} timeZone={timeZone} />
          </Section>
        )}
      </div>
    </ClassFrame>
  );
}
