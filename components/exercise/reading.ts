import type { Field } from '@/lib/quantities/field';
import { readQuantity } from '@/lib/quantities/read';

/** What a field of a round takes, as it travels to the browser. */
export interface FieldView extends Field {
  /** In words, with an example. */
  readonly expects: string;
}

/** How something typed reads: nothing yet, a quantity said back, or a refusal with what is expected. */
export type Typed =
  | { readonly state: 'empty' }
  | { readonly state: 'read'; readonly echo: string }
  | { readonly state: 'refused'; readonly message: string };

/**
 * Reads what was typed as the server will, without knowing what would be right.
 * @example readTyped('3 1/8', { dimension: 'length', unit: 'in', expects: '' }) // '3 1/8 in = 79.4 mm'
 */
export function readTyped(typed: string, field: FieldView): Typed {
  if (typed.trim() === '') return { state: 'empty' };
  const reading = readQuantity(typed, field);
  return reading.ok
    ? { state: 'read', echo: reading.echo }
    : { state: 'refused', message: reading.message };
}
