import { defineExercise, type Setting, type Variant } from '@/lib/marking/definition';
import { trammelForOval, type Trammel } from '@/lib/kinematics/linkage/trammel';
import {
  grooveFits,
  grooveLength,
  leastPinsApart,
  pinsApart,
} from '@/lib/kinematics/linkage/trammel-making';
import { fromMillimetres, inch, toMillimetres } from '@/lib/quantities/units';
import { drawSize, givenLength, inUnits, said } from '../sizes';

type Drawn = {
  readonly length: number;
  readonly width: number;
  readonly slider: number;
  readonly groove: number;
};

/** Setting: put both pins where the wanted oval needs them. */
export const setThePins = defineExercise<Drawn>({
  id: 'set-the-pins',
  version: 1,
  kind: 'setting',
  lesson: 'trammel-and-oval',
  title: 'Set the pins',
  skills: ['trammel.pins-from-size', 'trammel.semi-axes', 'trammel.slot-length'],
  draw(source, units) {
    const length = drawSize(source, units, { mm: [240, 800, 10], in: [10, 32, 1 / 2] });
    const width = drawSize(source, units, { mm: [120, 640, 10], in: [5, 26, 1 / 2] });
    const slider = drawSize(source, units, { mm: [40, 60, 10], in: [1.5, 2.5, 1 / 2] });
    if (width < 0.3 * length || width > 0.85 * length) return null;
    const pins = trammelForOval(length, width);
    if (pinsApart(pins) < leastPinsApart(slider, slider / 3)) return null;
    const groove = grooveLength(pins, slider) + inUnits(units, 10, 1 / 2);
    return { length, width, slider, groove };
  },
  prompt: () =>
    'The oval is to lie ℓ east-west and w north-south, as the dashed outline shows. Set both pins: how far each one is from the pen, and which groove the far pin runs in. The grooves are as long as they are.',
  givens: ({ givens: g, units }) => [
    givenLength('ℓ', 'east-west', g.length, units),
    givenLength('w', 'north-south', g.width, units),
    givenLength('s', 'slider', g.slider, units),
    givenLength('g', 'each groove', g.groove, units),
  ],
  parts: [
    {
      kind: 'setting',
      key: 'pins',
      skills: ['trammel.pins-from-size', 'trammel.semi-axes', 'trammel.slot-length'],
      label: () => 'The two pins',
      controls: () => [
        { name: 'farPin', kind: 'number', least: -900, most: 900 },
        { name: 'nearPin', kind: 'number', least: -900, most: 900 },
        { name: 'farRunsIn', kind: 'one-of', values: ['north-south', 'east-west'] },
      ],
      criteria: [
        {
          key: 'north-south',
          skills: ['trammel.pins-from-size', 'trammel.semi-axes'],
          label: () => 'The pin in the north-south groove',
          met: (setting, v) => near(pinsOf(setting).uprightPin, wanted(v).uprightPin, v),
          message: (setting, { units }) =>
            `It stands ${ownLength(Math.abs(pinsOf(setting).uprightPin), units)} from the pen. This pin sets how far the oval goes east-west.`,
        },
        {
          key: 'east-west',
          skills: ['trammel.pins-from-size', 'trammel.semi-axes'],
          label: () => 'The pin in the east-west groove',
          met: (setting, v) => near(pinsOf(setting).levelPin, wanted(v).levelPin, v),
          message: (setting, { units }) =>
            `It stands ${ownLength(Math.abs(pinsOf(setting).levelPin), units)} from the pen. This pin sets how far the oval goes north-south.`,
        },
        {
          key: 'grooves',
          skills: ['trammel.slot-length'],
          label: () => 'No slider strikes the end of a groove',
          met: (setting, v) => shortBy(setting, v) === 0,
          message: (setting, v) =>
            `The pins are ${ownLength(pinsApart(pinsOf(setting)), v.units)} apart, so each travels twice that; with the slider the groove is ${ownLength(shortBy(setting, v), v.units)} too short.`,
        },
      ],
      slips: [
        {
          id: 'full-axes',
          holds: (setting, v) => stands(setting, v, 2 * half(v).long, 2 * half(v).short),
          example: (v) => setTo(2 * half(v).long, 2 * half(v).short),
          advice: () => 'The oval came out twice too large: from the pen the bar carries halves.',
        },
        {
          id: 'far-and-near-swapped',
          holds: (setting, v) => stands(setting, v, half(v).short, half(v).long),
          example: (v) => setTo(half(v).long, half(v).short, 'east-west'),
          advice: () =>
            'The right oval, lying crosswise: the long half belongs to the pin in the other groove.',
        },
        {
          id: 'spacing-for-axis',
          holds: (setting, v) =>
            near(pinsOf(setting).uprightPin, half(v).long, v) &&
            near(pinsApart(pinsOf(setting)), half(v).short, v) &&
            sameSide(setting),
          example: (v) => spacingForAxis(v),
          advice: (v) =>
            `You set ${said(v.givens.width / 2, v.units)} from pin to pin; it is measured from the pen.`,
        },
        {
          id: 'pen-between',
          holds: (setting, v) =>
            stands(setting, v, half(v).long, half(v).short) && !sameSide(setting),
          example: (v) => setTo(half(v).long, -half(v).short),
          advice: (v, setting) =>
            `That is the right oval, but with the pen between them the pins stand ${ownLength(pinsApart(pinsOf(setting)), v.units)} apart, and these grooves end ${ownLength(shortBy(setting, v), v.units)} too soon.`,
        },
      ],
      answer: (v) => setTo(half(v).long, half(v).short),
      echo: (setting, { units }) =>
        `far pin ${ownLength(Number(setting.farPin), units)}, near pin ${ownLength(Number(setting.nearPin), units)} from the pen; the far pin runs ${String(setting.farRunsIn)}`,
    },
  ],
  figure: ({ givens: g, units }) => ({
    bench: 'trammel',
    farPin: inUnits(units, 100, 4 * inch),
    nearPin: inUnits(units, 50, 2 * inch),
    farRunsIn: 'east-west',
    slider: toMillimetres(g.slider, units),
    groove: toMillimetres(g.groove, units),
    skew: 0,
    held: 'board',
    wanted: {
      length: toMillimetres(g.length, units),
      width: toMillimetres(g.width, units),
    },
    drive: 0,
    hide: ['length', 'width'],
    controls: ['farPin', 'nearPin', 'farRunsIn'],
    units,
  }),
  hints: ({ givens: g, units }) => [
    'Halve first. Then ask: which groove is the far pin in when the oval lies east-west?',
    'The far pin ℓ ÷ 2 from the pen, in the north-south groove; the near pin w ÷ 2, in the east-west one.',
    `The far pin at ${said(g.length, units)} ÷ 2.`,
  ],
  solution(variant) {
    const { givens: g, units } = variant;
    return [
      `Far pin: ${said(g.length, units)} ÷ 2 = ${said(g.length / 2, units)}, in the north-south groove, so that the long half lies east-west.`,
      `Near pin: ${said(g.width, units)} ÷ 2 = ${said(g.width / 2, units)}, in the east-west groove, on the same side of the pen.`,
      `Pins apart ${said(pinsApart(trammelForOval(g.length, g.width)), units)}: each travels twice that, and with its slider it stays within ${said(g.groove, units)}.`,
    ];
  },
});

