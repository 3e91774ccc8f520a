'use client';

import { Button } from '@/components/ui/button';

const digestOf = (error: unknown) =>
  typeof error === 'object' && error && 'digest' in error && typeof error.digest === 'string'
    ? error.digest
    : undefined;

/** What is said when something broke that nobody expected. */
export function Trouble({ error, retry }: { error: unknown; retry: () => void }) {
  const digest = digestOf(error);
  return (
    <div role="alert" className="max-w-measure space-y-4">
      <h1>This page could not be made</h1>
      <p>
        The fault is ours and has been logged{digest && ` under ${digest}`}. Nothing you entered elsewhere is lost.
        Until the answer can be read, treat the material as not identified and do not run it.
      </p>
      <Button variant="primary" onClick={retry}>
        Try again
      </Button>
    </div>
  );
}
