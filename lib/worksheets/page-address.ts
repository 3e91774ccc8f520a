/** The query of a page as the framework hands it over, as one address again; a repeated name stays repeated. */
export function addressFrom(params: Record<string, string | string[] | undefined>): URLSearchParams {
  const pairs = Object.entries(params).flatMap(([name, value]) =>
    [value ?? []].flat().map((each): [string, string] => [name, each]),
  );
  return new URLSearchParams(pairs);
}
