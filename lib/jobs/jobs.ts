/** What each job is told; a handler of the same name stands in lib/work. */
export interface JobPayloads {
  /** Sends one letter of the outbox. */
  'send-letter': { readonly letterId: string };
}

/** The name of a job that something in the product causes; the timetable's own are in lib/work. */
export type JobName = keyof JobPayloads;
