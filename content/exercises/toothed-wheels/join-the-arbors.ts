import { defineExercise, type Setting, type Variant } from '@/lib/marking/definition';
import { centreDistance } from '@/lib/kinematics/gear/mesh';
import { simpleTrain } from '@/lib/kinematics/train/ratio';
import { fromMillimetres } from '@/lib/quantities/units';
import { givenLength, givenNumber, plain, said } from '../sizes';
import { givenToothSize, givenWheel, moduleInMillimetres } from './wheels';

type Drawn = {
  readonly toothSize: number;
  readonly first: number;
  /** Turns of the crank for one of the gull. */
  readonly ratio: number;
  readonly sense: 'with' | 'against';
  readonly idlers: number;
  readonly idlerTeeth: number;
  /** Between the posts, mm. */
  readonly distance: number;
};

interface Row {
  readonly last: number;
  readonly idlers: number;
  readonly idlerTeeth: number;
}

/** Setting: choose the last wheel and the idlers that join two fixed arbors. */
export const joinTheArbors = defineExercise<Drawn>({
  id: 'join-the-arbors',
  version: 1,
  kind: 'setting',
  lesson: 'train-of-toothed-wheels',
  title: 'Join the arbors',
  skills: ['train.idler', 'train.centres', 'train.ratio', 'train.direction'],
  draw(source, units) {
    const toothSize = source.pick(units === 'metric' ? [3, 4, 5] : [8, 6, 5]);
    const first = source.whole(12, 24);
    const ratio = source.pick([1.5, 2, 2.5, 3, 4]);
    const idlers = source.whole(1, 2);
    const idlerTeeth = source.whole(12, 30);
    const last = first * ratio;
    if (!Number.isInteger(last) || last > 72 || idlerTeeth === first) return null;
    const toothModule = moduleInMillimetres(toothSize, units);
    const distance = reachOf(toothModule, first, { last, idlers, idlerTeeth });
    const { sense } = simpleTrain([first, ...Array(idlers).fill(idlerTeeth), last]);
    return { toothSize, first, ratio, sense, idlers, idlerTeeth, distance };
  },
  prompt: ({ givens: g }) =>
    `The crank’s wheel z₁ stands on its post, the gull’s arbor A away. Set the gull’s wheel z, the number of idlers in line between them (two are alike) and their teeth, so that all wheels mesh and the gull turns once for ${ratioSaid(g.ratio)} turns of the crank, ${g.sense} it.`,
  givens: ({ givens: g, units }) => [
    givenToothSize(g.toothSize, units),
    givenWheel('z₁', 'crank’s wheel', g.first),
    givenNumber('i', 'turns of the crank for one of the gull', ratioSaid(g.ratio)),
    givenLength(
      'A',
      'between the arbors',
      fromMillimetres(g.distance, units),
      units,
      units === 'metric' ? undefined : 3,
    ),
  ],
  parts: [
    {
      kind: 'setting',
      key: 'train',
      skills: ['train.idler', 'train.centres', 'train.ratio', 'train.direction'],
      label: () => 'The train between the posts',
      controls: () => [
        { name: 'lastTeeth', kind: 'count', least: 8, most: 96 },
        { name: 'idlers', kind: 'count', least: 0, most: 4 },
        { name: 'idlerTeeth', kind: 'count', least: 8, most: 96 },
      ],
      criteria: [
        {
          key: 'last',
          skills: ['train.ratio'],
          label: () => 'The gull’s wheel gives the ratio',
          met: (setting, { givens: g }) => rowOf(setting).last === g.ratio * g.first,
          message: (setting, { givens: g }) =>
            `With ${rowOf(setting).last} teeth the gull turns once for ${plain(rowOf(setting).last / g.first)} turns of the crank.`,
        },
        {
          key: 'idlers',
          skills: ['train.direction', 'train.idler'],
          label: () => 'The number of idlers gives the sense',
          met: (setting, { givens: g }) => rowOf(setting).idlers === g.idlers,
          message: (setting, { givens: g }) =>
            `With ${rowOf(setting).idlers} between, ${rowOf(setting).idlers + 1} meshes turn the sense round; the gull is to turn ${g.sense} the crank, and has to be reached.`,
        },
        {
          key: 'reach',
          skills: ['train.centres', 'train.idler'],
          label: () => 'The idlers fill the distance',
          met: (setting, { givens: g }) => rowOf(setting).idlerTeeth === g.idlerTeeth,
          message: (setting, variant) => gapSaid(setting, variant),
        },
      ],
      slips: [
        {
          id: 'idler-counted',
          holds: (setting, { givens: g }) =>
            rowOf(setting).last === g.ratio * rowOf(setting).idlerTeeth &&
            rowOf(setting).last !== g.ratio * g.first,
          example: ({ givens: g }) =>
            wheel(g.ratio * g.idlerTeeth, (last) => set({ ...right(g), last })),
          advice: ({ givens: g }) =>
            `The gull’s wheel answers to the crank’s wheel of ${g.first}, whatever stands between.`,
        },
        {
          id: 'upside-down',
          holds: (setting, { givens: g }) => rowOf(setting).last * g.ratio === g.first,
          example: ({ givens: g }) =>
            wheel(g.first / g.ratio, (last) => set({ ...right(g), last })),
          advice: ({ givens: g }) => `Slower needs more teeth: more than the crank’s ${g.first}.`,
        },
        {
          id: 'wrong-sense',
          holds: (setting, v) =>
            paceRight(setting, v) && !senseRight(setting, v) && gap(setting, v) === 0,
          example: ({ givens: g }) => otherParity(g),
          advice: () => 'The right pace, and it meshes; but the wrong way: one idler more or less.',
        },
        {
          id: 'radius-for-diameter',
          holds: (setting, v) =>
            paceRight(setting, v) &&
            rowOf(setting).idlers === v.givens.idlers &&
            rowOf(setting).idlerTeeth === 2 * v.givens.idlerTeeth,
          example: ({ givens: g }) => set({ ...right(g), idlerTeeth: 2 * g.idlerTeeth }),
          advice: () =>
            'You filled the gap with one radius of each idler; its whole diameter lies there.',
        },
        {
          id: 'does-not-reach',
          holds: (setting, v) =>
            paceRight(setting, v) && senseRight(setting, v) && gap(setting, v) !== 0,
          example: ({ givens: g }) => set({ ...right(g), idlerTeeth: g.idlerTeeth + 1 }),
          advice: (v, setting) => `Pace and sense are right. ${gapSaid(setting, v)}`,
        },
      ],
      answer: ({ givens: g }) => set(right(g)),
      echo: (setting) => {
        const { last, idlers, idlerTeeth } = rowOf(setting);
        const between = idlers === 0 ? 'none between' : `${idlers} between of ${idlerTeeth} teeth`;
        return `gull’s wheel ${last} teeth, ${between}`;
      },
    },
  ],
  figure: ({ givens: g, units }) => ({
    bench: 'train',
    layout: 'between-posts',
    module: moduleInMillimetres(g.toothSize, units),
    posts: { distance: g.distance, firstTeeth: g.first },
    // No draw asks for any of these three.
    lastTeeth: 12,
    idlers: 0,
    idlerTeeth: 60,
    drive: 0,
    hide: ['ratio', 'turns'],
    controls: ['lastTeeth', 'idlers', 'idlerTeeth'],
    units,
  }),
  hints: ({ givens: g, units }) => [
    'Settle the ratio first, then the sense, and only then the reach.',
    'z = i · z₁. One idler: with the crank; none or two: against it. A = m · (z₁ + z) ÷ 2 + (idlers) · m · (their teeth).',
    `z = ${ratioSaid(g.ratio)} × ${g.first}; left over for the idlers: ${said(fromMillimetres(g.distance, units), units, 3)} − ${units === 'metric' ? `${g.toothSize} mm × (${g.first} + z) ÷ 2` : `(${g.first} + z) ÷ (2 × ${g.toothSize}) in`}.`,
  ],
  solution(variant) {
    const { givens: g, units } = variant;
    const toothModule = moduleInMillimetres(g.toothSize, units);
    const ends = centreDistance({
      module: toothModule,
      firstTeeth: g.first,
      secondTeeth: right(g).last,
    });
    const own = (millimetres: number) => said(fromMillimetres(millimetres, units), units, 3);
    return [
      `The ratio: z = ${ratioSaid(g.ratio)} × ${g.first} = ${right(g).last} teeth.`,
      `The sense: ${g.sense} the crank takes ${g.idlers + 1} meshes, so ${g.idlers === 1 ? 'one idler' : 'two idlers'}.`,
      `The reach: ${own(g.distance)} − ${own(ends)} = ${own(g.distance - ends)} is left for ${g.idlers === 1 ? 'one diameter' : 'two diameters'}: ${g.idlerTeeth} teeth${g.idlers === 1 ? '' : ' each'}.`,
    ];
  },
});

