import type { z } from 'zod';
import { done, refuse, type FieldFault, type Outcome } from '@/lib/outcome';

type Issue = z.core.$ZodIssue;

const dotted = (path: PropertyKey[]) => path.map(String).join('.');
const isType = (issue: Issue) => issue.code === 'invalid_type' || issue.code === 'invalid_value';
const isMissing = (issue: Issue) => isType(issue) && issue.input === undefined;
const isEndless = (issue: Issue) => typeof issue.input === 'number' && !Number.isFinite(issue.input);
const isOtherWord = (issue: Issue) => issue.code === 'invalid_value' && typeof issue.input === 'string';

/** A wrong type or an unknown field is not understood at all; what is missing, too small or at odds is understood. */
const isMalformed = (issue: Issue) =>
  issue.code === 'unrecognized_keys' ||
  (isType(issue) && !isMissing(issue) && !isEndless(issue) && !isOtherWord(issue));

function messageOf(issue: Issue): string {
  const missing = isMissing(issue) ? 'is missing' : undefined;
  if (issue.code === 'invalid_value') {
    const words = issue.values.map(String).join(', ');
    return missing ? `${missing}: one of ${words}` : `must be one of: ${words}`;
  }
  if (missing) return missing;
  if (isEndless(issue)) return 'must be a finite number';
  return issue.code === 'invalid_type' ? `must be a JSON ${issue.expected}` : issue.message;
}

function faultsOf(issue: Issue): FieldFault[] {
  if (issue.code !== 'unrecognized_keys') return [{ path: dotted(issue.path), message: messageOf(issue) }];
  return issue.keys.map((key) => ({ path: dotted([...issue.path, key]), message: 'is not a field of this worksheet' }));
}

/**
 * Admits a request by its schema. Refuses 400 when a part is not understood (a number as text, an unknown field) and 422 when all is
 * understood and something is missing or impossible; each fault with its path.
 */
export function parseRequest<Q>(schema: z.ZodType<Q>, body: unknown): Outcome<Q> {
  const parsed = schema.safeParse(body, { reportInput: true });
  if (parsed.success) return done(parsed.data);
  const { issues } = parsed.error;
  const errors = issues.flatMap(faultsOf);
  return issues.some(isMalformed)
    ? refuse(400, 'Malformed', 'The request has a field that is unknown or of the wrong type.', errors)
    : refuse(422, 'Impossible', 'The request was understood, but it cannot be reckoned with as it stands.', errors);
}