/** The pins by their grooves, in millimetres. */
function pinsOf(setting: Setting): Trammel {
  const [far, near] = [Number(setting.farPin), Number(setting.nearPin)];
  return setting.farRunsIn === 'north-south'
    ? { uprightPin: far, levelPin: near }
    : { uprightPin: near, levelPin: far };
}

function wanted({ givens: g, units }: Variant<Drawn>): Trammel {
  return trammelForOval(toMillimetres(g.length, units), toMillimetres(g.width, units));
}

function half(variant: Variant<Drawn>): { long: number; short: number } {
  const { uprightPin, levelPin } = wanted(variant);
  return { long: uprightPin, short: levelPin };
}

/** Within the tolerance of the setting, to whichever side of the pen. */
function near(value: number, target: number, { units }: Variant<Drawn>): boolean {
  return Math.abs(Math.abs(value) - target) <= inUnits(units, 1, inch / 32) + 1e-9;
}

function stands(setting: Setting, v: Variant<Drawn>, upright: number, level: number): boolean {
  const pins = pinsOf(setting);
  return near(pins.uprightPin, upright, v) && near(pins.levelPin, level, v);
}

function sameSide(setting: Setting): boolean {
  const { uprightPin, levelPin } = pinsOf(setting);
  return uprightPin * levelPin >= 0;
}

function shortBy(setting: Setting, { givens: g, units }: Variant<Drawn>): number {
  const fit = grooveFits(
    pinsOf(setting),
    toMillimetres(g.slider, units),
    toMillimetres(g.groove, units),
  );
  return fit.outcome === 'enough' ? 0 : fit.by;
}

function spacingForAxis(variant: Variant<Drawn>): Setting | null {
  const { long, short } = half(variant);
  return near(long - short, short, variant) ? null : setTo(long, long - short);
}

function setTo(
  farPin: number,
  nearPin: number,
  farRunsIn: 'north-south' | 'east-west' = 'north-south',
): Setting {
  return { farPin, nearPin, farRunsIn };
}

function ownLength(millimetres: number, units: Variant['units']): string {
  return said(fromMillimetres(millimetres, units), units);
}
