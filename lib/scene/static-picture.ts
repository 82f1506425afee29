import type { BenchModel, Readout, Showing } from './bench-model';
import type { BenchSpec } from './bench-spec';
import { modelOf } from './model-of';
import type { Scene } from './scene';
import { toSvg } from './to-svg';

const nothingShown: Showing = { tracing: false, dimensions: false };
const allShown: Showing = { tracing: true, dimensions: true };

/** Every key that a bench can hide: what a locked bench keeps to itself. */
const outcomes = [
  'turns',
  'ratio',
  'sense',
  'teeth',
  'size',
  'oval',
  'path',
  'pen',
  'copy',
  'scale',
  'line',
];

/**
 * A bench as a picture: SVG in the page's own colours, the driver at its start.
 *
 * @param locked leaves out whatever the prediction asks for: no tracing, no copy, no sense of turning
 */
export function staticPicture(spec: BenchSpec, locked = false): string {
  const shown = locked ? lockedSpec(spec) : spec;
  const model = modelOf(shown);
  return toSvg(startScene(model, locked), describe(shown));
}

/** A bench that gives nothing away. */
export function lockedSpec(spec: BenchSpec): BenchSpec {
  return { ...spec, hide: [...(spec.hide ?? []), ...outcomes] };
}

/** The drawing with the driver at its start. */
export function startScene(model: BenchModel, locked: boolean): Scene {
  const drive = model.admit(model.spec.drive ?? model.drive.start);
  return model.scene(
    { drive, swept: { from: drive, to: drive } },
    locked ? nothingShown : allShown,
  );
}

/** The bench in words, with its driver at `drive` or at its start. */
export function describe(spec: BenchSpec, drive?: number): string {
  const model = modelOf(spec);
  return model.describe(model.admit(drive ?? spec.drive ?? model.drive.start));
}

/** The title strip's numbers, with the driver at `drive` or at its start. */
export function readouts(spec: BenchSpec, drive?: number): readonly Readout[] {
  const model = modelOf(spec);
  return model.readouts(model.admit(drive ?? spec.drive ?? model.drive.start));
}
