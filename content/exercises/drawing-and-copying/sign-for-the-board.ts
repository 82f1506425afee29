import {
  defineExercise,
  type Criterion,
  type Setting,
  type SettingSlip,
  type Variant,
} from '@/lib/marking/definition';
import { countField, lengthField } from '@/lib/quantities/field';
import { drawSize, givenLength, inUnits, plain, said } from '../sizes';
import {
  demandsMet,
  firstLayout,
  fitsBoard,
  largestScale,
  layOut,
  tooLargeScale,
  type Board,
  type Layout,
} from './board-layout';

type Drawn = {
  readonly signWidth: number;
  readonly signHeight: number;
  readonly boardWidth: number;
  readonly boardHeight: number;
};

const stock = { metric: [300, 400, 500, 600, 800], inch: [12, 16, 20, 24, 30] };

type Demand = keyof ReturnType<typeof demandsMet>;

/** Design: bars, hole and place for an enlarged sign that just fits its board. */
export const signForTheBoard = defineExercise<Drawn>({
  id: 'sign-for-the-board',
  version: 1,
  kind: 'design',
  lesson: 'pantograph',
  title: 'A sign for the board',
  skills: ['pantograph.holes', 'pantograph.scale', 'pantograph.reach'],
  draw(source, units) {
    const signWidth = drawSize(source, units, { mm: [120, 200, 10], in: [5, 8, 1 / 2] });
    const signHeight = drawSize(source, units, { mm: [60, 120, 10], in: [2.5, 4.5, 1 / 2] });
    const scale = source.pick([1.5, 1.6, 2, 2.5, 3, 4]);
    const [across, up] = source.pick([
      [1.03, 1.4],
      [1.4, 1.03],
    ] as const);
    const grid = gridOf(units);
    const boardWidth = Math.ceil((scale * across * signWidth) / grid) * grid;
    const boardHeight = Math.ceil((scale * up * signHeight) / grid) * grid;
    const drawn = { signWidth, signHeight, boardWidth, boardHeight };
    const answered = stock[units].map((bar) => firstLayout([bar], boardOf(drawn, units), grid));
    return answered.some((layout) => layout !== null) && answered.includes(null) ? drawn : null;
  },
  prompt: ({ units }) =>
    `The harbour sign is to be enlarged on to a board. Choose two equal long bars from the stock; the hole, counted from the fixed pin (holes every ${said(inUnits(units, 25, 1), units)}, and the same number from the elbow on the second bar); and how far from the fixed point the near edge of the copy lies. Drawing and copy lie centred on one line through the fixed point, ${said(inUnits(units, 20, 3 / 4), units)} apart at least. The stylus is in the middle, and the elbow may work from 30° to 150°.`,
  givens: ({ givens: g, units }) => [
    givenLength('w', 'sign, wide', g.signWidth, units),
    givenLength('h', 'sign, high', g.signHeight, units),
    givenLength('W', 'board, wide', g.boardWidth, units),
    givenLength('H', 'board, high', g.boardHeight, units),
  ],
  parts: [
    {
      kind: 'design',
      key: 'layout',
      skills: ['pantograph.holes', 'pantograph.scale', 'pantograph.reach'],
      label: () => 'Bars, hole and place',
      fields: ({ units }) => [
        {
          kind: 'stock',
          key: 'bar',
          label: 'Long bars',
          choices: stock[units].map((value) => ({ value, label: said(value, units) })),
        },
        {
          kind: 'quantity',
          key: 'hole',
          label: 'Hole, counted from the fixed pin',
          field: countField('holes'),
        },
        {
          kind: 'quantity',
          key: 'from',
          label: 'Fixed point to near edge of the copy',
          field: lengthField(units),
        },
      ],
      criteria: [
        criterion('inside', 'The copy stays inside the board', 'pantograph.scale', (v, layout) => {
          const scale = scaleOf(layout, v);
          return `At a scale of ${plain(scale)} the copy is ${said(scale * v.givens.signWidth, v.units)} by ${said(scale * v.givens.signHeight, v.units)}.`;
        }),
        criterion(
          'large',
          'It is at least 92 % as large as fits',
          'pantograph.holes',
          (v, layout) =>
            `At a scale of ${plain(scaleOf(layout, v))} the board is not used: there is room for more.`,
        ),
        criterion(
          'near',
          'The pen reaches its near edge',
          'pantograph.reach',
          (v, layout) =>
            `With the elbow at 30° the pen is ${length(v, layOut(layout, board(v))?.nearest)} from the fixed point; the near edge lies at ${length(v, layout.from)}.`,
        ),
        criterion('far', 'The pen reaches its far corners', 'pantograph.reach', (v, layout) => {
          const out = layOut(layout, board(v));
          return `The far corner lies ${length(v, out?.farCorner)} out, and with the elbow at 150° the pen reaches ${length(v, out?.farthest)}.`;
        }),
        criterion(
          'clear',
          'Drawing and copy stay clear of each other',
          'pantograph.reach',
          (v, layout) =>
            `The sheets stay ${said(inUnits(v.units, 20, 3 / 4), v.units)} apart from ${length(v, layOut(layout, board(v))?.clearFrom)} on; the near edge lies at ${length(v, layout.from)}.`,
        ),
      ],
      slips: [
        slip(
          'segment-ratio',
          (layout, v) =>
            fitsBoard(scaleOf(layout, v) - 1, board(v)) && !fitsBoard(scaleOf(layout, v), board(v)),
          (v, layout) =>
            `You divided the bar into 1 and k. This copies at ${plain(scaleOf(layout, v))} and runs over the board.`,
        ),
        slip(
          'from-the-elbow',
          (layout, v) => {
            const scale = scaleOf(layout, v);
            return fitsBoard(scale / (scale - 1), board(v)) && !fitsBoard(scale, board(v));
          },
          () => 'Count the holes from the fixed pin: you counted them from the elbow.',
        ),
        slip(
          'larger-size',
          (layout, v) =>
            scaleOf(layout, v) > largestScale(board(v)) + 1e-9 &&
            scaleOf(layout, v) <= tooLargeScale(board(v)),
          () => 'It fits one way only: the smaller of W ÷ w and H ÷ h decides.',
        ),
        slip(
          'full-stretch',
          (layout, v) => {
            const out = layOut(layout, board(v));
            return out !== null && out.farCorner > out.farthest && out.farCorner <= 2 * layout.bar;
          },
          () => 'You reckoned with the elbow straight. Beyond 150° the corners shake.',
        ),
        slip(
          'sheets-overlap',
          (layout, v) => {
            const out = layOut(layout, board(v));
            return out !== null && layout.from < out.clearFrom - 1e-9;
          },
          (v, layout) =>
            `The copy would begin on top of the drawing, for both lie on one line. Move the fixed point ${length(v, (layOut(layout, board(v))?.clearFrom ?? NaN) - layout.from)} farther off.`,
        ),
      ],
      answer: (v) => settingOf(answerOf(v)),
      echo: (setting, { units }) => {
        const { bar, hole, from } = layoutOf(setting);
        return `bars of ${said(bar, units)}, hole ${hole}, near edge at ${said(from, units)}`;
      },
    },
  ],
  hints: ({ givens: g, units }) => [
    'The scale from the board, the hole from the scale, the bars from the reach: in this order.',
    'k = L ÷ b, at most W ÷ w and H ÷ h. Near edge at least 2L sin 15° and k(h + gap) ÷ (k − 1); far corner at most 2L sin 75°.',
    `Largest scale: the smaller of ${said(g.boardWidth, units)} ÷ ${said(g.signWidth, units)} and ${said(g.boardHeight, units)} ÷ ${said(g.signHeight, units)}.`,
  ],
  solution(variant) {
    const { units } = variant;
    const layout = answerOf(variant);
    const out = layOut(layout, board(variant));
    return [
      `The board allows a scale of ${plain(largestScale(board(variant)))} at most, and ${plain(0.92 * largestScale(board(variant)))} is large enough.`,
      `Bars of ${said(layout.bar, units)} with hole ${layout.hole}, ${said(layout.hole * board(variant).pitch, units)} from the fixed pin, copy at ${plain(out?.scale ?? NaN)}.`,
      `The near edge lies at ${said(layout.from, units)}: the pen works from ${length(variant, out?.nearest)} on, and the sheets are clear from ${length(variant, out?.clearFrom)} on.`,
      `The far corner lies ${length(variant, out?.farCorner)} out; the pen reaches ${length(variant, out?.farthest)}.`,
    ];
  },
});

