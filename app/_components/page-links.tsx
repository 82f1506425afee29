import Link from 'next/link';

interface PageLinksProps {
  readonly page: number;
  readonly pages: number;
  /** The address of a page. */
  readonly hrefOf: (page: number) => string;
}

/** Leads to the page before and the page after. */
export function PageLinks({ page, pages, hrefOf }: PageLinksProps) {
  if (pages < 2) return null;
  return (
    <nav aria-label="Pages" className="mt-4 flex items-center gap-5 print:hidden">
      {page > 1 ? (
        <Link href={hrefOf(page - 1)} prefetch={false} className="link link-target">
          ‹ Before
        </Link>
      ) : null}
      <span className="text-pencil">
        Page {page} of {pages}
      </span>
      {page < pages ? (
        <Link href={hrefOf(page + 1)} prefetch={false} className="link link-target">
          Next ›
        </Link>
      ) : null}
    </nav>
  );
}
