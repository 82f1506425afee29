/** The first thing the keyboard reaches: past the head of the page, to what it is about. */
export function SkipLink() {
  return (
    <a
      href="#main"
      className="sr-only focus:not-sr-only focus:absolute focus:top-2 focus:left-2 focus:z-10 focus:rounded focus:bg-paper focus:px-4 focus:py-2.5 focus:text-chalk"
    >
      Skip to the page
    </a>
  );
}
