import { Notice } from '@/components/ui/notice';
import { arborTurns } from '@/lib/kinematics/train/ratio';
import { writeNumber } from '@/lib/quantities/write';
import { landingPairs, landingWords } from './pictures';

const CRANK = 12;

/** What being told looks like: one answer, wrong in a way we know, and then right. */
export function LandingAnswer() {
  const turns = arborTurns(landingPairs, CRANK).map((value) => writeNumber(Math.abs(value)));
  const [crank = '', middle = '', last = ''] = turns;
  return (
    <section className="mt-20 grid items-center gap-8 lg:grid-cols-[1fr_1.2fr] lg:gap-14">
      <div>
        <h2 className="mb-3">A wrong answer is worth something</h2>
        <p className="mb-3 max-w-measure">
          Most wrong answers are wrong in a way that somebody has been wrong before. Hornbeam knows
          those turnings: it tells you where yours left the road, with your own numbers, and leaves
          the rest to you.
        </p>
        <p className="max-w-measure text-pencil">
          Write as you would in the shop: millimetres or inches, fractions, a decimal point or a
          comma.
        </p>
      </div>
      <figure className="border-l-[3px] border-ink pl-5">
        <figcaption className="sr-only">An exercise, answered wrongly and then rightly</figcaption>
        <p className="font-heading text-xl font-semibold">How far does the last wheel go?</p>
        <p className="mb-4 max-w-measure">
          The train is {landingWords}. A child gives the crank {crank} turns. How many does the last
          wheel make?
        </p>
        <GivenAnswer answer={middle} />
        <Notice tone="wrong" title="Not yet.">
          {middle} turns is what the middle arbor makes. The small wheel beside it drives one more:
          go on to the last.
        </Notice>
        <GivenAnswer answer={last} />
        <Notice tone="right" title="Right.">
          {crank} turns in, {last} out, and with the crank: two meshes turn it round twice.
        </Notice>
      </figure>
    </section>
  );
}

function GivenAnswer({ answer }: Readonly<{ answer: string }>) {
  return (
    <p className="mb-2 flex items-center gap-3">
      <span className="text-pencil">Answer</span>
      <span className="inline-block min-w-24 rounded border border-pencil px-3 py-1 font-mono">
        {answer}
      </span>
      <span className="text-pencil">turns</span>
    </p>
  );
}
