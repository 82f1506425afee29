import 'server-only';
import type { Transaction } from 'sequelize';
import { models } from '@/models';

/** What can be found in the audit log. */
export type AuditedAction =
  | 'signed in'
  | 'sign-in refused'
  | 'signed out'
  | 'password set'
  | 'link made'
  | 'session ended'
  | 'signed out everywhere'
  | 'password given again'
  | 'reset asked for'
  | 'address change asked for'
  | 'address changed'
  | 'own records taken away'
  | 'audit log taken away'
  | 'person invited'
  | 'invitation sent again'
  | 'invitation withdrawn'
  | 'person created'
  | 'person disabled'
  | 'person enabled'
  | 'administrator made'
  | 'administrator unmade'
  | 'class created'
  | 'class changed'
  | 'class archived'
  | 'class reopened'
  | 'joining word renewed'
  | 'joining opened'
  | 'joining closed'
  | 'member added'
  | 'member removed'
  | 'work set'
  | 'work changed'
  | 'work withdrawn'
  | 'class mail ended'
  | 'class mail wanted'
  | 'letter sent again'
  | 'calendar address made'
  | 'calendar address ended'
  | 'extension given'
  | 'extension taken back'
  | 'comment written'
  | 'marking overridden'
  | 'class progress exported'
  | "learner's work viewed";

/** One line of the audit log. It never holds a password, a secret or a link. */
export interface AuditLine {
  readonly actorId: string | null;
  readonly action: AuditedAction;
  readonly objectKind:
    | 'person'
    | 'learner'
    | 'class'
    | 'assignment'
    | 'attempt'
    | 'session'
    | 'invitation'
    | 'letter'
    | 'audit log';
  readonly objectId?: string | null;
  readonly classId?: string | null;
  readonly detail?: Readonly<Record<string, string | number | boolean | null>>;
}

/** Adds a line, within the transaction of what it is about. */
export async function recordAudit(line: AuditLine, transaction?: Transaction): Promise<void> {
  await models().AuditEntry.create(
    { ...line, detail: { ...line.detail } },
    { transaction, returning: false },
  );
}
