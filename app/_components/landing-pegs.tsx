import { PegRail } from '@/components/progress/peg-rail';
import { pegWords, type PegState } from '@/components/progress/peg-words';
import { pegRule } from '@/lib/retention/peg';

const states: readonly { readonly state: PegState; readonly meaning: string }[] = [
  { state: 'open', meaning: 'nothing tried yet' },
  { state: 'started', meaning: 'on the way, still standing proud' },
  { state: 'home', meaning: 'you can do this, and it has lasted' },
  { state: 'lifting', meaning: 'some time ago now: due again' },
];

/** What the pegs mean, one of each, and the rule by which one goes home. */
export function LandingPegs() {
  return (
    <section className="mt-20">
      <h2 className="mb-3">Skills are pegs</h2>
      <p className="mb-6 max-w-measure">{pegRule}</p>
      <ul className="grid gap-x-8 gap-y-4 sm:grid-cols-2 lg:grid-cols-4">
        {states.map(({ state, meaning }) => (
          <li key={state} className="flex items-center gap-4">
            <PegRail pegs={[{ skill: state, name: 'A skill', state }]} />
            <span>
              <span className="block font-semibold first-letter:uppercase">{pegWords[state]}</span>
              <span className="block text-[0.9375rem] text-pencil">{meaning}</span>
            </span>
          </li>
        ))}
      </ul>
    </section>
  );
}
