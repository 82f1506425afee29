/** How much a wood moves across the grain, as a part of its width for each per cent of moisture. */
export interface MovementCoefficients {
  /** Square to the rings: the width of a quarter-sawn board. */
  readonly radial: number;
  /** Along the rings: the width of a flat-sawn board. */
  readonly tangential: number;
}

/** The woods whose movement the house teaches with. */
export type Species =
  | 'American beech'
  | 'yellow birch'
  | 'sugar maple'
  | 'black cherry'
  | 'white oak'
  | 'red oak'
  | 'white ash'
  | 'American basswood';

/**
 * Dimensional change coefficients for 6 to 14 per cent of moisture.
 *
 * @see Wood Handbook: Wood as an Engineering Material, USDA FPL-GTR-190 (2010), Table 13-5.
 */
export const movementCoefficients: Readonly<Record<Species, MovementCoefficients>> = {
  'American beech': { radial: 0.0019, tangential: 0.00431 },
  'yellow birch': { radial: 0.00256, tangential: 0.00338 },
  'sugar maple': { radial: 0.00165, tangential: 0.00353 },
  'black cherry': { radial: 0.00126, tangential: 0.00248 },
  'white oak': { radial: 0.0018, tangential: 0.00365 },
  'red oak': { radial: 0.00158, tangential: 0.00369 },
  'white ash': { radial: 0.00169, tangential: 0.00274 },
  'American basswood': { radial: 0.0023, tangential: 0.0033 },
};
