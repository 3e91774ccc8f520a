import type { Metadata, Viewport } from 'next';
import type { ReactNode } from 'react';
import { Bar } from '@/components/layout/bar';
import { Footer } from '@/components/layout/footer';
import { SkipLink } from '@/components/layout/skip-link';
import { archivo, newsreader, spline } from './fonts';
import './globals.css';

const DESCRIPTION =
  'What workshop materials give off when they are cut, printed, soldered, cast or sprayed, the control each pair needs, and whether a workshop has the air for it.';

export const metadata: Metadata = {
  metadataBase: new URL(process.env.BASE_URL || 'http://127.0.0.1:3000'),
  title: { default: 'Fumelore: what materials give off, and the air they need', template: '%s · Fumelore' },
  description: DESCRIPTION,
  applicationName: 'Fumelore',
};

export const viewport: Viewport = { width: 'device-width', initialScale: 1, colorScheme: 'light dark' };

export default function RootLayout({ children }: { children: ReactNode }) {
  return (
    <html
      lang="en-GB"
      className={`${archivo.variable} ${newsreader.variable} ${spline.variable}`}
      suppressHydrationWarning
    >
      <head>
        {/* Must run before the first paint, so it may not wait: it marks the chosen units and theme on <html>. */}
        {/* eslint-disable-next-line @next/next/no-sync-scripts */}
        <script src="/settle.js" />
      </head>
      <body className="flex min-h-screen flex-col">
        <SkipLink />
        <Bar />
        <main id="main" tabIndex={-1} className="mx-auto w-full max-w-page flex-1 px-4 py-8 sm:px-6">
          {children}
        </main>
        <Footer />
      </body>
    </html>
  );
}
