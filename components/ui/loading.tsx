import { Page } from './page';
import { TickedRule } from './page-heading';

/** Blank lines where text will stand; said once to screen readers. */
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

/** A page while its contents are on the way: the place of the heading, the rule, blank lines. */
export function LoadingPage() {
  return (
    <Page>
      <div className="mb-3 h-12 w-64 max-w-full rounded bg-board" aria-hidden="true" />
      <TickedRule />
      <div className="mt-8">
        <Loading lines={4} />
      </div>
    </Page>
  );
}
