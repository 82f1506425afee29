/** The look of a button on a bench's rail; `main` is the drive's. */
export function railButton(kind: 'main' | 'plain' | 'square' = 'plain'): string {
  const face =
    kind === 'main'
      ? 'border-brass bg-brass-fill px-4 font-semibold text-on-brass'
      : 'border-pencil bg-paper text-ink hover:bg-board';
  const size = kind === 'square' ? 'min-w-11 px-0' : 'min-w-11 px-3';
  return `inline-flex min-h-11 items-center justify-center rounded border text-base leading-tight whitespace-nowrap disabled:border-rule disabled:text-pencil ${face} ${size}`;
}
