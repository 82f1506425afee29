/** The time zones to choose from, the person's own always among them. */
export function timeZoneOptions(own: string): readonly { value: string; label: string }[] {
  const zones = new Set([own, ...Intl.supportedValuesOf('timeZone')]);
  return [...zones]
    .sort()
    .map((zone) => ({ value: zone, label: zone.replaceAll('_', ' ').replace('/', ' / ') }));
}

/** Millimetres or inches, to choose from. */
export const unitOptions = [
  { value: 'metric', label: 'Millimetres' },
  { value: 'inch', label: 'Inches and fractions' },
] as const;
