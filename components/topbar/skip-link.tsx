/** The first stop of the keyboard: past the bar, to what the page is about. Its target is <main id="content" tabIndex={-1}>. */
export function SkipLink() {
  return (
    <a
      href="#content"
      className="type-label sr-only text-bright focus:not-sr-only focus:absolute focus:top-4 focus:left-4 focus:z-50 focus:bg-ground focus:px-12 focus:py-8"
    >
      Skip to content
    </a>
  );
}
