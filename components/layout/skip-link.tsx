/** The first stop of the Tab key: past the bar. */
export function SkipLink() {
  return (
    <a
      href="#main"
      className="skip-link sr-only focus:not-sr-only focus:absolute focus:z-30 focus:bg-surface focus:p-3"
    >
      Skip to the content
    </a>
  );
}
