import { sayWhen } from '@/components/progress/say-due';
import type { AttemptInClass } from '@/lib/data/class-work';

const hints = ['none', 'one of three', 'two of three', 'all three'];

/** What else is known of an answer: when, in which units, with what help. */
export function AttemptFacts({ found }: Readonly<{ found: AttemptInClass }>) {
  const { attempt, timeZone, answeredAt, units, hintsTaken, solutionSeen, unaided, late } = found;
  const facts: readonly (readonly [string, string])[] = [
    ['Sent', `${sayWhen(attempt.createdAt, timeZone)}${late ? ', late' : ''}`],
    ...(answeredAt ? [['Answered on the device', sayWhen(answeredAt, timeZone)] as const] : []),
    ['Units', units === 'metric' ? 'millimetres' : 'inches'],
    ['Hints taken', hints[hintsTaken] ?? String(hintsTaken)],
    ['Worked solution', solutionSeen ? 'shown' : 'not shown'],
    ['Counts as unaided', unaided ? 'yes' : 'no'],
    ['Share of the parts right', `${Math.round(found.credit * 100)} %`],
  ];
  return (
    <dl className="divide-y divide-rule border-y border-rule">
      {facts.map(([name, value]) => (
        <div key={name} className="flex justify-between gap-4 py-2">
          <dt className="text-pencil">{name}</dt>
          <dd className="text-right">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
