import { MAX_QUERY_CHARACTERS } from './limits';
import { SEARCH_KINDS, type SearchKind } from './search';

type Typed = string | string[] | undefined;

/** What the address of the results page asks: the first `q`, cut and trimmed, and `kind` when it is one. Anything else is ignored. */
export function readSearchAddress(parameters: { q?: Typed; kind?: Typed }): { q: string; kind?: SearchKind } {
  const [q = '', kind] = [parameters.q, parameters.kind].map((value) => (Array.isArray(value) ? value[0] : value));
  const known = SEARCH_KINDS.find((one) => one === kind);
  return { q: q.slice(0, MAX_QUERY_CHARACTERS).trim(), ...(known ? { kind: known } : {}) };
}

/** The address of the results of a question, narrowed to a kind or not. */
export function searchAddress(q: string, kind?: SearchKind): string {
  return `/search?${new URLSearchParams({ q, ...(kind ? { kind } : {}) })}`;
}
