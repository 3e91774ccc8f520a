import { z } from 'zod';
import { WORKSHEETS } from '@/lib/worksheets/list';

/** The list of worksheets as the API tells it: what each answers, its page, its address, and the JSON Schema of its request. */
export const describeWorksheets = () => ({
  items: WORKSHEETS.map(({ name, title, question, summary, request, answer }) => ({
    ...{ name, title, question, summary },
    url: `/worksheets/${name}`,
    api: `/api/worksheets/${name}`,
    schema: z.toJSONSchema(request, { io: 'input' }),
    answerSchema: z.toJSONSchema(answer),
  })),
  next: null,
});
