import 'server-only';

/**
 * What somebody shows before it is known who they are. The functions of this folder take a proof
 * where all others take a viewer; no other folder does.
 */
export type Proof =
  | PasswordProof
  | SessionProof
  | LinkProof
  | UnsubscribeProof
  | FeedProof
  | FormProof
  | JobProof
  | ConsoleProof;

/** An address and a password, with the network address they come from when it is known. */
export interface PasswordProof {
  readonly by: 'password';
  readonly email: string;
  readonly password: string;
  readonly from: string | null;
}

/** The secret of a session, out of a signed-in person's token. */
export interface SessionProof {
  readonly by: 'session';
  readonly secret: string;
}

/** The secret of a one-time link. */
export interface LinkProof {
  readonly by: 'link';
  readonly secret: string;
}

/** The signed token of a letter's "no more of these". */
export interface UnsubscribeProof {
  readonly by: 'unsubscribe';
  readonly token: string;
}

/** A form that anybody may send: nothing is known but the network address, if that. */
export interface FormProof {
  readonly by: 'form';
  readonly from: string | null;
}

/** The secret in the address of a calendar feed. */
export interface FeedProof {
  readonly by: 'feed';
  readonly secret: string;
}

/** Work that the job queue runs by itself. */
export interface JobProof {
  readonly by: 'job';
  readonly job: string;
}

/** Somebody at the machine itself, who could write to the database in any case. */
export interface ConsoleProof {
  readonly by: 'console';
}
