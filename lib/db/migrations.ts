import { createPeople } from '@/migrations/20261201T0901-create-people';
import { createSessions } from '@/migrations/20261201T0902-create-sessions';
import { createOneTimeLinks } from '@/migrations/20261201T0903-create-one-time-links';
import { createClasses } from '@/migrations/20261201T0904-create-classes';
import { createRounds } from '@/migrations/20261201T0905-create-rounds';
import { createAttempts } from '@/migrations/20261201T0906-create-attempts';
import { createRequestKeys } from '@/migrations/20261201T0907-create-request-keys';
import { createSkillFacts } from '@/migrations/20261201T0908-create-skill-facts';
import { createAssignments } from '@/migrations/20261201T0909-create-assignments';
import { createReviews } from '@/migrations/20261201T0910-create-reviews';
import { createAuditEntries } from '@/migrations/20261201T0911-create-audit-entries';
import { createThrottle } from '@/migrations/20261201T0912-create-throttle';
import { createLetters } from '@/migrations/20261201T1000-create-letters';
import { addMailPreference } from '@/migrations/20261201T1001-add-mail-preference';
import { createCalendarAddresses } from '@/migrations/20261201T1002-create-calendar-addresses';
import { createInvitations } from '@/migrations/20261201T1100-create-invitations';
import { widenOneTimeLinks } from '@/migrations/20261201T1101-widen-one-time-links';
import { indexMembershipsByClass } from '@/migrations/20261201T1200-index-memberships-by-class';
import { widenComments } from '@/migrations/20261201T1201-widen-comments';
import type { Migration } from './migration';

/** Every change, in order; a name, once released, never changes. */
export const migrations: readonly { readonly name: string; readonly migration: Migration }[] = [
  { name: '20261201T0901-create-people', migration: createPeople },
  { name: '20261201T0902-create-sessions', migration: createSessions },
  { name: '20261201T0903-create-one-time-links', migration: createOneTimeLinks },
  { name: '20261201T0904-create-classes', migration: createClasses },
  { name: '20261201T0905-create-rounds', migration: createRounds },
  { name: '20261201T0906-create-attempts', migration: createAttempts },
  { name: '20261201T0907-create-request-keys', migration: createRequestKeys },
  { name: '20261201T0908-create-skill-facts', migration: createSkillFacts },
  { name: '20261201T0909-create-assignments', migration: createAssignments },
  { name: '20261201T0910-create-reviews', migration: createReviews },
  { name: '20261201T0911-create-audit-entries', migration: createAuditEntries },
  { name: '20261201T0912-create-throttle', migration: createThrottle },
  { name: '20261201T1000-create-letters', migration: createLetters },
  { name: '20261201T1001-add-mail-preference', migration: addMailPreference },
  { name: '20261201T1002-create-calendar-addresses', migration: createCalendarAddresses },
  { name: '20261201T1100-create-invitations', migration: createInvitations },
  { name: '20261201T1101-widen-one-time-links', migration: widenOneTimeLinks },
  { name: '20261201T1200-index-memberships-by-class', migration: indexMembershipsByClass },
  { name: '20261201T1201-widen-comments', migration: widenComments },
];
