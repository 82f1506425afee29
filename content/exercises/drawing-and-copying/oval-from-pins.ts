import { defineExercise, type Variant } from '@/lib/marking/definition';
import { trammelOval, type Trammel } from '@/lib/kinematics/linkage/trammel';
import { lengthField } from '@/lib/quantities/field';
import { drawSize, givenLength, givenNumber, inUnits, lengthWithin, said } from '../sizes';

type Drawn = {
  readonly far: number;
  readonly near: number;
  readonly farRunsIn: 'east-west' | 'north-south';
};

/** Number: how large is the oval, and which way does it lie, for two pins on a bar? */
export const ovalFromPins = defineExercise<Drawn>({
  id: 'oval-from-pins',
  version: 1,
  kind: 'number',
  lesson: 'trammel-and-oval',
  title: 'The oval from its pins',
  skills: ['trammel.semi-axes', 'oval.size'],
  draw(source, units) {
    const far = drawSize(source, units, { mm: [120, 400, 5], in: [5, 16, 1 / 4] });
    const near = drawSize(source, units, { mm: [60, 340, 5], in: [2.5, 13.5, 1 / 4] });
    const farRunsIn = source.pick(['east-west', 'north-south'] as const);
    return far - near >= inUnits(units, 20, 1) ? { far, near, farRunsIn } : null;
  },
  prompt: ({ givens: g }) =>
    `One groove lies east-west, the other north-south. The far pin is f from the pen and runs in the ${g.farRunsIn} groove; the near pin is n from the pen and runs in the other. How far across is the oval east-west, and how far north-south?`,
  givens: ({ givens: g, units }) => [
    givenLength('f', 'pen to far pin', g.far, units),
    givenLength('n', 'pen to near pin', g.near, units),
    givenNumber('', 'groove of the far pin', g.farRunsIn),
  ],
  parts: [
    {
      kind: 'number',
      key: 'eastWest',
      skills: ['trammel.semi-axes', 'oval.size'],
      label: () => 'Across, east-west',
      field: (units) => lengthField(units),
      tolerance: lengthWithin(0.5, 0.02),
      answer: (variant) => across(variant).eastWest,
      slips: [
        { id: 'half-for-full', value: (v) => across(v).eastWest / 2, advice: halfForFull },
        { id: 'far-and-near-swapped', value: (v) => across(v).northSouth, advice: swapped },
        {
          id: 'spacing-for-axis',
          value: (v) => spacing(v, 'east-west'),
          advice: spacingForAxis,
        },
      ],
    },
    {
      kind: 'number',
      key: 'northSouth',
      skills: ['trammel.semi-axes', 'oval.size'],
      label: () => 'Across, north-south',
      field: (units) => lengthField(units),
      tolerance: lengthWithin(0.5, 0.02),
      answer: (variant) => across(variant).northSouth,
      slips: [
        { id: 'half-for-full', value: (v) => across(v).northSouth / 2, advice: halfForFull },
        { id: 'far-and-near-swapped', value: (v) => across(v).eastWest, advice: swapped },
        {
          id: 'spacing-for-axis',
          value: (v) => spacing(v, 'north-south'),
          advice: spacingForAxis,
        },
      ],
    },
  ],
  hints: ({ givens: g, units }) => [
    'Bring one pin to the crossing. Where does the bar lie then, and how far out is the pen?',
    'Half of the oval along a groove is the pen’s distance to the pin that runs in the other groove.',
    `With the far pin on the crossing the pen is ${said(g.far, units)} out, along the groove of the near pin.`,
  ],
  solution(variant) {
    const { givens: g, units } = variant;
    const { eastWest, northSouth } = across(variant);
    const [eastPin, northPin] = g.farRunsIn === 'north-south' ? [g.far, g.near] : [g.near, g.far];
    return [
      'With a pin on the crossing the bar lies along the other groove, and the pen is as far out as it ever gets that way.',
      `East-west counts the pin in the north-south groove: 2 × ${said(eastPin, units)} = ${said(eastWest, units)}.`,
      `North-south counts the pin in the east-west groove: 2 × ${said(northPin, units)} = ${said(northSouth, units)}.`,
    ];
  },
});

function across({ givens: g }: Variant<Drawn>): { eastWest: number; northSouth: number } {
  const trammel: Trammel =
    g.farRunsIn === 'north-south'
      ? { uprightPin: g.far, levelPin: g.near }
      : { uprightPin: g.near, levelPin: g.far };
  const oval = trammelOval(trammel);
  const [long, short] = [2 * oval.semiMajor, 2 * oval.semiMinor];
  return Math.abs(Math.cos(oval.majorAxis)) > Math.SQRT1_2
    ? { eastWest: long, northSouth: short }
    : { eastWest: short, northSouth: long };
}

/** Twice the pins' distance, for the shorter way across only. */
function spacing(variant: Variant<Drawn>, way: Drawn['farRunsIn']): number | null {
  const { far, near, farRunsIn } = variant.givens;
  return farRunsIn === way ? 2 * (far - near) : null;
}

function halfForFull(): string {
  return 'That is from the middle to the edge. The pen goes as far to the other side: double it.';
}

function swapped({ givens: g }: Variant<Drawn>): string {
  return `Stop the far pin on the crossing: the bar then lies along the other groove. The far pin runs ${g.farRunsIn}, so the oval is longest the other way.`;
}

function spacingForAxis({ givens: g, units }: Variant<Drawn>): string {
  return `${said(g.far - g.near, units)} is from pin to pin. The width comes from the near pin’s distance to the pen, ${said(g.near, units)}.`;
}
