'use client';

import { Trouble } from '@/components/layout/trouble';
import { archivo } from './fonts';
import './globals.css';

export default function GlobalError({ error, retry }: { error: unknown; retry: () => void }) {
  return (
    <html lang="en-GB" className={archivo.variable}>
      <head>
        <title>Something went wrong · Fumelore</title>
      </head>
      <body>
        <main className="mx-auto max-w-page px-4 py-8 sm:px-6">
          <Trouble error={error} retry={retry} />
        </main>
      </body>
    </html>
  );
}
