import type { PegState } from './peg-words';

/** The board's top edge in the drawing of a rail; a peg at home ends here. Pixels. */
export const BOARD_TOP = 13;
/** The depth of a hole and the height of a peg. Pixels. */
const HOLE = 15;

function Hole({ x }: Readonly<{ x: number }>) {
  return (
    <rect
      x={x - 6}
      y={BOARD_TOP}
      width="12"
      height={HOLE}
      className="fill-paper stroke-pencil"
      strokeDasharray="2.5 2"
    />
  );
}

/**
 * One peg in its hole, seen from the side of the board; its height tells its state.
 * `x` is the middle of the hole, in the rail's pixels.
 */
export function PegShape({ x, state }: Readonly<{ x: number; state: PegState }>) {
  if (state === 'open') return <Hole x={x} />;
  if (state === 'home') {
    return (
      <>
        <rect x={x - 5.5} y={BOARD_TOP} width="11" height={HOLE} rx="1" className="fill-leaf" />
        <path
          d={`M${x - 3} ${BOARD_TOP + 7.5} l2.4 2.6 l3.8 -5`}
          className="fill-transparent stroke-paper"
          strokeWidth="1.8"
        />
      </>
    );
  }
  if (state === 'started') {
    return (
      <>
        <Hole x={x} />
        <rect
          x={x - 5}
          y={1}
          width="10"
          height="20"
          rx="1"
          className="fill-brass-fill stroke-brass"
        />
      </>
    );
  }
  return (
    <>
      <Hole x={x} />
      <rect
        x={x - 5}
        y={6}
        width="10"
        height="18"
        rx="1"
        className="fill-paper stroke-plum"
        strokeWidth="1.8"
      />
      <path
        d={`M${x} 19 v-7 m-2.6 2.8 l2.6 -3 l2.6 3`}
        className="fill-transparent stroke-plum"
        strokeWidth="1.6"
      />
    </>
  );
}
