import { z } from 'zod';
import { type Outcome, done, refuse } from '@/lib/outcome';

/** The query of an address as lists of values by name; a name that comes twice keeps both. */
export function queryOf(url: string): Record<string, string[]> {
  const query: Record<string, string[]> = Object.create(null) as Record<string, string[]>;
  for (const [name, value] of new URL(url).searchParams) (query[name] ??= []).push(value);
  return query;
}

/**
 * Reads a query by a schema over lists of values. An unknown name or a malformed value is 400, with a message at its name.
 */
export function readQuery<S extends z.ZodType>(url: string, schema: S): Outcome<z.infer<S>> {
  const result = schema.safeParse({ ...queryOf(url) });
  if (result.success) return done(result.data);
  const errors = result.error.issues.map((issue) => ({
    path: issue.code === 'unrecognized_keys' ? issue.keys.join(', ') : String(issue.path[0] ?? ''),
    message: issue.code === 'unrecognized_keys' ? 'is not a field of this question' : issue.message,
  }));
  return refuse(
    400,
    'The question could not be read',
    errors.map(({ path, message }) => `${path}: ${message}`).join('; '),
    errors,
  );
}

/** One value at most, as `inner` reads it. */
export const one = <S extends z.ZodType<unknown, string | undefined>>(inner: S) =>
  z
    .array(z.string())
    .max(1, 'may stand once only')
    .transform((values) => values[0])
    .pipe(inner);
