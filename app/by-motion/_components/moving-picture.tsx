'use client';

import { useEffect, useRef, useState, type ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import type { BenchSpec } from '@/lib/scene/bench-spec';
import { driveAfter, driveAfterStep } from './moving-drive';

interface MovingPictureProps {
  readonly spec: BenchSpec;
  /** Says which drawing the buttons move. */
  readonly name: string;
  /** The drawing as the server made it; it stands until something moves. */
  readonly children: ReactNode;
}

/** A small drawing that turns when asked, steps when asked, and rests while nobody sees it. */
export function MovingPicture({ spec, name, children }: MovingPictureProps) {
  const [picture, setPicture] = useState<string | null>(null);
  const [running, setRunning] = useState(false);
  const drive = useRef(spec.drive ?? 0);
  const verb = spec.bench === 'pantograph' ? 'Lead' : 'Turn';
  const frame = useRef<HTMLDivElement>(null);

  const draw = async (value: number) => {
    const { thumbnail } = await import('@/lib/scene/thumbnail');
    drive.current = value;
    setPicture(thumbnail(spec, value));
  };

  useEffect(() => {
    if (!running) return;
    let asked = 0;
    let stopped = false;
    void import('@/lib/scene/thumbnail').then(({ thumbnailAt }) => {
      const picture = thumbnailAt(spec);
      const from = drive.current;
      let start: number | null = null;
      const tick = (now: number) => {
        start ??= now;
        drive.current = driveAfter(spec, from, (now - start) / 1000);
        setPicture(picture(drive.current));
        asked = requestAnimationFrame(tick);
      };
      if (!stopped) asked = requestAnimationFrame(tick);
    });
    const watcher = new IntersectionObserver(([entry]) => {
      if (entry && !entry.isIntersecting) setRunning(false);
    });
    if (frame.current) watcher.observe(frame.current);
    return () => {
      stopped = true;
      cancelAnimationFrame(asked);
      watcher.disconnect();
    };
  }, [running, spec]);

  return (
    <div ref={frame}>
      <div className="border border-rule px-3 py-4">
        {picture === null ? (
          children
        ) : (
          <div
            className="drawing-box [&_.drawing]:overflow-visible"
            // Our own drawing, made from numbers alone.
            dangerouslySetInnerHTML={{ __html: picture }}
          />
        )}
      </div>
      <div className="mt-2 flex gap-2 print:hidden">
        <Button
          variant="quiet"
          className="motion-reduce:hidden"
          aria-label={`${running ? 'Stop' : verb}: ${name}`}
          onClick={() => setRunning(!running)}
        >
          {running ? 'Stop' : verb}
        </Button>
        <Button
          variant="quiet"
          aria-label={`Step: ${name}`}
          onClick={() => {
            setRunning(false);
            void draw(driveAfterStep(spec, drive.current));
          }}
        >
          Step
        </Button>
      </div>
    </div>
  );
}
