import { degrees } from '@/lib/geometry/angle';
import { ellipsePerimeter } from '@/lib/geometry/ellipse';
import { grooveFits, grooveLength } from '@/lib/kinematics/linkage/trammel-making';
import type { BenchTable, Plot, Readout } from './bench-model';
import { angleText, compassText, lengthText, ruleText } from './measure';
import { penAngle, type TrammelSetup } from './trammel-setup';

interface Hidden {
  readonly size: boolean;
  readonly pen: boolean;
}

function hiddenOf({ spec }: TrammelSetup): Hidden {
  const hide = spec.hide ?? [];
  return {
    size: ['size', 'length', 'width'].some((key) => hide.includes(key)),
    pen: hide.includes('pen'),
  };
}

/** The title strip of a trammel. */
export function trammelReadouts(setup: TrammelSetup, drive: number): readonly Readout[] {
  const { spec, oval } = setup;
  const hidden = hiddenOf(setup);
  const { pen } = setup.pose(drive);
  const size: Readout[] = [
    { key: 'length', label: 'Oval, length', value: lengthText(2 * oval.semiMajor, spec.units) },
    { key: 'width', label: 'Oval, width', value: lengthText(2 * oval.semiMinor, spec.units) },
  ];
  const seen = {
    key: 'pen',
    label: 'Pen seen from middle',
    value: angleText(turn(penAngle(setup, pen))),
  };
  return [
    ...(hidden.size ? [] : size),
    { key: 'bar', label: 'Bar', value: angleText(turn(drive)) },
    ...(hidden.pen ? [] : [seen]),
  ];
}

/** The state of a trammel in words. */
export function describeTrammel(setup: TrammelSetup, drive: number): string {
  const { spec, oval, apart } = setup;
  const hidden = hiddenOf(setup);
  const { pen } = setup.pose(drive);
  const near =
    spec.nearPin < 0
      ? `near pin ${ruleText(-spec.nearPin, spec.units)} on the other side of the pen`
      : `near pin ${ruleText(spec.nearPin, spec.units)}`;
  const parts = [
    `Far pin ${ruleText(spec.farPin, spec.units)} from the pen, in the ${spec.farRunsIn} groove; ${near}, in the other; ${ruleText(apart, spec.units)} apart.`,
  ];
  const bar = `Bar at ${angleText(turn(drive))}`;
  parts.push(
    hidden.pen
      ? `${bar}.`
      : `${bar}, pen at ${compassText(pen, spec.units)}, seen from the middle at ${angleText(turn(penAngle(setup, pen)))}.`,
  );
  if (!hidden.size) {
    const size = `${ruleText(2 * oval.semiMajor, spec.units)} by ${ruleText(2 * oval.semiMinor, spec.units)}`;
    parts.push(`Oval ${size}, ${lying(setup)}.`);
  }
  if (spec.wanted) {
    const { length, width } = spec.wanted;
    parts.push(
      `Wanted, drawn dashed: ${ruleText(length, spec.units)} east-west by ${ruleText(width, spec.units)} north-south.`,
    );
  }
  for (const dot of spec.dots ?? []) {
    parts.push(`Dot ${dot.label}: ${compassText(dot, spec.units)}, from the middle.`);
  }
  const fit = fitOf(setup);
  if (fit.outcome === 'enough') {
    parts.push(`Sliders have ${lengthText(fit.spare / 2, spec.units)} of groove left.`);
  }
  return parts.join(' ');
}

function lying({ oval, spec }: TrammelSetup): string {
  if (oval.semiMajor < 1e-9) return 'shut to a point';
  if (oval.round === 'line') return 'shut to a line';
  if (oval.semiMajor - oval.semiMinor < 1e-9 * oval.semiMajor) return 'a circle';
  const from = degrees(oval.majorAxis);
  if (spec.skew !== 0) return `its length ${angleText(oval.majorAxis, 2)} from east`;
  return Math.abs(from - 90) < 45 ? 'lying north-south' : 'lying east-west';
}

function fitOf({ trammel, spec }: TrammelSetup) {
  return grooveFits(trammel, spec.slider, spec.groove);
}

/** What does not work in a trammel, in sentences with amounts. */
export function trammelLimits(setup: TrammelSetup): readonly string[] {
  const { units } = setup.spec;
  const limits: string[] = [];
  const fit = fitOf(setup);
  if (fit.outcome === 'too-short') {
    limits.push(
      `${lengthText(fit.by, units)} more groove needed: each pin travels ${lengthText(2 * setup.travel, units)}.`,
    );
  }
  if (setup.strike) {
    limits.push('The sliders meet off the crossing; shorten them or round their ends.');
  }
  return limits;
}

