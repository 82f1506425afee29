/**
 * Blank lines where text will stand; said once to screen readers. It is the fallback inside a page,
 * after the page has found out who asks: a `loading.tsx` beside the page would answer 200 before a
 * redirect or a 404 could be told.
 */
export function Loading({ lines = 3 }: Readonly<{ lines?: number }>) {
  return (
    <div role="status">
      <span className="sr-only">Loading …</span>
      <div aria-hidden="true" className="space-y-3">
        {Array.from({ length: lines }, (_, line) => (
          <div key={line} className="h-6 rounded bg-board" />
        ))}
      </div>
    </div>
  );
}