function right(g: Drawn): Row {
  return { last: g.ratio * g.first, idlers: g.idlers, idlerTeeth: g.idlerTeeth };
}

function set({ last, idlers, idlerTeeth }: Row): Setting {
  return { lastTeeth: last, idlers, idlerTeeth };
}

function rowOf(setting: Setting): Row {
  return {
    last: Number(setting.lastTeeth),
    idlers: Number(setting.idlers),
    idlerTeeth: Number(setting.idlerTeeth),
  };
}

/** From the first arbor to the last, mm. */
function reachOf(toothModule: number, first: number, { last, idlers, idlerTeeth }: Row): number {
  const wheels = [first, ...Array<number>(idlers).fill(idlerTeeth), last];
  return wheels.slice(1).reduce(
    (sum, teeth, index) =>
      sum +
      centreDistance({
        module: toothModule,
        firstTeeth: wheels[index] ?? teeth,
        secondTeeth: teeth,
      }),
    0,
  );
}

/** What stays open between the rims, mm; less than nothing where they overlap. */
function gap(setting: Setting, { givens: g, units }: Variant<Drawn>): number {
  const open =
    g.distance - reachOf(moduleInMillimetres(g.toothSize, units), g.first, rowOf(setting));
  return Math.abs(open) < 1e-6 ? 0 : open;
}

