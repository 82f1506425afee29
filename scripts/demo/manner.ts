/** How somebody goes about learning: how often they come, and how it goes when they do. */
export type Manner = 'quick' | 'steady' | 'unsure' | 'guessing' | 'seldom' | 'new';

interface Habits {
  /** How many days lie between two visits, at least and at most. */
  readonly gap: readonly [number, number];
  /** How many exercises a visit has room for. */
  readonly exercises: readonly [number, number];
  /** In a hundred: right at the first try; it grows with every round of the same exercise. */
  readonly right: number;
  /** In a hundred: takes a hint before trying again. */
  readonly hint: number;
  /** In a hundred: asks for the worked solution after two wrong tries. */
  readonly solution: number;
  /** In a hundred: leaves an exercise open after a wrong try. */
  readonly leaves: number;
}

/** What belongs to each manner; believable, and invented. */
export const habits: Readonly<Record<Manner, Habits>> = {
  quick: { gap: [2, 4], exercises: [4, 7], right: 88, hint: 5, solution: 0, leaves: 3 },
  steady: { gap: [3, 6], exercises: [3, 5], right: 66, hint: 25, solution: 10, leaves: 8 },
  unsure: { gap: [3, 7], exercises: [2, 4], right: 42, hint: 65, solution: 35, leaves: 15 },
  guessing: { gap: [4, 8], exercises: [3, 6], right: 30, hint: 10, solution: 20, leaves: 35 },
  seldom: { gap: [10, 18], exercises: [2, 3], right: 55, hint: 30, solution: 15, leaves: 20 },
  new: { gap: [90, 99], exercises: [1, 1], right: 50, hint: 20, solution: 10, leaves: 20 },
};
