import { readQuantity } from '@/lib/quantities/read';
import type { Control, DesignField, DesignPart, Setting, SettingPart, Variant } from './definition';
import type { Answer, WeighedPart } from './marking';

type Read = { readonly setting: Setting } | { readonly refused: string };

/**
 * Marks a setting or a design criterion by criterion. Where a slip is recognised, its advice stands
 * at the first criterion that is not met.
 */
export function markSetting(
  part: SettingPart | DesignPart,
  variant: Variant,
  answer: Answer | undefined,
): { readonly marked: readonly WeighedPart[] } | { readonly refused: string } {
  const read =
    part.kind === 'setting'
      ? readControls(part.controls(variant.units), answer)
      : readDesign(part.fields(variant), answer);
  if ('refused' in read) return read;
  const { setting } = read;
  const echo = part.echo(setting, variant);
  const met = part.criteria.map((criterion) => criterion.met(setting, variant));
  const firstUnmet = met.indexOf(false);
  const slip = firstUnmet < 0 ? undefined : part.slips.find((each) => each.holds(setting, variant));
  const total = part.criteria.reduce((sum, { weight = 1 }) => sum + weight, 0);
  return {
    marked: part.criteria.map((criterion, index) => ({
      key: `${part.key}.${criterion.key}`,
      label: criterion.label(variant),
      right: met[index] === true,
      echo,
      ...(met[index] === true ? {} : { message: criterion.message(setting, variant) }),
      ...(slip !== undefined && index === firstUnmet
        ? { slip: slip.id, message: slip.advice(variant, setting) }
        : {}),
      weight: ((part.weight ?? 1) * (criterion.weight ?? 1)) / total,
      skills: criterion.skills ?? part.skills,
    })),
  };
}

/** Only the controls that are part of the answer, each within its range. */
function readControls(controls: readonly Control[], answer: Answer | undefined): Read {
  const given = asRecord(answer);
  const setting: Record<string, number | string> = {};
  for (const control of controls) {
    const value = Object.hasOwn(given, control.name) ? given[control.name] : undefined;
    if (value === undefined || !allowed(control, value)) {
      return { refused: 'Set the bench first, then send what it stands at.' };
    }
    setting[control.name] = value;
  }
  return { setting };
}

function allowed(control: Control, value: number | string): boolean {
  if (control.kind === 'one-of') return control.values.includes(String(value));
  if (control.kind === 'count' && !Number.isInteger(value)) return false;
  return typeof value === 'number' && value >= control.least && value <= control.most;
}

function readDesign(fields: readonly DesignField[], answer: Answer | undefined): Read {
  const given = asRecord(answer);
  const setting: Record<string, number | string> = {};
  for (const field of fields) {
    const value = Object.hasOwn(given, field.key) ? given[field.key] : undefined;
    if (field.kind === 'stock') {
      const chosen = field.choices.find((choice) => choice.value === Number(value ?? NaN));
      if (chosen === undefined) return { refused: `${field.label}: choose one from the stock.` };
      setting[field.key] = chosen.value;
    } else {
      const reading = readQuantity(value === undefined ? '' : String(value), field.field);
      if (!reading.ok) return { refused: `${field.label}: ${reading.message}` };
      setting[field.key] = reading.value;
    }
  }
  return { setting };
}

function asRecord(answer: Answer | undefined): Readonly<Record<string, number | string>> {
  return typeof answer === 'object' && !isList(answer) ? answer : {};
}

function isList(answer: Answer): answer is readonly string[] {
  return Array.isArray(answer);
}
