import { afterEach, beforeEach, expect, vi } from 'vitest';

/** A console.error in a test is a fault of the test or of the code: it fails. */
beforeEach(() => {
  vi.spyOn(console, 'error').mockImplementation(() => undefined);
});

afterEach(() => {
  expect(vi.mocked(console.error).mock.calls).toEqual([]);
  vi.restoreAllMocks();
});
