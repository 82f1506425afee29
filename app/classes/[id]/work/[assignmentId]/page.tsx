import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { findAssignment } from '@/lib/data/assignment-list';
import { ClassFrame } from '../../_components/class-frame';
import { requireClass } from '../../_components/class-of-page';
import { changeWork } from '../actions';
import { AssignmentForm } from '../_components/assignment-form';
import { lessonChoices, valuesOf } from '../_components/form-choices';
import { Extensions } from './_components/extensions';
import { TakeBack, WorkFacts } from './_components/take-back';

export const metadata: Metadata = { title: 'Work that is set' };

interface AssignmentPageProps {
  readonly params: Promise<{ readonly id: string; readonly assignmentId: string }>;
}

export default async function AssignmentPage({ params }: AssignmentPageProps) {
  const { assignmentId } = await params;
  const found = await requireClass({ params });
  const { classId, timeZone } = found;
  const work = await findAssignment(await requireViewer(), classId, assignmentId);
  if (work === null) notFound();
  const settled = found.archived || work.withdrawn;
  return (
    <ClassFrame found={found}>
      <div className="grid gap-x-11 lg:grid-cols-[1.55fr_1fr]">
        <Section title={work.titles.join(', ')}>
          {settled ? (
            <WorkFacts work={work} timeZone={timeZone} />
          ) : (
            <AssignmentForm
              action={changeWork.bind(null, classId, assignmentId)}
              choices={{ timeZone, lessons: lessonChoices(), learners: work.inClass }}
              values={valuesOf(work, timeZone)}
              submit="Save"
            />
          )}
        </Section>
        <div className="min-w-0">
          <Extensions classId={classId} timeZone={timeZone} work={work} settled={settled} />
          {settled ? null : <TakeBack classId={classId} work={work} />}
        </div>
      </div>
    </ClassFrame>
  );
}
