/** The text of an entry. `html` comes from `renderBody` and from nowhere else: it has been sanitised there. */
export function Prose({ html }: { html: string }) {
  return <div className="reading" dangerouslySetInnerHTML={{ __html: html }} />;
}
