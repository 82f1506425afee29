import type { BenchSpec } from '@/lib/scene/bench-spec';
import { staticPicture } from '@/lib/scene/static-picture';
import './drawing.css';

interface StaticPictureProps {
  readonly spec: BenchSpec;
  /** Leaves out whatever a prediction asks for. */
  readonly locked?: boolean;
}

/** A bench as a picture that needs no script: for thumbnails, paper and options. */
export function StaticPicture({ spec, locked = false }: StaticPictureProps) {
  return (
    <div
      className="drawing-box"
      dangerouslySetInnerHTML={{ __html: staticPicture(spec, locked) }}
    />
  );
}
