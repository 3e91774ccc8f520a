'use client';

import { Trouble } from '@/components/layout/trouble';

export default function ErrorPage({ error, retry }: { error: unknown; retry: () => void }) {
  return <Trouble error={error} retry={retry} />;
}
