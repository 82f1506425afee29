import { ActionForm } from '@/components/ui/action-form';
import { sayWhen } from '@/components/progress/say-due';
import { Section } from '@/components/ui/panel';
import { findCalendarAddress } from '@/lib/data/calendar-address';
import type { Viewer } from '@/lib/policy/viewer';
import { endCalendar, makeCalendar } from './calendar-actions';

/** Makes, renews and ends the secret address at which a calendar program finds what is due. */
export async function CalendarAddress({ viewer }: Readonly<{ viewer: Viewer }>) {
  const madeAt = await findCalendarAddress(viewer);
  return (
    <Section title="Calendar">
      <p className="mb-4 max-w-measure text-pencil">
        {madeAt === null
          ? 'What is due can stand in your own calendar. You get a secret address for it: subscribe to it in the calendar program, and keep it to yourself.'
          : `Your calendar address was made on ${sayWhen(madeAt, viewer.timeZone)}. It is not shown again; if you have lost it, or somebody else has it, make a new one, which ends the old.`}
      </p>
      <ActionForm
        action={makeCalendar}
        fields={[]}
        submit={madeAt === null ? 'Make the address' : 'Make a new address'}
        variant="secondary"
      />
      {madeAt === null ? null : (
        <div className="mt-4">
          <ActionForm action={endCalendar} fields={[]} submit="End the address" variant="danger" />
        </div>
      )}
    </Section>
  );
}