function gridOf(units: Variant['units']): number {
  return inUnits(units, 10, 1 / 2);
}

function boardOf(drawn: Drawn, units: Variant['units']): Board {
  return { ...drawn, pitch: inUnits(units, 25, 1), clear: inUnits(units, 20, 3 / 4) };
}

function board({ givens, units }: Variant<Drawn>): Board {
  return boardOf(givens, units);
}

function answerOf(variant: Variant<Drawn>): Layout {
  const { units } = variant;
  const layout = firstLayout(stock[units], board(variant), gridOf(units));
  if (layout === null) throw new RangeError('sign-for-the-board: no bar of the stock answers');
  return layout;
}

function layoutOf(setting: Setting): Layout {
  return { bar: Number(setting.bar), hole: Number(setting.hole), from: Number(setting.from) };
}

function settingOf({ bar, hole, from }: Layout): Setting {
  return { bar, hole, from };
}

/** The scale, NaN where the hole is not on the bar: then nothing is met and no slip is seen. */
function scaleOf(layout: Layout, variant: Variant<Drawn>): number {
  return layOut(layout, board(variant))?.scale ?? NaN;
}

function length({ units }: Variant<Drawn>, value: number | undefined): string {
  return said(value ?? NaN, units);
}

function criterion(
  key: Demand,
  label: string,
  skill: string,
  message: (variant: Variant<Drawn>, layout: Layout) => string,
): Criterion<Drawn> {
  return {
    key,
    skills: [skill],
    label: () => label,
    met: (setting, variant) => demandsMet(layoutOf(setting), board(variant))[key],
    message: (setting, variant) =>
      layOut(layoutOf(setting), board(variant)) === null
        ? 'There is no such hole on this bar.'
        : message(variant, layoutOf(setting)),
  };
}

