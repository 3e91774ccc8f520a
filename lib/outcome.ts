/** What was wrong with one field: `path` as in the request, dotted. */
export type FieldFault = { path: string; message: string };

/** An expected refusal: returned, never thrown. `status` is the HTTP status an API answers with. */
export type Refusal = {
  ok: false;
  status: 400 | 401 | 403 | 404 | 409 | 413 | 415 | 422 | 429 | 503;
  title: string;
  detail: string;
  errors?: FieldFault[];
};

/** Every verb's answer: the value, or why not. */
export type Outcome<T> = { ok: true; value: T } | Refusal;

export const done = <T>(value: T): Outcome<T> => ({ ok: true, value });

export const refuse = (status: Refusal['status'], title: string, detail: string, errors?: FieldFault[]): Refusal => ({
  ok: false,
  status,
  title,
  detail,
  ...(errors ? { errors } : {}),
});
