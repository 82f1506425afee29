'use client';

import { Bench } from '@/components/bench/bench';
import type { BenchSpec } from '@/lib/scene/bench-spec';
import { useBenchLock } from './bench-lock';

interface LessonBenchProps {
  readonly spec: BenchSpec;
  readonly title: string;
}

/** The bench of a lesson: a picture until the reader has made a guess, then a thing to drive. */
export function LessonBench({ spec, title }: LessonBenchProps) {
  const { locked } = useBenchLock();
  return (
    <div className="my-6 break-inside-avoid">
      <Bench
        spec={spec}
        title={title}
        locked={locked}
        lockedNotice="Make your guess first; then it turns."
      />
    </div>
  );
}
