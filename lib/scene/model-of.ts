import type { BenchModel } from './bench-model';
import type { BenchSpec } from './bench-spec';
import { pantographModel } from './pantograph-model';
import { trainModel } from './train-model';
import { trammelModel } from './trammel-model';

/** The mechanism that a spec describes, ready to be driven and drawn. */
export function modelOf(spec: BenchSpec): BenchModel {
  switch (spec.bench) {
    case 'train':
      return trainModel(spec);
    case 'trammel':
      return trammelModel(spec);
    case 'pantograph':
      return pantographModel(spec);
  }
}
