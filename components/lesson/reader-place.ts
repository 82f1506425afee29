/** Where a section begins, from the top of the document, in pixels. */
export interface SectionTop {
  readonly id: string;
  readonly top: number;
}

/** The reader's place: in which section, and how far along the rule, from 0 to 1. */
export interface Place {
  readonly index: number;
  readonly along: number;
}

/**
 * The place of a reading line among sections whose marks stand evenly along the rule.
 * @param line where the reader's eye is taken to be, px from the top of the document.
 * @param end where the last section ends.
 * @example readerPlace([{ id: 'a', top: 0 }, { id: 'b', top: 100 }], 150, 200) // index 1, along 0.75
 */
export function readerPlace(tops: readonly SectionTop[], line: number, end: number): Place {
  if (tops.length === 0) return { index: 0, along: 0 };
  let index = 0;
  tops.forEach((section, at) => {
    if (section.top <= line) index = at;
  });
  const from = tops[index]?.top ?? 0;
  const to = tops[index + 1]?.top ?? end;
  const within = to > from ? Math.min(1, Math.max(0, (line - from) / (to - from))) : 0;
  return { index, along: (index + within) / tops.length };
}
