import clsx from 'clsx';
import type { ComponentProps, ReactNode } from 'react';

/** A scrolling region must be reachable by keyboard, and so it takes the focus. */
const scrolling = { role: 'region', tabIndex: 0 } as const;

interface TableProps {
  /** Names the table for screen readers; the heading above it says it to everybody else. */
  readonly caption: string;
  readonly children: ReactNode;
}

/** A table that scrolls inside its own frame where the screen is narrower than it. */
export function Table({ caption, children }: TableProps) {
  return (
    <div
      {...scrolling}
      aria-label={caption}
      className="relative overflow-x-auto print:overflow-visible"
    >
      <table className="w-full border-collapse text-left text-base">
        <caption className="sr-only">{caption}</caption>
        {children}
      </table>
    </div>
  );
}

/** The row of column names. */
export function HeadRow({ children }: Readonly<{ children: ReactNode }>) {
  return (
    <thead className="border-b border-ink bg-board">
      <tr>{children}</tr>
    </thead>
  );
}

/** The name of a column. */
export function ColumnName({ className, ...rest }: ComponentProps<'th'>) {
  return <th scope="col" className={clsx('px-2.5 py-2.5 font-semibold', className)} {...rest} />;
}

/** The name of a row: a cell that heads the others. */
export function RowName({ className, ...rest }: ComponentProps<'th'>) {
  return <th scope="row" className={clsx('px-2.5 py-2 font-normal', className)} {...rest} />;
}

/** One row of the body, with a hairline under it. */
export function Row({ className, ...rest }: ComponentProps<'tr'>) {
  return <tr className={clsx('border-b border-rule', className)} {...rest} />;
}

/** One cell. */
export function Cell({ className, ...rest }: ComponentProps<'td'>) {
  return <td className={clsx('px-2.5 py-2 align-middle', className)} {...rest} />;
}
