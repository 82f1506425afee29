import { Bench } from '@/components/bench/bench';
import { ButtonLink } from '@/components/ui/button';
import { TickedRule } from '@/components/ui/page-heading';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import { LandingSteps } from './landing-steps';
import { landingTrain } from './pictures';

interface LandingHeroProps {
  /** Where the first lesson is read. */
  readonly firstLesson: string;
  readonly signedIn: boolean;
  readonly units: UnitSystem;
}

/** The first look: what Hornbeam is for, one way in, a mechanism to turn at once, and how it goes. */
export function LandingHero({ firstLesson, signedIn, units }: LandingHeroProps) {
  return (
    <div className="grid items-start gap-x-12 gap-y-6 lg:grid-cols-[1fr_32rem] lg:grid-rows-[auto_1fr]">
      <div>
        <h1 className="mb-4 text-[clamp(2.5rem,1.5rem+4.5vw,3.75rem)] leading-[1.08]">
          See it turn.
          <br />
          Then cut it.
        </h1>
        <TickedRule />
        <p className="mt-7 mb-6 max-w-measure text-xl text-pencil">
          Hornbeam teaches woodworkers the mechanisms behind moving things: toothed wheels, ovals,
          copies drawn larger. Turn them by hand, work out the sizes, be told where an answer went
          wrong, and go to the bench with a drawing that runs.
        </p>
        <div className="flex flex-wrap gap-3">
          <ButtonLink href={firstLesson}>Open the first lesson</ButtonLink>
          <ButtonLink href={signedIn ? '/home' : '/sign-in'} variant="secondary">
            {signedIn ? 'Go to your own page' : 'Sign in'}
          </ButtonLink>
        </div>
      </div>
      <div className="min-w-0 lg:col-start-2 lg:row-span-2 lg:row-start-1">
        <Bench spec={landingTrain(units)} title="A train of toothed wheels" />
      </div>
      <LandingSteps />
    </div>
  );
}