function gapSaid(setting: Setting, variant: Variant<Drawn>): string {
  const open = gap(setting, variant);
  const amount = said(
    fromMillimetres(Math.abs(open), variant.units),
    variant.units,
    variant.units === 'metric' ? 1 : 3,
  );
  if (open === 0)
    return 'This row fills the distance, but not with the pace and the sense asked for.';
  return open > 0
    ? `${amount} still stay open between the pitch circles.`
    : `The wheels are ${amount} too large to be put in.`;
}

function paceRight(setting: Setting, { givens: g }: Variant<Drawn>): boolean {
  return rowOf(setting).last === g.ratio * g.first;
}

function senseRight(setting: Setting, { givens: g }: Variant<Drawn>): boolean {
  return rowOf(setting).idlers % 2 === g.idlers % 2;
}

/** A row that reaches with the other number of idlers, if whole wheels allow it. */
function otherParity(g: Drawn): Setting | null {
  const idlers = g.idlers === 1 ? 2 : 1;
  return wheel((g.idlerTeeth * g.idlers) / idlers, (idlerTeeth) =>
    set({ ...right(g), idlers, idlerTeeth }),
  );
}

/** The setting with a wheel of so many teeth, where the bench has such a wheel. */
function wheel(teeth: number, make: (teeth: number) => Setting): Setting | null {
  return Number.isInteger(teeth) && teeth >= 12 && teeth <= 96 ? make(teeth) : null;
}

function ratioSaid(ratio: number): string {
  return Number.isInteger(ratio) ? `${ratio}` : `${Math.floor(ratio)} 1/2`;
}
