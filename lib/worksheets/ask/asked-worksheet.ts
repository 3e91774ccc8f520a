import { z } from 'zod';
import { done, type Outcome } from '@/lib/outcome';
import { SYSTEMS, type System } from '@/lib/units/kinds';
import { NO_FACTS, type LibraryFacts } from '@/lib/worksheets/facts';
import { worksheet, type About, type Answer, type Cell, type Worksheet } from '@/lib/worksheets/worksheet';
import { fieldsOf, type Ask, type FieldAsk } from './fields';
import { requestFrom } from './request';
import { typedFrom } from './typed';

const namesOf = (fields: readonly FieldAsk[], prefix = ''): string[] =>
  fields.flatMap((field) =>
    field.as === 'rows' ? namesOf(field.fields, `${prefix}${field.path}.0.`) : [`${prefix}${field.path}`],
  );

/** The address of a question as the description of the API tells it: each name once, rows by their first. */
function addressOf(ask: Ask) {
  const text = z.string().max(80).optional();
  return z.object({
    ...Object.fromEntries(namesOf(fieldsOf(ask)).map((name) => [name, text])),
    units: z.enum(SYSTEMS).optional().describe('of bare numbers: SI unless told'),
  });
}

/** A worksheet whose page, address and table follow from how it asks. `rows` is its result for a spreadsheet. */
export function askedWorksheet<Q, R>(parts: {
  about: Omit<About, 'name'>;
  ask: Ask;
  request: z.ZodType<Q>;
  answer: z.ZodType<Answer<R>>;
  solve: (question: Q, facts: LibraryFacts) => Answer<R> | Outcome<Answer<R>>;
  rows: (result: R, system: System) => Cell[][];
  asksLibrary?: boolean;
}): Worksheet {
  const { ask, rows } = parts;
  const made: Worksheet = worksheet<Q, R>({
    ...{ ...parts, about: { ...parts.about, name: ask.name }, address: addressOf(ask) },
    table: (address, facts = NO_FACTS) => {
      const typed = typedFrom(ask, address);
      const request = requestFrom(ask, typed);
      const answer = request.ok ? made.run(request.value, facts) : request;
      return answer.ok ? done(rows((answer.value as Answer<R>).result, typed.units)) : answer;
    },
  });
  return made;
}
