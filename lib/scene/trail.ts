import type { Point } from '@/lib/geometry/point';
import type { DriveState } from './bench-model';
import type { Outline } from './scene';
import { outline } from './strokes';

/** The trail is drawn in so many lengths, each fainter than the one after it. */
const lengths = 6;
const pointsInEach = 20;

/**
 * The path that a point has left over the swept stretch of the drive, at most one `round` of it, in
 * chalk that fades with its distance from where the driver stands now. Where `at` gives null the
 * point leaves nothing.
 */
export function trail(
  { drive, swept }: DriveState,
  round: number,
  at: (drive: number) => Point | null,
): readonly Outline[] {
  const behind = Math.min(drive - swept.from, round);
  const ahead = Math.min(swept.to - drive, round - behind);
  return [...oneSide(drive, -behind, round, at), ...oneSide(drive, ahead, round, at)];
}

function oneSide(
  now: number,
  reach: number,
  round: number,
  at: (drive: number) => Point | null,
): Outline[] {
  const shares = Math.ceil((lengths * Math.abs(reach)) / round - 1e-9);
  return Array.from({ length: shares }, (_, i) => {
    const from = (i * reach) / shares;
    const points = Array.from({ length: pointsInEach + 1 }, (_each, j) =>
      at(now + from + (reach * j) / (shares * pointsInEach)),
    ).filter((point) => point !== null);
    return outline('tracing', points, false, i / lengths);
  });
}
