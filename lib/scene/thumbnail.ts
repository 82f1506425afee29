import type { BenchSpec, TrainSpec } from './bench-spec';
import { modelOf } from './model-of';
import { toSvg } from './to-svg';

/**
 * A bench as a small picture beside words that say what it is: no dimensions, which could not be
 * read, and nothing for screen readers. A train leaves its unrolled rims out as well; the trammel
 * and the pantograph draw what they have drawn since `from`.
 *
 * @param drive where the driver stands, radians or mm; its start when left out
 * @example thumbnail(spec) // '<svg … aria-hidden="true" …>'
 */
export function thumbnail(spec: BenchSpec, drive?: number): string {
  return thumbnailAt(spec)(drive);
}

/** The same for any place of the drive: worked out once, to be asked for many times a second. */
export function thumbnailAt(spec: BenchSpec): (drive?: number) => string {
  const model = modelOf(spec.bench === 'train' ? withoutRims(spec) : spec);
  const from = model.admit(spec.drive ?? model.drive.start);
  const showing = { tracing: true, dimensions: false };
  return (drive) => {
    const to = model.admit(drive ?? from);
    const swept = { from: Math.min(from, to), to: Math.max(from, to) };
    return toSvg(model.scene({ drive: to, swept }, showing));
  };
}

/** A train whose picture keeps no room for its rims. */
function withoutRims(spec: TrainSpec): TrainSpec {
  return { ...spec, hide: [...(spec.hide ?? []), 'teeth'] };
}
