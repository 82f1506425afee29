/** A closed round as far as one skill goes. */
export interface ClosedRound {
  /** When it was closed, ISO 8601. */
  readonly closedAt: string;
  /** Whether all the parts that show the skill were right when it closed. */
  readonly right: boolean;
  /** Whether neither the third hint nor the worked solution was asked for. */
  readonly unaided: boolean;
  /** How many attempts it took; one when left out. */
  readonly attempts?: number;
}

/** The four states in which a peg is drawn. */
export type PegState = 'open' | 'started' | 'home' | 'lifting';

/** How a skill's peg stands, with a sentence on why. */
export interface Peg {
  readonly state: PegState;
  readonly detail: string;
}

/** What a peg's state follows from. */
export interface PegFacts {
  /** Every closed round that shows the skill, in any order. */
  readonly rounds: readonly ClosedRound[];
  /** When the skill is due again, ISO 8601, or `null` while nothing brings it back. */
  readonly due: string | null;
  /** The moment at which the question is asked, ISO 8601. */
  readonly now: string;
  /** The person's time zone, by its IANA name: it settles on which dates rounds were closed. */
  readonly timeZone: string;
}

const roundsLookedAt = 4;
const rightWanted = 3;
const datesWanted = 2;

/** The rule as learners read it. */
export const pegRule =
  'A peg goes home when three of your last four rounds for its skill were right without the third hint or the worked solution, on at least two different days. It lifts again when it is time to try whether it still holds.';

/**
 * How a peg stands: open before the first closed round; home when three of the last four closed
 * rounds were right unaided, on two dates at least in the person's time zone; lifting when it is
 * home and due again; started otherwise.
 * Throws a `RangeError` for a time or a time zone that does not exist.
 */
export function pegOf({ rounds, due, now, timeZone }: PegFacts): Peg {
  const last = latest(rounds);
  const good = last.filter(({ right, unaided }) => right && unaided);
  const dates = new Set(good.map(({ closedAt }) => dateOf(closedAt, timeZone)));
  return pegFromCounts({ looked: last.length, good: good.length, dates: dates.size, due, now });
}

/** What a peg's state follows from, once the last four closed rounds have been counted. */
export interface PegCounts {
  /** How many closed rounds there are, four at most. */
  readonly looked: number;
  /** How many of these were right unaided. */
  readonly good: number;
  /** On how many dates, in the person's time zone, those were closed. */
  readonly dates: number;
  /** When the skill is due again, ISO 8601, or `null` while nothing brings it back. */
  readonly due: string | null;
  /** The moment at which the question is asked, ISO 8601. */
  readonly now: string;
}

/**
 * The same rule for rounds that were counted where they are kept.
 * Throws a `RangeError` for a time that does not exist.
 */
export function pegFromCounts({ looked, good, dates, due, now }: PegCounts): Peg {
  if (looked === 0) return { state: 'open', detail: 'Not begun yet.' };
  if (good < rightWanted || dates < datesWanted) {
    return { state: 'started', detail: whatIsMissing(good, looked, dates) };
  }
  if (due !== null && instant(due) <= instant(now)) {
    return { state: 'lifting', detail: 'Home, and due again: one round shows whether it holds.' };
  }
  return { state: 'home', detail: `Home: ${good} of the last ${looked} right alone.` };
}

/**
 * The calendar date of an instant in a time zone.
 * @example dateOf('2026-03-01T23:30:00Z', 'Europe/Helsinki') // '2026-03-02'
 */
export function dateOf(iso: string, timeZone: string): string {
  const parts = calendarOf(timeZone).formatToParts(instant(iso));
  const part = (type: string) => parts.find((each) => each.type === type)?.value ?? '';
  return `${part('year')}-${part('month')}-${part('day')}`;
}

/** Making one takes a hundred times as long as using it. */
const calendars = new Map<string, Intl.DateTimeFormat>();

function calendarOf(timeZone: string): Intl.DateTimeFormat {
  const known = calendars.get(timeZone);
  if (known !== undefined) return known;
  const made = new Intl.DateTimeFormat('en-GB', {
    timeZone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
  });
  calendars.set(timeZone, made);
  return made;
}

function latest(rounds: readonly ClosedRound[]): readonly ClosedRound[] {
  return [...rounds]
    .sort((one, other) => instant(one.closedAt) - instant(other.closedAt))
    .slice(-roundsLookedAt);
}

function whatIsMissing(good: number, looked: number, dates: number): string {
  if (good >= rightWanted && dates < datesWanted) {
    return `${good} of the last ${looked} right alone, all on one day: one more on another day takes it home.`;
  }
  const wanted = rightWanted - good;
  const more = wanted === 1 ? 'one more' : wanted === 2 ? 'two more' : 'three';
  return `${good} of the last ${looked} right alone: ${more} to go.`;
}

function instant(iso: string): number {
  const time = Date.parse(iso);
  if (Number.isNaN(time)) throw new RangeError(`pegOf: ${iso} is not a time`);
  return time;
}
