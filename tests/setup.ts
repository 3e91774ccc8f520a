import fc from 'fast-check';
import { afterEach, beforeEach, expect, vi } from 'vitest';

/** A console.error in a test is a fault of the test or of the code: it fails. */
beforeEach(() => {
  vi.spyOn(console, 'error').mockImplementation(() => undefined);
});

afterEach(() => {
  expect(vi.mocked(console.error).mock.calls).toEqual([]);
  vi.restoreAllMocks();
});

// A failure is told as it was found, with its seed: to shrink one of these systems can take longer than all the tests.
fc.configureGlobal({ endOnFailure: true });
