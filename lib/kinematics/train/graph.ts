import { add, divide, fraction, isZero, multiply, subtract } from '@/lib/numeric/fraction';
import type { Fraction } from '@/lib/numeric/fraction';
import { itemAt } from '@/lib/numeric/item-at';
import { requireCount } from '@/lib/numeric/require';

/** Two wheels in mesh, each named by the body that it is fast on. */
export interface TrainMesh {
  readonly first: string;
  readonly firstTeeth: number;
  readonly second: string;
  readonly secondTeeth: number;
  /** The arm that carries the mesh round; a mesh without one stands in the frame. */
  readonly carrier?: string;
  /**
   * `against`: outside mesh, the senses differ (the usual). `with`: a ring and a pinion inside it,
   * a belt, or an odd number of idlers left out.
   */
  readonly sense?: 'against' | 'with';
}

/**
 * A train as data. A body is whatever turns as one: an arbor with all that is fast on it, a loose
 * wheel, an arm. Bodies are named; naming one in a mesh is enough to have it.
 */
export interface Train {
  readonly meshes: readonly TrainMesh[];
  /** Bodies that stand still. */
  readonly held?: readonly string[];
  /** Bodies that are turned from outside. */
  readonly driven: readonly string[];
  /** Further bodies, such as a loose wheel that nothing meshes with. */
  readonly loose?: readonly string[];
}

/** Turns of one body for one turn of each driven body, as exact fractions in the drives' order. */
export type Shares = readonly Fraction[];

/** What the meshes, taken as one linear system, say about the bodies. */
export interface TrainAnalysis {
  readonly bodies: readonly string[];
  /** For every body whose turning the drives settle. */
  readonly shares: ReadonlyMap<string, Shares>;
  /** Bodies that the drives leave free. */
  readonly free: readonly string[];
  /** How many further drives they would need. */
  readonly freedom: number;
  /** Each is a sum over the drives that the train forces to nought: a train that locks has one. */
  readonly demands: readonly Shares[];
}

interface Row {
  readonly cells: readonly Fraction[];
  readonly drives: readonly Fraction[];
}

const nought = fraction(0);
const one = fraction(1);

/**
 * What a train does with its drives, exactly: simple, compound, reverted and epicyclic trains,
 * differentials and paradoxes are all the same sum z₁(n₁ − c) ± z₂(n₂ − c) = 0 over the meshes.
 *
 * All turns are absolute, counter-clockwise positive (any one sense, kept throughout).
 *
 * @throws RangeError for tooth counts that are not whole, and for a body that meshes with itself.
 * Source: Willis's equation for each mesh; the elimination is over exact fractions, so that locking
 * and freedom are questions of nought or not, without a tolerance.
 * @example analyseTrain({ meshes: [{ first: 'crank', firstTeeth: 12, second: 'lantern', secondTeeth: 36 }], driven: ['crank'] }).freedom // → 0
 */
export function analyseTrain(train: Train): TrainAnalysis {
  const bodies = bodiesOf(train);
  const reduced = reduce(rowsOf(train, bodies), bodies.length);
  const shares = new Map<string, Shares>();
  const free: string[] = [];
  bodies.forEach((body, column) => {
    const row = reduced.find(
      ({ cells }) => !isZero(itemAt(cells, column)) && settles(cells, column),
    );
    if (row) shares.set(body, row.drives);
    else free.push(body);
  });
  const pivots = reduced.filter(({ cells }) => cells.some((cell) => !isZero(cell)));
  return {
    bodies,
    shares,
    free,
    freedom: bodies.length - pivots.length,
    demands: reduced
      .filter(({ cells, drives }) => cells.every(isZero) && !drives.every(isZero))
      .map(({ drives }) => drives),
  };
}

/** Whether a row has its one cell in `column`, so that it says what that body does. */
function settles(cells: readonly Fraction[], column: number): boolean {
  return cells.every((cell, index) => index === column || isZero(cell));
}

function bodiesOf(train: Train): readonly string[] {
  const named = train.meshes.flatMap(({ first, second, carrier }) =>
    carrier === undefined ? [first, second] : [first, second, carrier],
  );
  return [...new Set([...train.driven, ...(train.held ?? []), ...named, ...(train.loose ?? [])])];
}

function rowsOf(train: Train, bodies: readonly string[]): readonly Row[] {
  const still = train.driven.map(() => nought);
  const row = (terms: readonly (readonly [string, Fraction])[], drives: Shares): Row => ({
    cells: bodies.map((body) =>
      terms.reduce((sum, [name, term]) => (name === body ? add(sum, term) : sum), nought),
    ),
    drives,
  });
  return [
    ...train.meshes.map((mesh) => row(meshTerms(mesh), still)),
    ...(train.held ?? []).map((body) => row([[body, one]], still)),
    ...train.driven.map((body, drive) =>
      row(
        [[body, one]],
        still.map((_, index) => (index === drive ? one : nought)),
      ),
    ),
  ];
}

function meshTerms(mesh: TrainMesh): readonly (readonly [string, Fraction])[] {
  if (mesh.first === mesh.second) {
    throw new RangeError(
      `analyseTrain: first and second are both ${mesh.first}; expected two bodies`,
    );
  }
  const first = fraction(requireCount('analyseTrain', 'firstTeeth', mesh.firstTeeth));
  const size = fraction(requireCount('analyseTrain', 'secondTeeth', mesh.secondTeeth));
  const second = mesh.sense === 'with' ? subtract(nought, size) : size;
  const terms: readonly (readonly [string, Fraction])[] = [
    [mesh.first, first],
    [mesh.second, second],
  ];
  if (mesh.carrier === undefined) return terms;
  return [...terms, [mesh.carrier, subtract(nought, add(first, second))]];
}

/** Gauss and Jordan's elimination: every pivot 1, alone in its column. */
function reduce(rows: readonly Row[], columns: number): readonly Row[] {
  const work = [...rows];
  let done = 0;
  for (let column = 0; column < columns; column += 1) {
    const found = work.findIndex(
      ({ cells }, index) => index >= done && !isZero(itemAt(cells, column)),
    );
    if (found < 0) continue;
    const pivotRow = itemAt(work, found);
    work[found] = itemAt(work, done);
    const pivot = scaled(pivotRow, divide(one, itemAt(pivotRow.cells, column)));
    work.forEach((row, index) => {
      const factor = itemAt(row.cells, column);
      if (index !== done && !isZero(factor)) work[index] = less(row, scaled(pivot, factor));
    });
    work[done] = pivot;
    done += 1;
  }
  return work;
}

function scaled(row: Row, factor: Fraction): Row {
  return {
    cells: row.cells.map((cell) => multiply(cell, factor)),
    drives: row.drives.map((cell) => multiply(cell, factor)),
  };
}

function less(row: Row, other: Row): Row {
  return {
    cells: row.cells.map((cell, index) => subtract(cell, itemAt(other.cells, index))),
    drives: row.drives.map((cell, index) => subtract(cell, itemAt(other.drives, index))),
  };
}
