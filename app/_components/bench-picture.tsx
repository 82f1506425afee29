import { StaticPicture } from '@/components/bench/static-picture';
import type { BenchSpec } from '@/lib/scene/bench-spec';

/**
 * A bench as it stands at its start, for a list in which the words beside it say what it is: hidden
 * from screen readers, so that a list is not read twice.
 */
export function BenchPicture({ spec }: Readonly<{ spec: BenchSpec }>) {
  return (
    <div aria-hidden="true" className="max-h-72 overflow-hidden">
      <StaticPicture spec={spec} />
    </div>
  );
}
