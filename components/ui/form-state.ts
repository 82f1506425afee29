/** What a server action tells the form that called it. */
export interface FormState {
  readonly outcome: 'idle' | 'refused' | 'done';
  /** One plain sentence: what happened, what was kept, what to do. */
  readonly message?: string;
  /** What is wrong, by the name of the field. */
  readonly errors?: Readonly<Record<string, string>>;
  /** What was typed, so that nothing is lost; secrets are never among it. */
  readonly values?: Readonly<Record<string, string>>;
  /** A link that is shown this once and kept nowhere. */
  readonly link?: string;
  /** What to do with the link, where it is not one to be handed over. */
  readonly linkSays?: string;
}

/** A form before anything was sent. */
export const idle: FormState = { outcome: 'idle' };
