import type { Point } from '@/lib/geometry/point';

/**
 * A planar linkage as data: named points, what holds them together, and what drives them.
 *
 * Frame: x right, y up, any one unit of length, radians counter-clockwise. `points` holds every
 * point in a pose in which the linkage closes, or nearly so: fixed points stay there, and the way
 * the others lie says which of its assemblies is meant.
 */
export interface Linkage {
  readonly points: Readonly<Record<string, Point>>;
  /** Names of the points that are pinned to the board. */
  readonly fixed: readonly string[];
  readonly bars?: readonly Bar[];
  readonly plates?: readonly Plate[];
  readonly slides?: readonly Slide[];
  readonly drivers: readonly Driver[];
}

/** Two points that keep their distance. */
export interface Bar {
  readonly ends: readonly [string, string];
  readonly length: number;
}

/** Two or more points of one rigid body, in a frame of the body's own; it is never turned over. */
export interface Plate {
  readonly shape: Readonly<Record<string, Point>>;
}

/**
 * A point that keeps to a straight groove. The groove is parallel to the way between two points,
 * fixed or moving, `offset` to the left of it, and passes through `through` (the first of the two
 * if left out).
 */
export interface Slide {
  readonly point: string;
  readonly along: readonly [string, string];
  readonly through?: string;
  readonly offset?: number;
}

/** What moves the linkage. Each takes one number of the drive, in order; `lead` takes two. */
export type Driver =
  /** The direction from one point of a rigid body to another, radians from +x. */
  | { readonly kind: 'angle'; readonly from: string; readonly to: string }
  /** How far a sliding point stands along its groove from the point that the groove passes. */
  | { readonly kind: 'slide'; readonly point: string }
  /** A point led along x and y. */
  | { readonly kind: 'lead'; readonly point: string };

/** Two points keep their distance. */
export interface Distance {
  readonly kind: 'distance';
  readonly p: number;
  readonly q: number;
  readonly length: number;
}

/** A point keeps its place in a body, told by two points of it. */
export interface Rigid {
  readonly kind: 'rigid';
  readonly p: number;
  readonly a: number;
  readonly b: number;
  /** Shares of the way from a to b, along it and square to its left. */
  readonly along: number;
  readonly across: number;
}

/** A point keeps to a groove. */
export interface SlideRelation {
  readonly kind: 'slide';
  readonly p: number;
  readonly through: number;
  readonly from: number;
  readonly to: number;
  readonly offset: number;
}

/** A driven direction; `drive` is the place of the driver's number in the drive. */
export interface Angle {
  readonly kind: 'angle';
  readonly a: number;
  readonly b: number;
  /** The way from a to b is turned so much from the driven direction. */
  readonly shift: number;
  readonly drive: number;
}

/** A driven place along a groove. */
export interface Reach {
  readonly kind: 'reach';
  readonly p: number;
  readonly through: number;
  readonly from: number;
  readonly to: number;
  readonly drive: number;
}

/** What holds points, by their numbers: one equation each, `rigid` two. */
export type Relation = Distance | Rigid | SlideRelation | Angle | Reach;

/** How many equations a relation stands for. */
export function equationsOf(relations: readonly Relation[]): number {
  return relations.reduce((sum, { kind }) => sum + (kind === 'rigid' ? 2 : 1), 0);
}
