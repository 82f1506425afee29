import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { Section } from '@/components/ui/panel';
import { requireViewer } from '@/lib/auth/viewer';
import { findClassPeople } from '@/lib/data/class-people';
import { can } from '@/lib/policy/can';
import { ClassFrame } from '../_components/class-frame';
import { InvitePeople } from '../_components/invite-people';
import { requireClass, type ClassPageProps } from '../_components/class-of-page';
import { AddMember } from './_components/add-member';
import { JoiningWord } from './_components/joining-word';
import { Left } from './_components/left';
import { Members } from './_components/members';

export const metadata: Metadata = { title: 'Who is in the class' };

export default async function PeoplePage(props: ClassPageProps) {
  const viewer = await requireViewer();
  const found = await requireClass(props);
  const people = await findClassPeople(viewer, found.classId);
  if (people === null) notFound();
  const inside = people.filter(({ leftAt }) => leftAt === null);
  return (
    <ClassFrame found={found}>
      <div className="grid gap-x-11 lg:grid-cols-[1.55fr_1fr]">
        <div className="min-w-0">
          <Section title="Who is in the class">
            <Members found={found} members={inside} />
          </Section>
          {found.archived ? null : (
            <Section title="Invite people">
              <InvitePeople viewer={viewer} classId={found.classId} timeZone={found.timeZone} />
            </Section>
          )}
          <Left found={found} people={people.filter(({ leftAt }) => leftAt !== null)} />
        </div>
        {found.archived ? null : (
          <div className="min-w-0">
            <Section title="The joining word">
              <JoiningWord found={found} />
            </Section>
            {can(viewer, 'change who is in a class', found.classId) ? (
              <Section title="Put somebody into it">
                <AddMember classId={found.classId} viewer={viewer} members={inside} />
              </Section>
            ) : null}
          </div>
        )}
      </div>
    </ClassFrame>
  );
}
