import path from 'node:path';
import { GcsWrapper, init_planegcs_module, type SketchPrimitive } from '@salusoft89/planegcs';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';
import type { NamedPoints } from '@/lib/kinematics/linkage/solver/solver';

/** A geometric constraint solver written by others, as an oracle for positions. */
export async function openOracle(): Promise<GcsWrapper> {
  const wasm = path.resolve('node_modules/@salusoft89/planegcs/dist/planegcs_dist/planegcs.wasm');
  const oracle = await init_planegcs_module({ locateFile: () => wasm });
  return new GcsWrapper(new oracle.GcsSystem());
}

/** Where the oracle puts the points of a linkage, from a guess; undefined if it finds nothing. */
export function oraclePoints(
  oracle: GcsWrapper,
  linkage: Linkage,
  drive: readonly number[],
  guess: NamedPoints,
): NamedPoints | undefined {
  oracle.clear_data();
  const held = new Set(linkage.fixed);
  for (const driver of linkage.drivers) if (driver.kind === 'lead') held.add(driver.point);
  const points: SketchPrimitive[] = Object.entries(guess).map(([id, { x, y }]) => ({
    id,
    type: 'point',
    x,
    y,
    fixed: held.has(id),
  }));
  const lead = linkage.drivers.find(({ kind }) => kind === 'lead');
  const led = points.map((one) =>
    lead?.kind === 'lead' && one.type === 'point' && one.id === lead.point
      ? { ...one, x: drive[0] ?? 0, y: drive[1] ?? 0 }
      : one,
  );
  oracle.push_primitives_and_params([...led, ...conditions(linkage, drive)]);
  oracle.set_convergence_threshold(1e-14);
  oracle.set_max_iterations(400);
  const status = oracle.solve();
  if (status > 1) return undefined;
  oracle.apply_solution();
  return Object.fromEntries(
    oracle.sketch_index
      .get_primitives()
      .flatMap((one) => (one.type === 'point' ? [[one.id, { x: one.x, y: one.y }]] : [])),
  );
}

/** What holds a linkage, as the oracle's constraints; a drive may be the name of a parameter. */
export function conditions(
  linkage: Linkage,
  drive: readonly (number | string)[],
): readonly SketchPrimitive[] {
  const found: SketchPrimitive[] = [];
  const name = () => `condition ${found.length}`;
  const apart = (p: string, q: string, distance: number) =>
    found.push({ id: name(), type: 'p2p_distance', p1_id: p, p2_id: q, distance });
  for (const { ends, length } of linkage.bars ?? []) apart(ends[0], ends[1], length);
  for (const { shape } of linkage.plates ?? []) {
    const [first, second, ...rest] = Object.entries(shape);
    if (!first || !second) continue;
    const [[a, A], [b, B]] = [first, second];
    const long = Math.hypot(B.x - A.x, B.y - A.y);
    apart(a, b, long);
    for (const [p, P] of rest) {
      const area = (B.x - A.x) * (P.y - A.y) - (B.y - A.y) * (P.x - A.x);
      apart(a, p, Math.hypot(P.x - A.x, P.y - A.y));
      if (Math.abs(area) > 1e-6 * long * long) apart(b, p, Math.hypot(P.x - B.x, P.y - B.y));
      else found.push({ id: name(), type: 'point_on_line_ppp', p_id: p, lp1_id: a, lp2_id: b });
    }
  }
  for (const { point, along } of linkage.slides ?? []) {
    found.push({
      id: name(),
      type: 'point_on_line_ppp',
      p_id: point,
      lp1_id: along[0],
      lp2_id: along[1],
    });
  }
  linkage.drivers.forEach((driver, k) => {
    if (driver.kind === 'angle') {
      found.push({
        id: name(),
        type: 'p2p_angle',
        p1_id: driver.from,
        p2_id: driver.to,
        angle: drive[k] ?? 0,
      });
    }
  });
  return found;
}
