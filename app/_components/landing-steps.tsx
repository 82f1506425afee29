import type { ReactNode } from 'react';

interface StepProps {
  readonly number: number;
  readonly title: string;
  readonly children: ReactNode;
}

function Step({ number, title, children }: StepProps) {
  return (
    <li className="border-t border-ink pt-3">
      <p className="mb-1 flex items-baseline gap-3">
        <span className="font-mono text-base text-brass">{number}</span>
        <span className="font-heading text-xl font-semibold">{title}</span>
      </p>
      <p className="max-w-measure text-pencil">{children}</p>
    </li>
  );
}

/** How a lesson goes, in four steps. */
export function LandingSteps() {
  return (
    <section>
      <h2 className="mb-5">How it goes</h2>
      <ol className="grid gap-x-8 gap-y-7 sm:grid-cols-2">
        <Step number={1} title="Guess">
          Say what you think will happen. A guess you have written down is one you learn from.
        </Step>
        <Step number={2} title="Turn it">
          Take the crank, drag a pin, count the teeth. The drawing is computed; what jams on the
          screen jams in wood.
        </Step>
        <Step number={3} title="Answer">
          With numbers of your own, as you would write them in the shop. A wrong answer is told why,
          and by how much.
        </Step>
        <Step number={4} title="Cut it">
          Every lesson ends at the bench: which timber, which way the grain, what clearance, and
          what to keep your fingers out of.
        </Step>
      </ol>
    </section>
  );
}
