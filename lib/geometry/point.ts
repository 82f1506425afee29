/** A point or a vector of the plane: x to the right, y up, any one unit of length. */
export interface Point {
  readonly x: number;
  readonly y: number;
}
