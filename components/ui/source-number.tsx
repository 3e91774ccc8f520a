/** The number of a source, as a link to it at the foot of the page. */
export function SourceNumber({ n }: { n: number }) {
  return (
    <sup className="font-sans text-xs leading-none">
      <a
        href={`#source-${n}`}
        aria-label={`Source ${n}`}
        className="-my-2 inline-block min-w-6 text-center leading-6 no-underline"
      >
        [{n}]
      </a>
    </sup>
  );
}
