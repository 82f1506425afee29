import { listInvitations } from '@/lib/data/invitations';
import { can } from '@/lib/policy/can';
import type { Viewer } from '@/lib/policy/viewer';
import { InvitationTable } from './invitation-table';
import { InviteForm } from './invite-form';

interface InvitingProps {
  readonly viewer: Viewer;
  /** The class that people are invited to; null for the workshop alone. */
  readonly classId: string | null;
  readonly timeZone: string;
}

/** Inviting people to a class or to the workshop, and who was invited so far. */
export async function Inviting({ viewer, classId, timeZone }: InvitingProps) {
  const invitations = await listInvitations(viewer, classId);
  return (
    <>
      <InviteForm
        classId={classId}
        mayInviteInstructors={can(viewer, 'invite an instructor to a class', classId ?? undefined)}
      />
      {invitations.length > 0 ? (
        <div className="mt-8">
          <InvitationTable invitations={invitations} timeZone={timeZone} />
        </div>
      ) : null}
    </>
  );
}
