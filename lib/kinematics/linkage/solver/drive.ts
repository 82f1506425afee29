import { givenAt } from '@/lib/numeric/at';
import { requireMeasure } from '@/lib/numeric/moderate';
import type { Angle, Reach } from '@/lib/kinematics/linkage/solver/linkage';
import type { Model } from '@/lib/kinematics/linkage/solver/model';
import type { Plan } from '@/lib/kinematics/linkage/solver/plan';
import { reachOf } from '@/lib/kinematics/linkage/solver/progress';

/** The relations of the drivers, without points that are led. */
export function driversOf(model: Model): readonly (Angle | Reach)[] {
  const angles = new Map<number, Angle>();
  for (const { driven } of model.bodies) {
    if (driven) {
      angles.set(driven.drive, {
        kind: 'angle',
        a: driven.from,
        b: driven.to,
        shift: 0,
        drive: driven.drive,
      });
    }
  }
  const reaches = [...model.runs].map(([slide, drive]) => reachOf(slide, drive));
  return [...angles.values(), ...reaches];
}

/** The drive as it reads in a pose: directions, ways along grooves, places of led points. */
export function driveOf(model: Model, pose: ArrayLike<number>): Float64Array {
  const drive = new Float64Array(model.driveLength);
  const way = (from: number, to: number) => ({
    x: givenAt(pose, 2 * to) - givenAt(pose, 2 * from),
    y: givenAt(pose, 2 * to + 1) - givenAt(pose, 2 * from + 1),
  });
  for (const relation of driversOf(model)) {
    if (relation.kind === 'angle') {
      const { x, y } = way(relation.a, relation.b);
      drive[relation.drive] = Math.atan2(y, x);
    } else {
      const along = way(relation.from, relation.to);
      const reached = way(relation.through, relation.p);
      const long = Math.hypot(along.x, along.y);
      drive[relation.drive] = long > 0 ? (along.x * reached.x + along.y * reached.y) / long : 0;
    }
  }
  for (const { point, drive: place } of model.leads) {
    drive[place] = givenAt(pose, 2 * point);
    drive[place + 1] = givenAt(pose, 2 * point + 1);
  }
  return drive;
}

/** Refuses a drive of another length than the drivers ask for, and numbers past all measure. */
export function requireDrive(caller: string, { model }: Plan, drive: ArrayLike<number>): void {
  if (drive.length !== model.driveLength) {
    throw new RangeError(
      `${caller}: drive has ${drive.length} numbers; expected ${model.driveLength}`,
    );
  }
  for (let k = 0; k < drive.length; k += 1) {
    if (!(Math.abs(givenAt(drive, k)) <= 1e60)) requireMeasure(caller, 'drive', givenAt(drive, k));
  }
}
