import { norm } from '@/lib/geometry/point';
import { strayAtPen } from '@/lib/kinematics/linkage/pantograph-making';
import { copyStretch, type PantographCorner } from '@/lib/kinematics/linkage/pantograph';
import type { BenchTable, Plot, Readout } from './bench-model';
import {
  angleText,
  compassText,
  lengthText,
  lengthUnit,
  ruleText,
  shortNumber,
  shownLength,
} from './measure';
import { inLine } from './pantograph-scene';
import {
  elbowWorks,
  overlapOf,
  type PantographPose,
  type PantographSetup,
} from './pantograph-setup';
import type { Bounds } from './scene';

/** Shapes that differ by less than this share are the same to any eye. */
const trueShape = 1e-3;

const cornerNames: Readonly<Record<PantographCorner, string>> = {
  O: 'the end of the first bar',
  M: 'the middle corner',
  P: 'the end of the second bar',
};

/** The title strip of a pantograph. */
export function pantographReadouts(setup: PantographSetup, drive: number): readonly Readout[] {
  const { spec, copyBox } = setup;
  const pose = setup.pose(drive);
  const hidden = new Set(spec.hide ?? []);
  const copy: Readout[] = [
    { key: 'scale', label: 'Copy to drawing', value: scaleText(setup, pose) },
    {
      key: 'copy',
      label: 'Copy, wide × high',
      value: copyBox ? sizeText(copyBox, spec.units) : 'none',
    },
  ];
  return [
    ...(hidden.has('scale') || hidden.has('copy') ? [] : copy),
    ...(hidden.has('line')
      ? []
      : [
          {
            key: 'line',
            label: 'Pen off the line',
            value: lengthText(Math.abs(pose.offLine), spec.units),
          },
        ]),
    { key: 'elbow', label: 'Elbow', value: angleText(pose.elbow) },
  ];
}

function scaleText(setup: PantographSetup, pose: PantographPose): string {
  const { most, least } = stretch(setup, pose);
  return most - least < trueShape * most
    ? `${shortNumber(most, 3)} : 1`
    : `${shortNumber(least, 2)} to ${shortNumber(most, 2)} : 1`;
}

function stretch({ spec, roles }: PantographSetup, { elbow }: PantographPose) {
  return copyStretch(spec, roles, elbow);
}

function sizeText(box: Bounds, units: PantographSetup['spec']['units']): string {
  const [wide, high] = [box.right - box.left, box.top - box.bottom];
  const number = (mm: number) => shortNumber(shownLength(mm, units), units === 'inch' ? 2 : 1);
  return `${number(wide)} × ${number(high)} ${lengthUnit(units)}`;
}

/** The state of a pantograph in words. */
export function describePantograph(setup: PantographSetup, drive: number): string {
  const { spec, roles, copy, middle, drawingBox, copyBox, beyond } = setup;
  const pose = setup.pose(drive);
  const hidden = new Set(spec.hide ?? []);
  const rule = (mm: number) => ruleText(mm, spec.units);
  const line =
    Math.abs(pose.offLine) <= inLine
      ? 'in line'
      : `pen ${lengthText(Math.abs(pose.offLine), spec.units)} off the line`;
  const named = (['fixed', 'stylus', 'pen'] as const).map((role) => cornerNames[roles[role]]);
  const parts = [
    `Long bars ${rule(spec.first)} and ${rule(spec.second)}; holes ${rule(spec.firstHole)} from the outer end and ${rule(spec.secondHole)} from the elbow.`,
    `Fixed: ${named[0]}; stylus: ${named[1]}; pen: ${named[2]}${hidden.has('line') ? '' : `; ${line}`}.`,
  ];
  const showsCopy = !(hidden.has('scale') || hidden.has('copy'));
  if (showsCopy) {
    const turned = copy.outcome === 'true' && copy.turned ? 'turned half round' : 'upright';
    parts.push(`Scale ${scaleText(setup, pose)}, copy ${turned}.`);
  }
  parts.push(`Elbow at ${angleText(pose.elbow, 0)}.`);
  const lies = beyond > 1e-6 ? `${lengthText(beyond, spec.units)} beyond` : 'inside';
  const from = compassText(middle, spec.units);
  const place = from === 'the middle' ? 'on the fixed pin' : `${from} of the fixed pin`;
  parts.push(
    `The drawing, ${sizeText(drawingBox, spec.units)}, lies ${lies} the reach, its middle ${place}.`,
  );
  if (showsCopy && copyBox) parts.push(`The copy is ${sizeText(copyBox, spec.units)}.`);
  return parts.join(' ');
}

