import type { Metadata } from 'next';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { findToday } from '@/lib/data/today';
import { GoOn } from './_components/go-on';
import { Lifting } from './_components/lifting';
import { OwnPegs } from './_components/own-pegs';
import { SetForYou } from './_components/set-for-you';

export const metadata: Metadata = { title: 'Today' };

export default async function TodayPage() {
  const viewer = await requireViewer();
  const today = await findToday(viewer);
  return (
    <Page>
      <PageHeading>Today</PageHeading>
      <div className="grid gap-x-11 lg:grid-cols-[1.55fr_1fr]">
        <div className="min-w-0">
          <Section title={today.last ? 'Go on where you were' : 'Begin here'}>
            <GoOn today={today} />
          </Section>
          <Section title="Set for your class">
            <SetForYou set={today.set} />
          </Section>
        </div>
        <div className="min-w-0">
          <Lifting lessons={today.lessons} />
          <Section title="Your pegs">
            <OwnPegs lessons={today.lessons} />
          </Section>
        </div>
      </div>
    </Page>
  );
}
