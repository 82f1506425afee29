import { Section } from '@/components/ui/panel';
import { countUnread } from '@/lib/data/feedback';
import { findToday } from '@/lib/data/today';
import type { Viewer } from '@/lib/policy/viewer';
import { GoOn } from './go-on';
import { Lifting } from './lifting';
import { OwnPegs } from './own-pegs';
import { SetForYou } from './set-for-you';
import { Unread } from './unread';

/** What is set, where the learner was, and the pegs. */
export async function TodayParts({ viewer }: { readonly viewer: Viewer }) {
  const [today, unread] = await Promise.all([findToday(viewer), countUnread(viewer)]);
  return (
    <>
      <Unread unread={unread} />
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
    </>
  );
}
