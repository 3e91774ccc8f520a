import { expect } from 'vitest';

/** A value printed by someone else, the value ours gives for the same question, and how near they must be. */
export type Row = {
  id: string;
  given: string;
  ours: number;
  published: number;
  within: { absolute: number } | { relative: number };
  source: string;
};

export function expectPublished({ id, ours, published, within, source }: Row): void {
  const allowed = 'absolute' in within ? within.absolute : Math.abs(published) * within.relative;
  expect(Math.abs(ours - published), `${id}: ours ${ours}, published ${published} (${source})`).toBeLessThanOrEqual(
    allowed,
  );
}
