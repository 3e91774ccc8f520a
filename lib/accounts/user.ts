/** Somebody who is signed in, as every verb takes them: never a maybe. */
export type User = { id: number };
