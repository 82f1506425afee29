import type { ReactNode } from 'react';

interface CalloutProps {
  readonly children: ReactNode;
}

/** What can hurt, and what to do about it. */
export function Caution({ children }: CalloutProps) {
  return (
    <div className="my-5 max-w-3xl rounded border-2 border-madder px-4 py-3 print:break-inside-avoid">
      <p className="font-semibold text-madder">
        <span aria-hidden="true">▲ </span>Take care
      </p>
      {children}
    </div>
  );
}

/** What the drawing does not say: material, grain, pins, air and kerf. */
export function FromDrawingToWood({ children }: CalloutProps) {
  return (
    <div className="my-5 max-w-3xl rounded border border-ink bg-timber px-4 py-3 sm:px-6">
      {children}
    </div>
  );
}

/** The lesson on a card for the pocket. */
export function Card({ children }: CalloutProps) {
  return (
    <div className="my-5 max-w-xl rounded border-2 border-ink bg-paper px-4 py-3 print:break-inside-avoid sm:px-6">
      {children}
    </div>
  );
}

/** Something to try on the bench. */
export function Try({ children }: CalloutProps) {
  return (
    <div className="my-4 border-l-[3px] border-brass-fill pl-4 print:break-inside-avoid">
      {children}
    </div>
  );
}

/** What the reader should have seen, folded away until it is wanted. */
export function See({ children }: CalloutProps) {
  return (
    <details className="-mt-2 max-w-measure">
      <summary className="min-h-11 py-2 font-semibold text-chalk">What you should see</summary>
      <div className="-mt-3">{children}</div>
    </details>
  );
}
