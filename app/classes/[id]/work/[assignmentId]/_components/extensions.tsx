import { sayDeadline } from '@/components/progress/say-due';
import { ActionForm } from '@/components/ui/action-form';
import { Section } from '@/components/ui/panel';
import type { AssignmentFound } from '@/lib/data/assignment-list';
import { sayMoment } from '@/lib/data/class-time';
import { giveTime, takeTimeBack } from '../../actions';

const WEEK = 7 * 24 * 60 * 60 * 1000;

interface ExtensionsProps {
  readonly classId: string;
  readonly timeZone: string;
  readonly work: AssignmentFound;
  /** Whether nothing about it changes any more. */
  readonly settled: boolean;
}

/** More time for single learners: who has been given it, and the form that gives it. */
export function Extensions({ classId, timeZone, work, settled }: ExtensionsProps) {
  const { assignmentId, extensions } = work;
  if (settled && extensions.length === 0) return null;
  return (
    <Section title="More time for one learner">
      {extensions.length > 0 ? (
        <ul className="mb-5 divide-y divide-rule border-y border-rule">
          {extensions.map(({ learnerId, name, dueAt, givenBy }) => (
            <li key={learnerId} className="flex flex-wrap items-center justify-between gap-3 py-2">
              <span>
                <span className="font-semibold">{name}</span> until {sayDeadline(dueAt, timeZone)}
                <span className="block text-[0.9375rem] text-pencil">given by {givenBy}</span>
              </span>
              {settled ? null : (
                <ActionForm
                  action={takeTimeBack.bind(null, classId, assignmentId, learnerId)}
                  fields={[]}
                  submit="Take back"
                  variant="quiet"
                />
              )}
            </li>
          ))}
        </ul>
      ) : null}
      {settled ? null : <GiveTime classId={classId} timeZone={timeZone} work={work} />}
    </Section>
  );
}

function GiveTime({ classId, timeZone, work }: Omit<ExtensionsProps, 'settled'>) {
  const chosen = new Set(work.learners ?? work.inClass.map(({ learnerId }) => learnerId));
  const later = sayMoment(timeZone, new Date(new Date(work.dueAt).getTime() + WEEK));
  return (
    <ActionForm
      action={giveTime.bind(null, classId, work.assignmentId)}
      submit="Give more time"
      variant="secondary"
      prefix="extension-"
      fields={[
        {
          name: 'learnerId',
          label: 'Who',
          options: work.inClass
            .filter(({ learnerId }) => chosen.has(learnerId))
            .map(({ learnerId, name }) => ({ value: learnerId, label: name })),
        },
        { name: 'dueOn', label: 'Until', type: 'date', value: later.on },
        {
          name: 'dueTime',
          label: 'At',
          type: 'time',
          value: later.time,
          hint: 'Left empty: the end of that day. Giving it again changes it.',
        },
      ]}
    />
  );
}
