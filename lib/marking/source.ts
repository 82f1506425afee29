import { uniformInt } from 'pure-rand/distribution/uniformInt';
import { xoroshiro128plus } from 'pure-rand/generator/xoroshiro128plus';

/** A seeded source of chance: the same seed gives the same row of draws, on any machine. */
export interface Source {
  /** A whole number from `least` to `most`, both included. */
  whole(least: number, most: number): number;
  /** One of `least`, `least + step`, … up to `most`. */
  step(least: number, most: number, step: number): number;
  /** One of the values. */
  pick<T>(values: readonly T[]): T;
  /** The values in another order. */
  shuffle<T>(values: readonly T[]): T[];
  /** A random name of eight letters and figures, for an option. */
  name(): string;
}

const letters = 'abcdefghjkmnpqrstuvwxyz23456789';

/**
 * The source that `seed`, a 32-bit whole number, stands for.
 * @example createSource(7).whole(1, 6) === createSource(7).whole(1, 6) // true
 */
export function createSource(seed: number): Source {
  const generator = xoroshiro128plus(seed | 0);
  // The first values of neighbouring seeds resemble one another; these are let go by.
  for (let warming = 0; warming < 16; warming += 1) generator.next();
  const whole = (least: number, most: number) => uniformInt(generator, least, most);
  return {
    whole,
    step: (least, most, step) => least + step * whole(0, Math.round((most - least) / step)),
    pick: (values) => {
      const [value] = values.slice(whole(0, values.length - 1));
      if (value === undefined) throw new RangeError('pick: there is nothing to pick from');
      return value;
    },
    shuffle: (values) => {
      const rest = [...values];
      const order = [];
      while (rest.length > 0) order.push(...rest.splice(whole(0, rest.length - 1), 1));
      return order;
    },
    name: () =>
      Array.from({ length: 8 }, () => letters.charAt(whole(0, letters.length - 1))).join(''),
  };
}
