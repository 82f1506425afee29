import type { Metadata } from 'next';
import { timeZoneOptions } from '@/app/_components/time-zones';
import { ActionForm } from '@/components/ui/action-form';
import { Section } from '@/components/ui/panel';
import { ClassFrame } from '../_components/class-frame';
import { requireClass, type ClassPageProps } from '../_components/class-of-page';
import { changeClass, putAway, takeBack } from './actions';

export const metadata: Metadata = { title: 'Settings of a class' };

export default async function SettingsPage(props: ClassPageProps) {
  const found = await requireClass(props);
  const { classId, name, timeZone, startsOn, endsOn, archived } = found;
  if (archived) {
    return (
      <ClassFrame found={found}>
        <Section title="Take it back into use">
          <p className="mb-4 max-w-measure">
            Its people, its work and its dates are as they were. Joining stays closed until you open
            it.
          </p>
          <ActionForm action={takeBack.bind(null, classId)} fields={[]} submit="Take it back" />
        </Section>
      </ClassFrame>
    );
  }
  return (
    <ClassFrame found={found}>
      <div className="grid gap-x-11 lg:grid-cols-[1.55fr_1fr]">
        <Section title="Name, clock and dates">
          <ActionForm
            action={changeClass.bind(null, classId)}
            submit="Save"
            fields={[
              { name: 'name', label: 'Name', value: name, required: true },
              {
                name: 'timeZone',
                label: 'Time zone',
                value: timeZone,
                options: timeZoneOptions(timeZone),
                hint: 'Due dates are meant in it. Those already set stay at the moment they are.',
              },
              { name: 'startsOn', label: 'First day', type: 'date', value: startsOn ?? '', hint },
              { name: 'endsOn', label: 'Last day', type: 'date', value: endsOn ?? '', hint },
            ]}
          />
        </Section>
        <Section title="Put it away">
          <p className="mb-4 max-w-measure">
            When a class is over it can be put away: it leaves the lists and everybody’s Today page,
            nothing in it changes any more, and everything in it can still be read.
          </p>
          <ActionForm
            action={putAway.bind(null, classId)}
            fields={[]}
            submit="Put the class away"
            variant="danger"
          />
        </Section>
      </div>
    </ClassFrame>
  );
}

const hint = 'May be left empty.';
