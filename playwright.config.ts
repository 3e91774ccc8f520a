import { createHash } from 'node:crypto';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { defineConfig } from '@playwright/test';

/** Journeys in Debian's Chromium against a website that scripts/test.mjs has built and serves at BASE_URL; nothing leaves loopback. */
const ALONE = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/** Emptied at every run, so each checkout has one of its own. */
const CHECKOUT = createHash('sha256').update(process.cwd()).digest('hex').slice(0, 10);

const config = defineConfig({
  testDir: './tests/browser',
  outputDir: join(tmpdir(), `fumelore-browser-${process.getuid?.() ?? 0}-${CHECKOUT}`),
  fullyParallel: true,
  workers: 2,
  retries: 0,
  forbidOnly: true,
  timeout: 60_000,
  // A slow, noisy machine takes its time: what is expected is waited for.
  expect: { timeout: 20_000 },
  reporter: process.env.PLAYWRIGHT_JSON_OUTPUT_FILE ? [['line'], ['json']] : [['line']],
  use: {
    baseURL: process.env.BASE_URL,
    launchOptions: { executablePath: '/usr/bin/chromium', args: ALONE },
  },
});

export default config;
