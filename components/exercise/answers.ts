import type { Draft } from '@/lib/browser/draft';
import type { SettingValues } from '@/lib/scene/bench-spec';
import type { PartView } from '@/lib/schemas/round';
import { readTyped } from './reading';

type Answer = Draft[string] | undefined;

/** What is typed for a number part. */
export function typedOf(answer: Answer): string {
  return typeof answer === 'string' ? answer : '';
}

/** The options chosen for a choice part. */
export function chosenOf(answer: Answer): readonly string[] {
  return Array.isArray(answer) ? answer : [];
}

/** The setting of a bench, or the fields of a design. */
export function settingOf(answer: Answer): SettingValues {
  return typeof answer === 'object' && !Array.isArray(answer) ? answer : {};
}

/** Whether a part is answered so that it can be sent: read, chosen or set. */
export function isAnswered(part: PartView, answer: Answer): boolean {
  if (part.kind === 'number') return readTyped(typedOf(answer), part).state === 'read';
  if (part.kind === 'choice') return chosenOf(answer).length > 0;
  const setting = settingOf(answer);
  if (part.kind === 'setting') return Object.keys(setting).length > 0;
  return part.fields.every((field) =>
    field.kind === 'stock'
      ? typeof setting[field.key] === 'number'
      : readTyped(String(setting[field.key] ?? ''), field).state === 'read',
  );
}
