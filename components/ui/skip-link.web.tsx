/** The first stop of the Tab key: past the header, to the page's matter. */
export function SkipLink() {
  return <a href="#main" className="ui-skip ui-label">Skip to the page</a>;
}
