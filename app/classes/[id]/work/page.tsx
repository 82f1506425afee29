import type { Metadata } from 'next';
import { ButtonLink } from '@/components/ui/button';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { listAssignments } from '@/lib/data/assignment-list';
import { ClassFrame } from '../_components/class-frame';
import { requireClass, type ClassPageProps } from '../_components/class-of-page';
import { Assignments } from './_components/assignments';

export const metadata: Metadata = { title: 'Work that is set' };

export default async function WorkPage(props: ClassPageProps) {
  const found = await requireClass(props);
  const { classId, timeZone } = found;
  const all = await listAssignments(await requireViewer(), classId);
  const taken = all.filter(({ withdrawn }) => withdrawn);
  return (
    <ClassFrame found={found}>
      <Section title="What is set">
        {found.archived ? null : (
          <p className="mb-5">
            <ButtonLink href={`/classes/${classId}/work/new`}>Set work</ButtonLink>
          </p>
        )}
        <Assignments
          classId={classId}
          timeZone={timeZone}
          assignments={all.filter(({ withdrawn }) => !withdrawn)}
        />
      </Section>
      {taken.length > 0 ? (
        <Section title="Taken back">
          <Assignments classId={classId} timeZone={timeZone} assignments={taken} />
        </Section>
      ) : null}
    </ClassFrame>
  );
}
