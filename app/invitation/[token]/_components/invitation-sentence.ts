import type { InvitationFound } from '@/lib/data/entry/accept-invitation';

/** Who invites to what. */
export function invitationSentence({
  className,
  role,
  inviterName,
}: Pick<InvitationFound, 'className' | 'role' | 'inviterName'>): string {
  const what =
    className === null
      ? 'to Hornbeam, where the mechanisms that move wooden things are taught.'
      : role === 'instructor'
        ? `to teach ${className} with Hornbeam.`
        : `to ${className}, which learns with Hornbeam.`;
  if (inviterName === null) return `Your address is confirmed: come in ${what}`;
  return `${inviterName} invites you ${what}`;
}