/** What has become of the oval where it is no ordinary one: a circle, a line, drawn the other way. */
export function trammelRemarks(setup: TrammelSetup): readonly string[] {
  const { spec, apart, trammel, oval } = setup;
  const { farPin, nearPin, units } = spec;
  if (hiddenOf(setup).size) return [];
  const across = ruleText(2 * oval.semiMajor, units);
  if (oval.semiMajor < 1e-9) return ['Both pins under the pen: it stays on the crossing.'];
  if (apart < 1e-9) return [`One pin: a circle, ${across} across.`];
  if (oval.round === 'line') {
    return [
      `The oval has shut to a line: the pen runs along the groove, ${across} from end to end.`,
    ];
  }
  if (farPin * nearPin >= 0) return [];
  if (Math.abs(farPin + nearPin) < 1e-9) {
    return ['Half-way: a circle of half the pins’ distance, drawn against the bar’s turn.'];
  }
  const needed = ruleText(grooveLength(trammel, spec.slider), units);
  return [
    `Same oval as with both pins on one side, but the pins are now ${ruleText(apart, units)} apart and need grooves of ${needed}.`,
  ];
}

/** The sizes behind the drawing, and the angles behind the plot. */
export function trammelTables(setup: TrammelSetup): readonly BenchTable[] {
  const { spec, oval, apart, travel, trammel } = setup;
  const hidden = hiddenOf(setup);
  const text = (mm: number) => lengthText(mm, spec.units);
  const size = [
    ['Oval, length', text(2 * oval.semiMajor)],
    ['Oval, width', text(2 * oval.semiMinor)],
    ['Once round the edge', text(ellipsePerimeter(oval))],
  ];
  const sizes: BenchTable = {
    caption: 'Sizes',
    head: ['What', 'Size'],
    rows: [
      ...(hidden.size ? [] : size),
      ['Pins apart', text(apart)],
      ['Travel of each pin', text(2 * travel)],
      ['Groove needed', text(grooveLength(trammel, spec.slider))],
      ['Groove there is', text(spec.groove)],
    ],
  };
  if (hidden.pen || hidden.size) return [sizes];
  const angles: BenchTable = {
    caption: 'Angles from the near pin’s groove',
    head: ['Bar', 'Pen seen from the middle', 'Pen east', 'Pen north'],
    rows: Array.from({ length: 13 }, (_, i) => {
      const bar = (i * Math.PI) / 12;
      const { pen } = setup.pose(bar);
      return [angleText(bar, 0), angleText(turn(penAngle(setup, pen))), text(pen.x), text(pen.y)];
    }),
  };
  return [sizes, angles];
}

/** The pen's angle over the bar's, once round. */
export function trammelPlot(setup: TrammelSetup): Plot | null {
  const hidden = hiddenOf(setup);
  if (hidden.pen || hidden.size || setup.oval.round === 'line') return null;
  const against = setup.oval.round === 'against-the-bar';
  const steps = 120;
  const points = Array.from({ length: steps + 1 }, (_, i) => {
    const bar = (2 * Math.PI * i) / steps;
    return { x: degrees(bar), y: degrees(follow(setup, bar, against)) };
  });
  const ticks = [0, 90, 180, 270, 360];
  const up = against ? ticks.map((tick) => -tick).reverse() : ticks;
  return {
    title: 'The pen’s angle over the bar’s',
    across: { label: 'bar, °', least: 0, most: 360, ticks },
    up: {
      label: 'pen seen from the middle, °',
      least: up[0] ?? 0,
      most: up.at(-1) ?? 0,
      ticks: up,
    },
    lines: [
      { label: 'pen', role: 'chalk', dashed: false, points },
      {
        label: against ? 'as far as the bar, against it' : 'as far as the bar',
        role: 'pencil',
        dashed: true,
        points: [
          { x: 0, y: 0 },
          { x: 360, y: against ? -360 : 360 },
        ],
      },
    ],
    now: (drive) => {
      const bar = turn(drive);
      return [{ x: degrees(bar), y: degrees(follow(setup, bar, against)) }];
    },
  };
}

/** The pen's angle, carried on without a jump as the bar goes round from 0 to 2π. */
function follow(setup: TrammelSetup, bar: number, against: boolean): number {
  const way = against ? -bar : bar;
  const off = penAngle(setup, setup.pose(bar).pen) - way;
  return way + Math.atan2(Math.sin(off), Math.cos(off));
}

/** An angle from 0 up to, but not reaching, a whole turn. */
function turn(angle: number): number {
  const whole = 2 * Math.PI;
  const within = angle - Math.floor(angle / whole) * whole;
  return whole - within < 1e-9 ? 0 : within;
}
