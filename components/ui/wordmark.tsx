const PINS = [0, 60, 120, 180, 240, 300];
const DRIVER_PIN = 60;

/** The disc of a lantern wheel seen along its arbor: six pins, one of them in brass. */
export function Mark({ size = 28 }: Readonly<{ size?: number }>) {
  return (
    <svg
      width={size}
      height={size}
      viewBox="0 0 32 32"
      aria-hidden="true"
      focusable="false"
      className="shrink-0"
    >
      <circle cx="16" cy="16" r="14.5" className="fill-transparent stroke-ink" strokeWidth="1.5" />
      {PINS.map((turn) => (
        <circle
          key={turn}
          cx="16"
          cy="6.6"
          r="2.4"
          transform={`rotate(${turn} 16 16)`}
          className={turn === DRIVER_PIN ? 'fill-brass-fill stroke-brass' : 'fill-ink'}
        />
      ))}
      <rect
        x="13.8"
        y="13.8"
        width="4.4"
        height="4.4"
        transform="rotate(30 16 16)"
        className="fill-ink"
      />
    </svg>
  );
}

/** The mark and the name. */
export function Wordmark() {
  return (
    <span className="inline-flex items-center gap-2.5 font-heading text-[1.375rem] font-semibold text-ink">
      <Mark />
      Hornbeam
    </span>
  );
}
