import type { BenchModel } from './bench-model';
import type { BenchSpec } from './bench-spec';
import { trainModel } from './train-model';

/** The mechanism that a spec describes, ready to be driven and drawn. */
export function modelOf(spec: BenchSpec): BenchModel {
  switch (spec.bench) {
    case 'train':
      return trainModel(spec);
    default:
      throw new RangeError(`modelOf: bench is ${spec.bench}; expected one that is built`);
  }
}
