import type { Block, Motion } from '@/lib/kinematics/linkage/solver/block';
import type {
  Angle,
  Distance,
  Reach,
  Relation,
  Rigid,
  SlideRelation,
} from '@/lib/kinematics/linkage/solver/linkage';
import type { Model } from '@/lib/kinematics/linkage/solver/model';

/** What settles one point beside another: the circle of a bar, or a groove. */
export type Locus = Distance | SlideRelation;

/** A point of a body, in a frame of the body's own. */
interface Member {
  readonly p: number;
  readonly x: number;
  readonly y: number;
}

/** How the points of a step are found. Relations and points of the step are in `StepBase`. */
export type Method =
  /** One point on two loci. */
  | { readonly kind: 'meet'; readonly p: number; readonly first: Locus; readonly second: Locus }
  /** One point at the end of a driven bar. */
  | {
      readonly kind: 'turn';
      readonly distance: Distance;
      readonly angle: Angle;
      readonly p: number;
    }
  /** One more point of a body with two known ones. */
  | { readonly kind: 'carry'; readonly rigid: Rigid }
  /** One point run along its groove. */
  | { readonly kind: 'run'; readonly slide: SlideRelation; readonly reach: Reach }
  /** A body about a known pivot, turned until its groove passes through a known point. */
  | {
      readonly kind: 'aim';
      readonly pivot: number;
      readonly target: number;
      /** Distance of the target from the pivot, square to the groove. */
      readonly off: number;
      /** Points of the body from the pivot: `x` square to the groove, `y` against its direction. */
      readonly members: readonly Member[];
      /** One of them that does not lie on the pivot. */
      readonly lead: Member;
    }
  /** A body whose direction is driven, moved until each of two of its points is on a locus. */
  | {
      readonly kind: 'shift';
      readonly p: number;
      readonly q: number;
      readonly first: Locus;
      readonly second: Locus;
      readonly distance: Distance;
      readonly angle: Angle;
    }
  /** Whatever no such order reaches: Newton's iteration. */
  | { readonly kind: 'solve' };

/** A step of a plan: it settles some points by as many equations as they have coordinates. */
export interface Step {
  readonly method: Method;
  readonly points: readonly number[];
  readonly relations: readonly Relation[];
  readonly block: Block;
}

/**
 * The order in which the points of a linkage are found, worked out once. Its arrays are working
 * space: a plan is used by one caller at a time.
 */
export interface Plan {
  readonly model: Model;
  readonly steps: readonly Step[];
  /** Relations that no step needed: they must come out by themselves, or it does not close. */
  readonly checks: readonly Relation[];
  readonly checkBlock: Block;
  readonly scratch: Float64Array;
  /** Where the points would go if they kept their way. */
  readonly expected: Float64Array;
  /** How the assembly of each step is chosen; set before each use. */
  readonly choice: { branch: Int8Array; expected: Float64Array | undefined };
  /** For errors of position; its pose and drive are set before each use. */
  readonly motion: {
    pose: Float64Array;
    drive: ArrayLike<number>;
  } & Pick<Motion, 'velocity' | 'acceleration' | 'speeds' | 'accelerations'>;
}
