import '@/components/bench/drawing.css';
import type { BenchSpec } from '@/lib/scene/bench-spec';
import { thumbnail } from '@/lib/scene/thumbnail';

/**
 * A bench as it stands at its start, for a list in which the words beside it say what it is: hidden
 * from screen readers, so that a list is not read twice.
 */
export function BenchPicture({ spec }: Readonly<{ spec: BenchSpec }>) {
  return (
    <div
      className="drawing-box [&_.drawing]:overflow-visible"
      // Our own drawing, made from numbers alone.
      dangerouslySetInnerHTML={{ __html: thumbnail(spec) }}
    />
  );
}
