import type { z } from 'zod';
import { done, type Outcome } from '@/lib/outcome';
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
  run: (body: unknown) => Outcome<Answer<unknown>>;
  table: (address: URLSearchParams) => Outcome<Cell[][]>;
};

/** A worksheet from its parts: the schema that admits a question and the function that solves an admitted one. */
export function worksheet<Q, R>(parts: {
  about: About;
  request: z.ZodType<Q>;
  answer: z.ZodType<Answer<R>>;
  address: z.ZodObject;
  solve: (question: Q) => Answer<R>;
  table: Worksheet['table'];
}): Worksheet {
  const { about, request, answer, address, solve, table } = parts;
  const run = (body: unknown) => {
    const question = parseRequest(request, body);
    return question.ok ? done(solve(question.value)) : question;
  };
  return { ...about, request, answer, address, run, table };
}
