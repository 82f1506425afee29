import type { PegView } from '@/lib/schemas/round';
import { PegRail } from './peg-rail';
import { pegWords } from './peg-words';

/** Every skill on a line of its own: its peg, its name, and in words how it stands and why. */
export function PegList({ pegs }: Readonly<{ pegs: readonly PegView[] }>) {
  return (
    <ul className="divide-y divide-rule border-y border-rule">
      {pegs.map((peg) => (
        <li key={peg.skill} className="flex items-center gap-4 py-2">
          <PegRail pegs={[peg]} />
          <span className="min-w-0">
            <span className="block font-semibold">{peg.name}</span>
            <span className="block text-[0.9375rem] text-pencil">
              {peg.detail || pegWords[peg.state]}
            </span>
          </span>
        </li>
      ))}
    </ul>
  );
}
