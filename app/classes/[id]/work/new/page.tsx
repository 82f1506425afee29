import type { Metadata } from 'next';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { findClassPeople } from '@/lib/data/class-people';
import { ClassFrame } from '../../_components/class-frame';
import { requireClass, type ClassPageProps } from '../../_components/class-of-page';
import { setWork } from '../actions';
import { AssignmentForm } from '../_components/assignment-form';
import { lessonChoices, newValues } from '../_components/form-choices';

export const metadata: Metadata = { title: 'Set work' };

export default async function NewWorkPage(props: ClassPageProps) {
  const found = await requireClass(props);
  const { classId, timeZone } = found;
  const people = (await findClassPeople(await requireViewer(), classId)) ?? [];
  const learners = people.filter(({ role, leftAt }) => role === 'learner' && leftAt === null);
  return (
    <ClassFrame found={found}>
      <Section title="Set work">
        {found.archived ? (
          <p>Nothing is set while the class is put away.</p>
        ) : (
          <AssignmentForm
            action={setWork.bind(null, classId)}
            choices={{
              timeZone,
              lessons: lessonChoices(),
              learners: learners.map(({ learnerId, name }) => ({ learnerId, name })),
            }}
            values={newValues(timeZone)}
            submit="Set it"
          />
        )}
      </Section>
    </ClassFrame>
  );
}
