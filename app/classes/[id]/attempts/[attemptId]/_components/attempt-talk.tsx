import { MarkSign } from '@/components/progress/mark';
import { sayWhen } from '@/components/progress/say-due';
import { ActionForm } from '@/components/ui/action-form';
import { Section } from '@/components/ui/panel';
import type { AttemptInClass } from '@/lib/data/class-work';
import { Said } from '../../../_components/said';
import { comment, markOtherwise } from '../actions';

/** What has been said about an answer, and the forms to say something and to mark it otherwise. */
export function AttemptTalk({ found }: Readonly<{ found: AttemptInClass }>) {
  const { classId, timeZone, archived, attempt, comments, overrides } = found;
  if (archived && comments.length + overrides.length === 0) return null;
  return (
    <>
      <Section title="Said about it">
        <Said comments={comments} timeZone={timeZone} />
        {archived ? null : (
          <ActionForm
            action={comment.bind(null, classId, attempt.attemptId)}
            submit="Say it"
            variant="secondary"
            fields={[{ name: 'body', label: 'To the learner', rows: 4 }]}
          />
        )}
      </Section>
      <Section title="Mark it otherwise">
        {overrides.map(({ authorName, verdict, reason, at }) => (
          <div key={at} className="mb-4 rounded border border-l-[6px] border-plum px-4 py-3">
            <p>
              Stands as <MarkSign mark={verdict} /> since {sayWhen(at, timeZone)}, by {authorName}
            </p>
            <p className="max-w-measure whitespace-pre-line">{reason}</p>
          </div>
        ))}
        {archived ? null : <Override classId={classId} attemptId={attempt.attemptId} />}
      </Section>
    </>
  );
}

function Override({ classId, attemptId }: Readonly<{ classId: string; attemptId: string }>) {
  return (
    <>
      <p className="mb-4 max-w-measure text-[0.9375rem] text-pencil">
        What was marked is kept and both are shown. It counts in this class; pegs stay as the round
        left them.
      </p>
      <ActionForm
        action={markOtherwise.bind(null, classId, attemptId)}
        submit="Let it stand so"
        variant="quiet"
        fields={[
          {
            name: 'verdict',
            label: 'It stands as',
            options: [
              { value: 'right', label: 'right' },
              { value: 'partly', label: 'partly right' },
              { value: 'wrong', label: 'not right yet' },
            ],
          },
          { name: 'reason', label: 'Because', hint: 'The learner reads it.', rows: 3 },
        ]}
      />
    </>
  );
}
