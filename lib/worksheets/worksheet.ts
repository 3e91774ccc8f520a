import type { z } from 'zod';
import { done, type Outcome } from '@/lib/outcome';
import { NO_FACTS, type LibraryFacts } from './facts';
import { parseRequest } from './parse-request';

/** One line of the working: what is reckoned, with letters and with numbers, and where the equation is from. `value` is in `unit`. */
export type Step = { label: string; equation: string; value: number; unit: string; source: string };

/** What a reader must know before relying on a result. `code` is for machines and does not change. */
export type Warning = { code: string; text: string };

/** Every worksheet's answer. All numbers are SI. */
export type Answer<R> = { result: R; steps: Step[]; warnings: Warning[] };

/** A cell of a table for download. */
export type Cell = string | number;

/** What a worksheet says of itself. `question` is in everyday words; `names` and `everyday` are what a search may find it by. */
export type About = {
  name: string;
  title: string;
  question: string;
  summary: string;
  names: string[];
  everyday: string[];
};

/**
 * One worksheet as the list, the API and the search see it. `run` takes a request as it came and never throws: malformed is 400,
 * impossible is 422. `address` is how the question stands in the address of the page, as texts; `table` answers such a one, as rows
 * for a spreadsheet.
 */
export type Worksheet = About & {
  request: z.ZodType;
  answer: z.ZodType;
  address: z.ZodObject;
  /** Whether it cannot answer without the library. */
  asksLibrary: boolean;
  run: (body: unknown, facts?: LibraryFacts) => Outcome<Answer<unknown>>;
  table: (address: URLSearchParams, facts?: LibraryFacts) => Outcome<Cell[][]>;
};

/**
 * A worksheet from its parts: the schema that admits a question and the function that solves an admitted one, or refuses it (422) where
 * no schema could have told.
 */
export function worksheet<Q, R>(parts: {
  about: About;
  request: z.ZodType<Q>;
  answer: z.ZodType<Answer<R>>;
  address: z.ZodObject;
  solve: (question: Q, facts: LibraryFacts) => Answer<R> | Outcome<Answer<R>>;
  table: Worksheet['table'];
  asksLibrary?: boolean;
}): Worksheet {
  const { about, request, answer, address, solve, table, asksLibrary = false } = parts;
  const run = (body: unknown, facts = NO_FACTS): Outcome<Answer<R>> => {
    const question = parseRequest(request, body);
    if (!question.ok) return question;
    const solved = solve(question.value, facts);
    return 'ok' in solved ? solved : done(solved);
  };
  return { ...about, request, answer, address, asksLibrary, run, table };
}
