/** A scale as the shop says it: copy to drawing, in whole numbers. */
export type Scale = readonly [copy: number, drawing: number];

/** A scale as a number. */
export function scaleValue([copy, drawing]: Scale): number {
  return copy / drawing;
}

/** A scale as it is said: `3 : 2`. */
export function scaleSaid(copy: number, drawing: number): string {
  return `${copy} : ${drawing}`;
}

/** Whether a length lies on a row of holes `step` apart. */
export function onAHole(length: number, step: number): boolean {
  return Math.abs(length / step - Math.round(length / step)) < 1e-6;
}