function slip(
  id: string,
  seen: (layout: Layout, variant: Variant<Drawn>) => boolean,
  advice: (variant: Variant<Drawn>, layout: Layout) => string,
): SettingSlip<Drawn> {
  const holds = (setting: Setting, variant: Variant<Drawn>) => seen(layoutOf(setting), variant);
  return {
    id,
    holds,
    advice: (variant, setting) => advice(variant, layoutOf(setting)),
    example(variant) {
      const earlier = slipsBefore(id);
      const found = candidates(variant).find(
        (layout) =>
          seen(layout, variant) &&
          !Object.values(demandsMet(layout, board(variant))).every(Boolean) &&
          earlier.every((each) => !each.holds(settingOf(layout), variant)),
      );
      return found === undefined ? null : settingOf(found);
    },
  };
}

/** The slips that would be recognised first. */
function slipsBefore(id: string): readonly SettingSlip[] {
  const [part] = signForTheBoard.parts;
  const slips = part?.kind === 'design' ? part.slips : [];
  return slips.slice(
    0,
    slips.findIndex((each) => each.id === id),
  );
}

/** Layouts near the right one: every hole of every bar, with a few places of the copy. */
function candidates(variant: Variant<Drawn>): readonly Layout[] {
  const { units } = variant;
  const answer = answerOf(variant);
  return stock[units].flatMap((bar) => {
    const holes = Math.ceil(bar / board(variant).pitch) - 1;
    return Array.from({ length: holes }, (_, index) => index + 1).flatMap((hole) =>
      [answer.from, 0, bar, 1.3 * bar].map((from) => ({ bar, hole, from })),
    );
  });
}
