import type { PegView } from '@/lib/schemas/round';
import { BOARD_TOP, PegShape } from './peg-shape';
import { pegSummary, pegWords } from './peg-words';

const PITCH = 26;
const BOARD = 19;
const HEIGHT = BOARD_TOP + BOARD + 1;

/** What the rail needs to know of a peg. */
export type Peg = Pick<PegView, 'skill' | 'name' | 'state'>;

interface PegRailProps {
  readonly pegs: readonly Peg[];
  /** Writes the summary beside the drawing; without it only screen readers get it. */
  readonly words?: boolean;
}

/**
 * Skills as a board seen from the side, with a peg in each hole: open hole, peg started, peg home,
 * peg lifting. Drawn on the server as SVG, with the same said in words.
 */
export function PegRail({ pegs, words = false }: PegRailProps) {
  const width = Math.max(1, pegs.length) * PITCH + 6;
  const summary = pegSummary(pegs.map((peg) => peg.state));
  const each = pegs.map((peg) => `${peg.name}: ${pegWords[peg.state]}`).join('; ');
  return (
    <span className="inline-flex max-w-full flex-wrap items-center gap-x-3 gap-y-1">
      <svg
        width={width}
        height={HEIGHT}
        viewBox={`0 0 ${width} ${HEIGHT}`}
        role="img"
        aria-label={`${summary}. ${each}`}
        className="h-auto max-w-full shrink-0"
      >
        <rect
          x="0.5"
          y={BOARD_TOP}
          width={width - 1}
          height={BOARD}
          className="fill-board stroke-pencil"
        />
        {pegs.map((peg, index) => (
          <g key={peg.skill} data-peg={peg.state}>
            <title>{`${peg.name}: ${pegWords[peg.state]}`}</title>
            <PegShape x={3 + PITCH * (index + 0.5)} state={peg.state} />
          </g>
        ))}
      </svg>
      {words ? <span className="text-base text-pencil">{summary}</span> : null}
    </span>
  );
}
