import { requireSize } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';

/** Two sprockets and a roller chain. */
export interface ChainSpec {
  readonly pitch: number;
  readonly firstTeeth: number;
  readonly secondTeeth: number;
}

/** Lengths of a chain. */
export interface ChainLength {
  /** In pitches, by the handbook's formula; rarely whole. */
  readonly pitches: number;
  /** The next even number of links, which needs no cranked link. */
  readonly links: number;
  /** Centres that suit those links. */
  readonly centreDistance: number;
}

export type CentresForLinks =
  | { readonly outcome: 'centres'; readonly distance: number }
  /** So few links do not go round both sprockets: `lacking` more are needed, at the least. */
  | { readonly outcome: 'too-few-links'; readonly lacking: number };

/** Pitches that miss a whole number by less than this are whole. */
const wholeTolerance = 1e-9;

/**
 * Pitch diameter of a sprocket, on which the chain's joints lie as corners of a polygon.
 *
 * @throws RangeError for nonsense.
 * Source: p/sin(180°/z); case BL-CH-01.
 * @example sprocketDiameter(12.7, 17) // → 69.1158276272
 */
export function sprocketDiameter(pitch: number, teeth: number): number {
  requireSize('sprocketDiameter', 'pitch', pitch);
  return pitch / Math.sin(Math.PI / requireCount('sprocketDiameter', 'teeth', teeth, 3));
}

/**
 * Length of a chain round two sprockets, in pitches, and the even number of links to take.
 *
 * @throws RangeError for nonsense.
 * Source: Machinery's Handbook: 2C/p + (z₁ + z₂)/2 + p(z₂ − z₁)²/4π²C; case BL-CH-01.
 * @example chainLength({ pitch: 12.7, firstTeeth: 17, secondTeeth: 51 }, 500).links // → 114
 */
export function chainLength(chain: ChainSpec, centreDistance: number): ChainLength {
  const { pitch, half, spread } = complete('chainLength', chain);
  const distance = requireSize('chainLength', 'centreDistance', centreDistance);
  const pitches = (2 * distance) / pitch + half + (spread * pitch) / distance;
  const links = 2 * Math.ceil(pitches / 2 - wholeTolerance);
  const fitting = centresForLinks(chain, links);
  return {
    pitches,
    links,
    centreDistance: fitting.outcome === 'centres' ? fitting.distance : distance,
  };
}

/**
 * How far apart two sprockets stand for a number of links: the inverse of the handbook's formula.
 *
 * @throws RangeError for nonsense.
 * @example centresForLinks({ pitch: 12.7, firstTeeth: 17, secondTeeth: 51 }, 114) // → { outcome: 'centres', distance: 503.308177682 }
 */
export function centresForLinks(chain: ChainSpec, links: number): CentresForLinks {
  const { pitch, half, spread } = complete('centresForLinks', chain);
  const straight = requireCount('centresForLinks', 'links', links) - half;
  // The straight part must be twice the root of twice the spread for the two runs to meet at all.
  const least = Math.sqrt(8 * spread);
  if (straight <= 0 || straight < least) {
    return { outcome: 'too-few-links', lacking: Math.ceil(least - straight) };
  }
  const root = Math.sqrt((straight - least) * (straight + least));
  return { outcome: 'centres', distance: (pitch * (straight + root)) / 4 };
}

/**
 * Pitch diameter of a pulley for a toothed belt, whose pitch line is an arc.
 *
 * @throws RangeError for nonsense.
 * Source: p·z/π; case BL-TM-01.
 * @example toothedPulleyDiameter(5, 40) // → 63.6619772368
 */
export function toothedPulleyDiameter(pitch: number, teeth: number): number {
  requireSize('toothedPulleyDiameter', 'pitch', pitch);
  return (pitch * requireCount('toothedPulleyDiameter', 'teeth', teeth, 3)) / Math.PI;
}

function complete(caller: string, chain: ChainSpec) {
  const first = requireCount(caller, 'firstTeeth', chain.firstTeeth, 3);
  const second = requireCount(caller, 'secondTeeth', chain.secondTeeth, 3);
  return {
    pitch: requireSize(caller, 'pitch', chain.pitch),
    half: (first + second) / 2,
    spread: ((second - first) / (2 * Math.PI)) ** 2,
  };
}
