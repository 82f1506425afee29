import type { UnitSystem } from '@/lib/quantities/unit-system';

interface ValueProps {
  /** The name of the figure. */
  readonly of: string;
  /** The lesson's figures in the reader's units. */
  readonly values: Readonly<Record<string, { readonly text: string }>>;
}

/**
 * A number of a lesson's prose, worked out by the library.
 * @throws RangeError for a name that the lesson's figures do not have, so that no page is served
 * with a hole in its sentence.
 */
export function Value({ of, values }: ValueProps) {
  const value = values[of];
  if (value === undefined) throw new RangeError(`Value: no figure called ${of}`);
  return <span className="font-mono whitespace-nowrap">{value.text}</span>;
}

/** A fact of the trade, which nothing computes: said in each unit system as shops say it. */
export interface GivenProps {
  readonly metric: string;
  readonly inch: string;
}

/** Shows a given in the reader's units. */
export function Given({ metric, inch, units }: GivenProps & { readonly units: UnitSystem }) {
  return <span className="font-mono whitespace-nowrap">{units === 'metric' ? metric : inch}</span>;
}
