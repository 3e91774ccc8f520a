/** The number of a source, as a link to it at the foot of the page. */
export function SourceNumber({ n }: { n: number }) {
  return (
    <sup className="font-sans text-xs leading-none">
      <a href={`#source-${n}`} aria-label={`Source ${n}`} className="no-underline">
        [{n}]
      </a>
    </sup>
  );
}
