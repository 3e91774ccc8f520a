import { spawnSync } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** Installs what is missing, runs every test, and closes with one line: `N passed, N failed`. */
const run = (command, args) => spawnSync(command, args, { stdio: 'inherit' }).status ?? 1;

if (!existsSync('node_modules/vitest') && run('npm', ['ci', '--no-audit', '--no-fund']) !== 0) {
  console.log('packages could not be installed');
  process.exit(1);
}
const report = join(mkdtempSync(join(tmpdir(), 'fumelore-test-')), 'vitest.json');
const status = run('node', [
  'node_modules/vitest/vitest.mjs',
  'run',
  '--reporter=default',
  '--reporter=json',
  `--outputFile=${report}`,
  ...process.argv.slice(2),
]);
const result = existsSync(report) ? JSON.parse(readFileSync(report, 'utf8')) : { numPassedTests: 0, numFailedTests: 1 };
console.log(`${result.numPassedTests} passed, ${result.numFailedTests} failed`);
process.exitCode = status === 0 && result.numPassedTests > 0 ? 0 : 1;
