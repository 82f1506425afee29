import type { ZodType } from 'zod';
import type { FormState } from '@/components/ui/form-state';

/** Names of fields whose contents are never sent back to the browser. */
const secret = /password|token|secret/i;

/** What a form sent, read strictly: either the data, or the state that says what is wrong. */
export type FormReading<Data> =
  | { readonly ok: true; readonly data: Data; readonly values: Readonly<Record<string, string>> }
  | { readonly ok: false; readonly state: FormState };

/**
 * Reads a form with a strict schema; a field the schema does not name is refused. What was typed
 * comes back with the state, secrets left out. The names in `lists` may come any number of times:
 * the schema gets them as lists, and they come back in one string with blanks between.
 */
export function readForm<Data>(
  form: FormData,
  schema: ZodType<Data>,
  lists: readonly string[] = [],
): FormReading<Data> {
  const entries = [...form.entries()].filter(
    (entry): entry is [string, string] =>
      typeof entry[1] === 'string' && !entry[0].startsWith('$ACTION'),
  );
  const several = lists.map((name) => [name, form.getAll(name).map(String)] as const);
  const typed = { ...Object.fromEntries(entries), ...Object.fromEntries(several) };
  const values = {
    ...Object.fromEntries(entries.filter(([name]) => !secret.test(name))),
    ...Object.fromEntries(several.map(([name, chosen]) => [name, chosen.join(' ')])),
  };
  const result = schema.safeParse(typed);
  if (result.success) return { ok: true, data: result.data, values };
  const errors: Record<string, string> = {};
  for (const issue of result.error.issues) {
    const name = String(issue.path[0] ?? '');
    errors[name] ??= issue.message;
  }
  return {
    ok: false,
    state: {
      outcome: 'refused',
      message: 'Not saved yet. What you typed is still here; one thing needs another look.',
      errors,
      values,
    },
  };
}
