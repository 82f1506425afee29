import type { Label, MarkName, Role } from './scene';

/** The colour tokens a drawing uses; each is a CSS variable of the same name. */
export type Token =
  | 'paper'
  | 'board'
  | 'rule'
  | 'ink'
  | 'pencil'
  | 'chalk'
  | 'brass'
  | 'brass-fill'
  | 'timber'
  | 'madder';

/** How a stroke or a face is painted; widths and dashes in pixels of the page. */
export interface Paint {
  readonly fill?: Token;
  /** Opacity of the face alone; 1 when left out. */
  readonly fillOpacity?: number;
  readonly stroke?: Token;
  readonly width: number;
  readonly dash?: readonly number[];
}

const longDashDot = [14, 3, 2, 3];
const dashes = [5, 4];

/** One look for every output: canvas, page, paper and thumbnail. */
export const appearance: Readonly<Record<Role, Paint>> = {
  timber: { fill: 'timber', stroke: 'ink', width: 1.5 },
  driver: { fill: 'brass-fill', stroke: 'brass', width: 1.5 },
  opening: { fill: 'paper', stroke: 'ink', width: 1.5 },
  hole: { fill: 'paper', stroke: 'pencil', width: 0.75 },
  void: { fill: 'board', stroke: 'rule', width: 1 },
  outline: { stroke: 'ink', width: 1.5 },
  hidden: { stroke: 'ink', width: 1, dash: dashes },
  centre: { stroke: 'pencil', width: 1, dash: longDashDot },
  pitch: { stroke: 'pencil', width: 0.75, dash: longDashDot },
  dimension: { stroke: 'pencil', width: 1 },
  grain: { stroke: 'brass', width: 1 },
  tracing: { stroke: 'chalk', width: 2.5 },
  guide: { stroke: 'chalk', width: 1.25, dash: dashes },
  thread: { stroke: 'chalk', width: 1 },
  arrow: { stroke: 'ink', width: 1.5 },
  limit: { stroke: 'madder', width: 2 },
  clash: { fill: 'madder', fillOpacity: 0.18, stroke: 'madder', width: 1.5 },
};

/** One stroke of a symbol, in pixels about its point, y up, before it is turned. */
export type SymbolStroke = Paint &
  (
    | { readonly points: readonly number[]; readonly closed: boolean }
    | { readonly circle: readonly [x: number, y: number, radius: number] }
  );

const inkLine = { stroke: 'ink', width: 1.25, closed: false } as const;
const crossOf = (r: number): SymbolStroke[] => [
  { ...inkLine, width: 1, points: [-r, 0, r, 0] },
  { ...inkLine, width: 1, points: [0, -r, 0, r] },
];
const hatching: SymbolStroke[] = [-9, -4, 1, 6].map((x) => ({
  ...inkLine,
  width: 1,
  points: [x + 3, -12, x - 1, -17],
}));

/** The symbols that keep their size on the page: pivots after ISO 3952, pen, stylus, handle. */
export const symbols: Readonly<Record<MarkName, readonly SymbolStroke[]>> = {
  'fixed-pivot': [
    { ...inkLine, fill: 'paper', points: [0, 0, 8, -12, -8, -12], closed: true },
    { ...inkLine, points: [-11, -12, 11, -12] },
    ...hatching,
    { circle: [0, 0, 4.5], fill: 'paper', stroke: 'ink', width: 1.5 },
    { circle: [0, 0, 1], fill: 'ink', width: 0 },
  ],
  'moving-pivot': [{ circle: [0, 0, 5], fill: 'paper', stroke: 'ink', width: 1.5 }, ...crossOf(3)],
  'centre-mark': crossOf(6),
  arrowhead: [{ points: [-9, 3, 0, 0, -9, -3], closed: false, stroke: 'pencil', width: 1 }],
  'grain-arrow': [{ points: [-9, 4, 0, 0, -9, -4], closed: false, stroke: 'brass', width: 1 }],
  sense: [{ points: [-6, 4, 3, 0, -6, -4], closed: true, fill: 'ink', width: 0 }],
  pen: [
    { circle: [0, 0, 6.5], fill: 'chalk', stroke: 'paper', width: 2 },
    { circle: [0, 0, 7.5], stroke: 'ink', width: 1 },
  ],
  stylus: [
    { circle: [0, 0, 7], fill: 'brass-fill', stroke: 'brass', width: 1.75 },
    { circle: [0, 0, 1.5], fill: 'brass', width: 0 },
  ],
  dot: [{ circle: [0, 0, 4], fill: 'chalk', stroke: 'paper', width: 1 }],
  handle: [
    { circle: [0, 0, 9], fill: 'brass-fill', stroke: 'brass', width: 1.75 },
    { points: [-3.5, -2.5, -3.5, 2.5], closed: false, stroke: 'brass', width: 1.25 },
    { points: [0, -3.5, 0, 3.5], closed: false, stroke: 'brass', width: 1.25 },
    { points: [3.5, -2.5, 3.5, 2.5], closed: false, stroke: 'brass', width: 1.25 },
  ],
};

/** Size of every letter and figure on a drawing, pixels of the page. */
export const labelSize = 13;

/** The CSS family of a label's face. */
export function labelFamily(face: Label['face']): string {
  return face === 'figure'
    ? 'var(--font-mono), ui-monospace, monospace'
    : 'var(--font-text), system-ui, sans-serif';
}

/** How strongly something of this age, from 0 to 1, is still seen. */
export function strength(age: number): number {
  return 1 - 0.75 * age;
}
