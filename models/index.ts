import type { Sequelize } from 'sequelize';
import { database } from '@/lib/db/connection';
import { Assignment } from './assignment';
import { AssignmentItem } from './assignment-item';
import { Attempt } from './attempt';
import { AuditEntry } from './audit-entry';
import { ClassGroup } from './class-group';
import { CountedAttempt } from './counted-attempt';
import { Invitation } from './invitation';
import { Learner } from './learner';
import { Letter } from './letter';
import { Membership } from './membership';
import { OneTimeLink } from './one-time-link';
import { Person } from './person';
import { RequestKey } from './request-key';
import { Round } from './round';
import { Session } from './session';
import { SkillFact } from './skill-fact';

const all = {
  Assignment,
  AssignmentItem,
  Attempt,
  AuditEntry,
  ClassGroup,
  CountedAttempt,
  Invitation,
  Learner,
  Letter,
  Membership,
  OneTimeLink,
  Person,
  RequestKey,
  Round,
  Session,
  SkillFact,
};

let tiedTo: Sequelize | undefined;

/** The models, tied to the process's connection when they are first asked for. */
export function models(): typeof all {
  const sequelize = database();
  if (tiedTo !== sequelize) {
    for (const model of Object.values(all)) model.tie(sequelize);
    tiedTo = sequelize;
  }
  return all;
}
