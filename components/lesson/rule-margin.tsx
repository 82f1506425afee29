'use client';

import clsx from 'clsx';
import { useEffect, useState } from 'react';
import { readerPlace, type Place } from './reader-place';

interface RuleMarginProps {
  readonly sections: readonly { readonly id: string; readonly label: string }[];
}

/** A vertical rule: a hairline at the right edge, ticks every 8 px, longer ones every 40. */
const ticks = {
  backgroundImage:
    'linear-gradient(var(--ink), var(--ink)), linear-gradient(to bottom, var(--ink) 1px, transparent 1px), linear-gradient(to bottom, var(--pencil) 1px, transparent 1px)',
  backgroundSize: '1px 100%, 14px 40px, 8px 8px',
  backgroundPosition: 'right top',
  backgroundRepeat: 'no-repeat, repeat-y, repeat-y',
} as const;

/** Beside a lesson: a ticked rule with a mark for each part and a slider at the reader's place. */
export function RuleMargin({ sections }: RuleMarginProps) {
  const place = useReaderPlace(sections);
  return (
    <nav
      aria-label="Parts of this lesson"
      className="sticky top-4 h-[calc(100dvh-2rem)] max-h-[56rem] self-start print:hidden"
    >
      <div aria-hidden="true" className="absolute inset-y-0 right-0 w-4" style={ticks} />
      <ol className="absolute inset-y-0 right-0 left-0">
        {sections.map((section, index) => (
          <li
            key={section.id}
            className="absolute right-0 left-0"
            style={{
              top: `${(index / sections.length) * 100}%`,
              height: `${100 / sections.length}%`,
            }}
          >
            <a
              href={`#${section.id}`}
              aria-current={index === place.index ? 'location' : undefined}
              className={clsx(
                'group relative flex h-full min-h-6 items-start font-mono text-[0.875rem] leading-tight no-underline before:absolute before:top-0 before:right-0 before:h-px before:w-full before:bg-ink lg:pt-1 lg:pr-8 lg:before:w-7',
                index === place.index ? 'font-semibold text-ink' : 'text-pencil',
              )}
            >
              <span className="sr-only lg:not-sr-only lg:ml-auto lg:group-hover:underline">
                {section.label}
              </span>
            </a>
          </li>
        ))}
      </ol>
      <div
        aria-hidden="true"
        className="pointer-events-none absolute -right-1.5 h-3.5 w-6 rounded border border-brass bg-brass-fill lg:w-8"
        style={{ top: `calc(${(place.along * 100).toFixed(2)}% - 7px)` }}
      />
    </nav>
  );
}

/** Follows the reader's eye down the page. */
function useReaderPlace(sections: RuleMarginProps['sections']): Place {
  const [place, setPlace] = useState<Place>({ index: 0, along: 0 });
  useEffect(() => {
    let frame = 0;
    const measure = () => {
      frame = 0;
      const tops = sections.flatMap(({ id }) => {
        const element = document.getElementById(id);
        return element === null
          ? []
          : [{ id, top: element.getBoundingClientRect().top + window.scrollY }];
      });
      const { scrollHeight } = document.documentElement;
      const bottom = Math.max(1, scrollHeight - window.innerHeight);
      // The eye starts at the top of the page, settles a third of the way down the window, and
      // reaches the foot of the last part with it, however short that is.
      const settled = Math.min(window.scrollY, window.innerHeight / 3);
      const ending =
        Math.max(0, (window.scrollY / bottom) * 5 - 4) * (window.innerHeight - settled);
      setPlace(readerPlace(tops, window.scrollY + settled + ending, scrollHeight));
    };
    const follow = () => {
      if (frame === 0) frame = requestAnimationFrame(measure);
    };
    follow();
    window.addEventListener('scroll', follow, { passive: true });
    window.addEventListener('resize', follow);
    return () => {
      cancelAnimationFrame(frame);
      window.removeEventListener('scroll', follow);
      window.removeEventListener('resize', follow);
    };
  }, [sections]);
  return place;
}
