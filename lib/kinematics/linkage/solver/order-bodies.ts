import { itemAt } from '@/lib/numeric/item-at';
import { coincide, distanceOf, localOf, rigidOf } from '@/lib/kinematics/linkage/solver/body';
import { angleOf, lociOf, type Progress } from '@/lib/kinematics/linkage/solver/progress';

/** A body about a known pivot, whose own groove must pass through a known point. */
export function aim({ model, placed, joined, done, usedSlides, steps }: Progress): boolean {
  for (const body of model.bodies) {
    const pivot = body.points.find((p) => placed.has(p));
    const slide = model.slides.find(
      ({ p, through, from, to }) =>
        placed.has(p) && !body.shape.has(p) && [through, from, to].every((q) => body.shape.has(q)),
    );
    if (done.has(body) || pivot === undefined || !slide || usedSlides.has(slide)) continue;
    const [from, to] = [localOf(body.shape, slide.from), localOf(body.shape, slide.to)];
    const long = Math.hypot(to.x - from.x, to.y - from.y);
    const [ux, uy] = [(to.x - from.x) / long, (to.y - from.y) / long];
    const seen = (q: number) => {
      const [point, centre] = [localOf(body.shape, q), localOf(body.shape, pivot)];
      const [x, y] = [point.x - centre.x, point.y - centre.y];
      return { x: y * ux - x * uy, y: -(x * ux + y * uy) };
    };
    const points = body.points.filter((q) => q !== pivot);
    const end = itemAt(body.pair, coincide(body.shape, pivot, body.pair[0]) ? 1 : 0);
    const rest = points.filter((q) => q !== end);
    const relations = [
      distanceOf(body.shape, pivot, end),
      ...rest.map((q) => rigidOf(body.shape, q, pivot, end)),
      slide,
    ];
    const off = slide.offset + seen(slide.through).x;
    const members = points.map((q) => ({ p: q, ...seen(q) }));
    steps.push({
      method: { kind: 'aim', pivot, target: slide.p, off, members, lead: { p: end, ...seen(end) } },
      points,
      relations,
    });
    for (const q of points) placed.add(q);
    joined.add(body);
    done.add(body);
    usedSlides.add(slide);
    return true;
  }
  return false;
}

/** A driven body, two points of which have a locus each. */
export function shift(progress: Progress): boolean {
  const { model, placed, joined, done, turned, steps } = progress;
  for (const body of model.bodies) {
    if (done.has(body) || !body.driven || body.points.some((p) => placed.has(p))) continue;
    const held = body.points.flatMap((p) =>
      lociOf(progress, p)
        .slice(0, 1)
        .map((found) => ({ p, ...found })),
    );
    const one = held[0];
    const two = held.find(({ p }) => one && !coincide(body.shape, one.p, p));
    if (!one || !two) continue;
    const distance = distanceOf(body.shape, one.p, two.p);
    const angle = angleOf(body, body.driven, one.p, two.p);
    steps.push({
      method: {
        kind: 'shift',
        p: one.p,
        q: two.p,
        first: one.locus,
        second: two.locus,
        distance,
        angle,
      },
      points: [one.p, two.p],
      relations: [one.locus, two.locus, distance, angle],
    });
    for (const { p, mark } of [one, two]) {
      placed.add(p);
      mark();
    }
    joined.add(body);
    turned.add(body);
    return true;
  }
  return false;
}
