import type { Point } from '@/lib/geometry/point';

/**
 * What a bench is set to: plain data that travels as JSON from a lesson or a round to the drawing.
 * Lengths in mm, angles in radians counter-clockwise, teeth and idlers as counts; x right, y up.
 */
export type BenchSpec = TrainSpec | TrammelSpec | PantographSpec;

/** The benches there are. */
export type BenchName = BenchSpec['bench'];

/** What every bench takes besides its mechanism. */
export interface BenchSettings {
  /** Where the drive starts: an angle in radians, or for the pantograph a length in mm. */
  readonly drive?: number;
  /**
   * Keys of the readouts that are kept from the learner, in strip, words, tables and plot. Train:
   * `turns`, `ratio`, `sense`, `teeth`, `centres`; trammel: `length`, `width`, `pen`; pantograph:
   * `scale`, `copy`, `line`. `oval` and `path` also take the drawn oval and copy away.
   */
  readonly hide?: readonly string[];
  /** Keys of the settings the learner may change; all of them when left out, none when empty. */
  readonly controls?: readonly string[];
  /** The units of every figure on the bench; metric when left out. */
  readonly units?: 'metric' | 'inch';
}

/** One toothed wheel. */
export interface Wheel {
  readonly teeth: number;
}

/** An arbor with one wheel, or with two: the first takes the motion, the last hands it on. */
export interface Arbor extends Point {
  readonly wheels: readonly Wheel[];
  /** Whether two wheels turn as one; a loose pair hands nothing on. */
  readonly fast: boolean;
}

/** A train whose arbors stand where they were put. Each meshes with the next, in the order given. */
export interface FreeTrainSpec extends BenchSettings {
  readonly bench: 'train';
  readonly layout: 'free';
  readonly module: number;
  readonly arbors: readonly Arbor[];
  /** Index of the arbor that carries the crank. */
  readonly crank: number;
}

/** A train in line between two posts that are already glued. */
export interface PostsTrainSpec extends BenchSettings {
  readonly bench: 'train';
  readonly layout: 'between-posts';
  readonly module: number;
  readonly posts: { readonly distance: number; readonly firstTeeth: number };
  readonly lastTeeth: number;
  readonly idlers: number;
  readonly idlerTeeth: number;
}

export type TrainSpec = FreeTrainSpec | PostsTrainSpec;

/** The groove the far pin runs in; the near pin runs in the other. */
export type Groove = 'north-south' | 'east-west';

/** A bar with a pen and two pins, each pin in a slider, each slider in a groove of the board. */
export interface TrammelSpec extends BenchSettings {
  readonly bench: 'trammel';
  /** From the pen to the far pin, mm. */
  readonly farPin: number;
  /** From the pen to the near pin, mm; negative on the other side of the pen. */
  readonly nearPin: number;
  readonly farRunsIn: Groove;
  /** Length of each slider, mm; its width is a third of it. */
  readonly slider: number;
  /** Length of each groove, mm, its middle on the crossing. */
  readonly groove: number;
  /** How far the grooves are out of square, radians. */
  readonly skew: number;
  readonly held: 'board' | 'bar';
  /** The oval asked for, mm across east-west and north-south, drawn dashed. */
  readonly wanted?: { readonly length: number; readonly width: number };
  /** Dots chalked on the board, mm from the crossing. */
  readonly dots?: readonly (Point & { readonly label: string })[];
}

/** Which of the three points in line is fixed, which one the hand leads, which one draws. */
export type PantographSetUp =
  'middle-to-end' | 'end-to-middle' | 'across-the-middle' | 'across-the-middle-from-the-end';

export type DrawingName = 'circle' | 'square' | 'herring' | 'sign';

/** What the stylus follows. */
export interface DrawingToFollow {
  readonly name: DrawingName;
  /** How high it is, mm. */
  readonly height: number;
  /** Its middle as seen from the fixed point, mm; within easy reach when left out. */
  readonly at?: Point;
}

/**
 * Four bars and five pins. O is the outer end of the first long bar, C the elbow, P the outer end
 * of the second, M the corner of the parallelogram between them.
 */
export interface PantographSpec extends BenchSettings {
  readonly bench: 'pantograph';
  /** The first long bar, O to C, mm. */
  readonly first: number;
  /** The second long bar, C to P, mm. */
  readonly second: number;
  /** From O to the hole on the first bar, mm. */
  readonly firstHole: number;
  /** From C to the hole on the second bar, mm. */
  readonly secondHole: number;
  /** Distance between holes, mm. */
  readonly holeStep: number;
  readonly setUp: PantographSetUp;
  readonly drawing: DrawingToFollow;
  /** How far the fixed pin has been moved on the board, mm; not at all when left out. */
  readonly pinMoved?: Point;
  /** The angle at the elbow within which it works, radians. */
  readonly elbow: readonly [number, number];
  /** How much the short bars differ from closing the parallelogram, mm; nothing when left out. */
  readonly shortBars?: { readonly stylus: number; readonly other: number };
}

/** What the learner has set, by the key of each control: mm, counts, or a word. */
export type SettingValues = Readonly<Record<string, number | string>>;
