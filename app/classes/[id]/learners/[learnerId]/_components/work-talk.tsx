import { sayDue } from '@/components/progress/say-due';
import { ActionForm } from '@/components/ui/action-form';
import type { LearnerInClass } from '@/lib/data/class-work';
import { Said } from '../../../_components/said';
import { commentOnWork } from '../actions';

/** What is set to a learner, with what has been said about each as a whole, and a form to say more. */
export function WorkTalk({ learner }: Readonly<{ learner: LearnerInClass }>) {
  const { classId, learnerId, timeZone, archived, work } = learner;
  return (
    <ul className="divide-y divide-rule border-y border-rule">
      {work.map(({ assignmentId, titles, dueAt, comments }) => (
        <li key={assignmentId} className="py-3">
          <p className="font-semibold">{titles.join(', ')}</p>
          <p className="mb-2 text-[0.9375rem] text-pencil">{sayDue(dueAt, timeZone)}</p>
          <Said comments={comments} timeZone={timeZone} />
          {archived ? null : (
            <details>
              <summary className="link min-h-11 py-2">
                Say something about it
                <span className="sr-only">: {titles.join(', ')}</span>
              </summary>
              <ActionForm
                action={commentOnWork.bind(null, classId, learnerId, assignmentId)}
                submit="Say it"
                variant="secondary"
                prefix={`${assignmentId}-`}
                fields={[{ name: 'body', label: 'To the learner', rows: 3 }]}
              />
            </details>
          )}
        </li>
      ))}
    </ul>
  );
}
