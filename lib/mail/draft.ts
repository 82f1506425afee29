/** One piece of a letter; text and HTML are both made of the same pieces, so neither lacks any. */
export type Piece =
  /** A paragraph. */
  | { readonly say: string }
  /** What to press, with its address written out in the text. */
  | { readonly press: string; readonly href: string }
  /** A heading over what follows. */
  | { readonly heading: string }
  | { readonly list: readonly string[] }
  /** Names with what belongs to them. */
  | { readonly facts: readonly (readonly [name: string, value: string])[] }
  /** Somebody's own words, line by line as they wrote them. */
  | { readonly quote: string }
  /** Small print. */
  | { readonly aside: string };

/** What a letter says, before it is laid out. */
export interface Draft {
  readonly subject: string;
  readonly pieces: readonly Piece[];
}

/** What is known about the reader and the site when a letter is written. */
export interface LetterContext {
  /** The address of the site, from the configuration, without a final slash. */
  readonly siteAddress: string;
  /** How to greet the reader; null where nothing but an address is known. */
  readonly readerName: string | null;
  /** The reader's own time zone. */
  readonly timeZone: string;
  /** When the cause of the letter came about. */
  readonly writtenAt: Date;
  /** The one-time link, for the kinds that carry one. */
  readonly link: { readonly href: string; readonly goodForMinutes: number } | null;
  /** Where the reader can ask for no more of these; null for what is essential. */
  readonly unsubscribeAddress: string | null;
}

/** A letter, ready to be sent. */
export interface Written {
  readonly subject: string;
  readonly text: string;
  readonly html: string;
}

/**
 * One line without control characters: what stands in a header or a list can begin no line of its
 * own, whatever somebody has called their class.
 */
export function oneLine(text: string): string {
  return text
    .replace(/[\p{Cc}\p{Zl}\p{Zp}\s]+/gu, ' ')
    .replace(/[\u200e\u200f\u202a-\u202e\u2066-\u2069]/g, '')
    .trim();
}