/** What does not work in a pantograph, each in a sentence with its amount. */
export function pantographLimits(setup: PantographSetup, drive: number): readonly string[] {
  const { spec, copy, beyond } = setup;
  const pose = setup.pose(drive);
  const hidden = new Set(spec.hide ?? []);
  const size = (mm: number) => lengthText(mm, spec.units);
  const limits: string[] = [];
  if (Math.abs(pose.offLine) > inLine && !hidden.has('line')) {
    limits.push(`Pen ${size(Math.abs(pose.offLine))} off the line: circles come out as ovals.`);
  }
  const misfit = spec.shortBars ?? { stylus: 0, other: 0 };
  for (const [name, by] of [
    ['stylus bar', misfit.stylus],
    ['other short bar', misfit.other],
  ] as const) {
    if (by === 0) continue;
    const way = by > 0 ? 'long' : 'short';
    limits.push(
      `${capital(name)} ${size(Math.abs(by))} ${way}: scale and shape drift across the sheet.`,
    );
  }
  if (!elbowWorks(setup, pose.elbow)) {
    limits.push(`Elbow at ${angleText(pose.elbow, 0)}, bars nearly in one line: the copy shakes.`);
  }
  if (copy.outcome === 'true' && Math.abs(copy.scale - 1) < 1e-9) {
    limits.push('Stylus and pen fall together: scale 1, nothing to copy on.');
  }
  if (pose.beyond > 0)
    limits.push(`Here the drawing lies ${size(pose.beyond)} beyond what the bars reach.`);
  else if (beyond > 1e-6) {
    limits.push(
      `Part of the drawing, dashed, lies up to ${size(beyond)} beyond the working reach.`,
    );
  }
  const overlap = hidden.has('path') ? 0 : overlapOf(setup);
  if (overlap > 0)
    limits.push(`Drawing and copy overlap: move the fixed pin ${size(overlap)} farther off.`);
  return limits;
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

/** Reach and faults, and distances from the fixed point along the drawing. */
export function pantographTables(setup: PantographSetup): readonly BenchTable[] {
  const { spec, reach, copy, samples } = setup;
  const hidden = new Set(spec.hide ?? []);
  const text = (mm: number) => lengthText(mm, spec.units);
  const showsCopy = !(hidden.has('scale') || hidden.has('copy'));
  const stray = spec.units === 'inch' ? 25.4 / 32 : 1;
  const fault =
    copy.outcome === 'true' && showsCopy
      ? [
          [
            `Error at the pen, stylus ${ruleText(stray, spec.units)} astray`,
            text(strayAtPen(copy.scale, stray)),
          ],
        ]
      : [];
  const pens = showsCopy
    ? [
        ['Pen, nearest', text(reach.pen.least)],
        ['Pen, farthest', text(reach.pen.most)],
      ]
    : [];
  const sizes: BenchTable = {
    caption: `Reach from the fixed point, elbow ${angleText(spec.elbow[0], 0)} to ${angleText(spec.elbow[1], 0)}`,
    head: ['What', 'Size'],
    rows: [
      ['Stylus, nearest', text(reach.stylus.least)],
      ['Stylus, farthest', text(reach.stylus.most)],
      ...pens,
      ...fault,
    ],
  };
  if (!showsCopy) return [sizes];
  const every = Math.floor((samples.length - 1) / 12);
  const rows = samples
    .filter((_, i) => i % every === 0)
    .map(({ stylus, pen, elbow, offLine }) => [
      text(norm(stylus)),
      text(norm(pen)),
      text(Math.abs(offLine)),
      angleText(elbow, 0),
    ]);
  return [
    sizes,
    {
      caption: 'Along the drawing, from the fixed point',
      head: ['Stylus', 'Pen', 'Pen off the line', 'Elbow'],
      rows,
    },
  ];
}

/** The pen's distance from the fixed point over the stylus's: a straight line when it copies true. */
export function pantographPlot(setup: PantographSetup): Plot | null {
  const { spec, samples } = setup;
  const hidden = spec.hide ?? [];
  if (hidden.includes('scale') || hidden.includes('copy')) return null;
  const points = samples.map(({ stylus, pen }) => ({
    x: shownLength(norm(stylus), spec.units),
    y: shownLength(norm(pen), spec.units),
  }));
  const across = niceTop(Math.max(...points.map(({ x }) => x)));
  const up = niceTop(Math.max(...points.map(({ y }) => y)));
  const unit = lengthUnit(spec.units);
  const last = points.reduce((far, point) => (point.x > far.x ? point : far), { x: 0, y: 0 });
  return {
    title: 'Pen’s distance over stylus’s, from the fixed point',
    across: { label: `stylus, ${unit}`, least: 0, most: across, ticks: quarters(across) },
    up: { label: `pen, ${unit}`, least: 0, most: up, ticks: quarters(up) },
    lines: [
      { label: 'over this drawing', role: 'chalk', dashed: false, points },
      {
        label: 'straight from the fixed point',
        role: 'pencil',
        dashed: true,
        points: [{ x: 0, y: 0 }, last],
      },
    ],
    now: (drive) => {
      const { stylus, pen } = setup.pose(drive);
      return [{ x: shownLength(norm(stylus), spec.units), y: shownLength(norm(pen), spec.units) }];
    },
  };
}

function quarters(top: number): readonly number[] {
  return [0, top / 4, top / 2, (3 * top) / 4, top];
}

/** The least of 1, 2, 4 and 8 times a power of ten that is not below a value. */
function niceTop(value: number): number {
  const power = 10 ** Math.floor(Math.log10(Math.max(value, 1e-9)));
  return ([1, 2, 4, 8].find((step) => step * power >= value) ?? 10) * power;
}
