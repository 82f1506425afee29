/** How one part, or one criterion of a setting or design, was marked. */
export interface MarkedPart {
  /** The part's key, or `part.criterion`. */
  readonly key: string;
  readonly label: string;
  readonly right: boolean;
  /** What was understood. */
  readonly echo: string;
  /** The advice of the slip that was recognised, or what is amiss. */
  readonly message?: string;
  readonly slip?: string;
  /** The ids of the options that were chosen, in the round they were shown in. */
  readonly chosen?: string[];
}

/** A part as marked, with its share of the whole and the skills it shows. */
export interface WeighedPart extends MarkedPart {
  readonly weight: number;
  readonly skills: readonly string[];
}

export type Verdict = 'right' | 'partly' | 'wrong';

/** A marked response. */
export interface Marking {
  readonly outcome: 'marked';
  readonly verdict: Verdict;
  /** The share of the whole that is right, from 0 to 1. */
  readonly score: number;
  readonly parts: readonly MarkedPart[];
  readonly message: string;
  readonly nextStep: string;
  /** A round closes when all of it is right; a prediction closes whatever it was. */
  readonly closesRound: boolean;
  /** For each skill of the exercise, whether all the parts that show it are right. */
  readonly skills: readonly { readonly skill: string; readonly right: boolean }[];
}

/** A response that could not be read: nothing was marked, and it is no attempt. */
export interface Refused {
  readonly outcome: 'refused';
  readonly errors: readonly { readonly key: string; readonly message: string }[];
}

/** What a learner sends, by part: text as typed, ids of options, or a setting. */
export interface LearnersResponse {
  readonly answers: Readonly<
    Record<string, string | readonly string[] | Readonly<Record<string, number | string>>>
  >;
}

/** The answer to one part. */
export type Answer = LearnersResponse['answers'][string];
