/** What each job is told; a handler of the same name stands in lib/work. */
export interface JobPayloads {
  /** Sends one letter of the outbox. */
  'send-letter': { readonly letterId: string };
  /** Writes to whoever has forgotten a password, if the address has an account. */
  'send-reset': { readonly email: string };
  /** Writes to whoever wants to join a class with its word, if a class is open to it. */
  'take-up-joining': { readonly word: string; readonly name: string; readonly email: string };
}

/** The name of a job that something in the product causes; the timetable's own are in lib/work. */
export type JobName = keyof JobPayloads;
