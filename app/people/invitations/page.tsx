import type { Metadata } from 'next';
import { forbidden } from 'next/navigation';
import { Inviting } from '@/app/_components/inviting/inviting';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';
import { requireViewer } from '@/lib/auth/viewer';
import { can } from '@/lib/policy/can';

export const metadata: Metadata = { title: 'Invite people' };

export default async function InvitationsPage() {
  const viewer = await requireViewer();
  if (!can(viewer, 'invite people to the workshop')) forbidden();
  return (
    <Page>
      <PageHeading eyebrow="To the workshop, and to no class yet">Invite people</PageHeading>
      <p className="mb-6 max-w-measure text-pencil">
        Each gets a letter and makes their own account. To invite people into a class, go to the
        class: they are in it then as soon as they accept.
      </p>
      <Inviting viewer={viewer} classId={null} timeZone={viewer.timeZone} />
    </Page>
  );
}
