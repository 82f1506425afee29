import { Inviting } from '@/app/_components/inviting/inviting';
import { can } from '@/lib/policy/can';
import type { Viewer } from '@/lib/policy/viewer';

interface InvitePeopleProps {
  readonly viewer: Viewer;
  readonly classId: string;
  readonly timeZone: string;
}

/** Inviting people to this class, for whoever may: nothing for anybody else. */
export function InvitePeople({ viewer, classId, timeZone }: InvitePeopleProps) {
  if (!can(viewer, 'invite people to a class', classId)) return null;
  return <Inviting viewer={viewer} classId={classId} timeZone={timeZone} />;
}
