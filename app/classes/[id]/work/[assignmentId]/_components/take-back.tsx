import { sayDeadline } from '@/components/progress/say-due';
import { ActionForm } from '@/components/ui/action-form';
import { Section } from '@/components/ui/panel';
import type { AssignmentFound } from '@/lib/data/assignment-list';
import { withdrawWork } from '../../actions';

interface TakeBackProps {
  readonly classId: string;
  readonly work: AssignmentFound;
}

/** Takes the whole back; what was done for it stays in the records. */
export function TakeBack({ classId, work }: TakeBackProps) {
  const answers = work.answers === 1 ? 'One answer counts' : `${work.answers} answers count`;
  return (
    <Section title="Take it back">
      <p className="mb-4 max-w-measure">
        It leaves everybody’s Today page and the table of progress.{' '}
        {work.answers === 0
          ? 'Nobody has answered it yet.'
          : `${answers} for it: they stay in the learners’ records, and you can go on reading them.`}
      </p>
      <ActionForm
        action={withdrawWork.bind(null, classId, work.assignmentId)}
        fields={[]}
        submit="Take it back"
        variant="danger"
      />
    </Section>
  );
}

interface WorkFactsProps {
  readonly work: AssignmentFound;
  readonly timeZone: string;
}

/** Work that is not changed any more. */
export function WorkFacts({ work, timeZone }: WorkFactsProps) {
  return (
    <>
      <p className="mb-3 max-w-measure">
        {work.withdrawn ? 'This was taken back. ' : ''}
        It was due {sayDeadline(work.dueAt, timeZone)}, set by {work.setBy}
        {work.answers === 0 ? '; nobody answered it.' : `; ${work.answers} answers are kept.`}
      </p>
      {work.note ? <p className="max-w-measure whitespace-pre-line">{work.note}</p> : null}
    </>
  );
}
