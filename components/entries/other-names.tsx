/** What else people call it. */
export function OtherNames({ names }: { names: string[] }) {
  if (names.length === 0) return null;
  return (
    <p className="mt-2 text-quiet">
      <span className="label">Also called: </span>
      {names.join(', ')}
    </p>
  );
}
