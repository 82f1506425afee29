import type { Metadata } from 'next';
import Link from 'next/link';
import { ActionForm } from '@/components/ui/action-form';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { listClasses } from '@/lib/data/classes';
import { can } from '@/lib/policy/can';
import { timeZoneOptions } from '../_components/time-zones';
import { makeClass } from './actions';
import { ClassList } from './_components/class-list';

export const metadata: Metadata = { title: 'Classes' };

export default async function ClassesPage() {
  const viewer = await requireViewer();
  const classes = await listClasses(viewer);
  return (
    <Page>
      <PageHeading>Classes</PageHeading>
      <Section title={viewer.isAdministrator ? 'Every class' : 'Your classes'}>
        <ClassList classes={classes} mayOpenAll={viewer.isAdministrator} />
      </Section>
      {can(viewer, 'see answers and slips') ? (
        <Section title="Answers and slips">
          <p className="max-w-measure">
            Every exercise with fresh numbers, its answer, the slips we know and the worked
            solution:{' '}
            <Link href="/exercises" prefetch={false} className="link">
              open the list
            </Link>
            . Learners cannot reach it.
          </p>
        </Section>
      ) : null}
      {can(viewer, 'make a class') ? (
        <Section title="Make a class">
          <ActionForm
            action={makeClass}
            submit="Make the class"
            fields={[
              { name: 'name', label: 'Name', hint: 'Such as Tuesday evening.', required: true },
              {
                name: 'timeZone',
                label: 'Time zone',
                value: viewer.timeZone,
                options: timeZoneOptions(viewer.timeZone),
                hint: 'Due dates are meant in it.',
              },
              { name: 'startsOn', label: 'First day', type: 'date', hint: 'May be left empty.' },
              { name: 'endsOn', label: 'Last day', type: 'date', hint: 'May be left empty.' },
            ]}
          />
        </Section>
      ) : null}
    </Page>
  );
}
