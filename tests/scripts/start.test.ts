import { spawn } from 'node:child_process';
import { chmodSync, cpSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { takeFolder } from '@/scripts/lib/lock.mjs';
import { freePort } from '@/scripts/lib/ports.mjs';

/** A folder with only what `npm start` needs to begin: faults met before the packages are in need no more. */
let root: string;
beforeEach(() => {
  root = mkdtempSync(join(tmpdir(), 'start-'));
  chmodSync(root, 0o755);
  cpSync('scripts', join(root, 'scripts'), { recursive: true });
  writeFileSync(join(root, 'package-lock.json'), '{"packages":{}}');
});
afterEach(() => {
  chmodSync(root, 0o755);
  rmSync(root, { recursive: true });
});

const NOBODY = 65_534;

const start = (env: Record<string, string>, uid?: number): Promise<{ code: number | null; lines: string[] }> =>
  new Promise((resolve) => {
    const alone = { NODE_ENV: 'production' as const, PATH: '/usr/bin:/bin', ...env };
    const child = spawn(process.execPath, ['scripts/start.mjs'], { cwd: root, uid, env: alone });
    let said = '';
    for (const stream of [child.stdout, child.stderr]) stream.on('data', (part) => (said += part));
    child.on('close', (code) => resolve({ code, lines: said.trimEnd().split('\n') }));
  });

const oneLine = (pattern: RegExp) => ({ code: 1, lines: [expect.stringMatching(pattern)] });

describe('npm start says in one line', () => {
  it('that its port is taken', async () => {
    const other = createServer();
    const port = await new Promise<number>((resolve) => {
      other.listen(0, () => resolve((other.address() as { port: number }).port));
    });
    expect(await start({ PORT: String(port) })).toEqual(oneLine(new RegExp(`^Port ${port} is taken`)));
    other.close();
  });

  it.each(['web', '70000', '-1', '3.5'])('that PORT cannot be %s', async (port) => {
    expect(await start({ PORT: port })).toEqual(oneLine(/^PORT is ".*": it takes a whole number/));
  });

  it('that it runs already', async () => {
    await takeFolder(join(root, '.data'), 'npm start');
    expect(await start({})).toEqual(oneLine(/^`npm start` already runs in this folder, process \d+\.$/));
  });

  it('that the folder takes no writes from this user', async () => {
    chmodSync(root, 0o555);
    const user = process.getuid?.() === 0 ? NOBODY : undefined;
    expect(await start({}, user)).toEqual(oneLine(/^\.data.* may not be read or written by this user\.$/));
  });

  it('that something else lies where the data belongs', async () => {
    writeFileSync(join(root, '.data'), '');
    expect(await start({})).toEqual(oneLine(/^\.data.* is in the way: a folder was expected\.$/));
  });

  it('that npm is missing, once it has to install', async () => {
    writeFileSync(join(root, 'package-lock.json'), '{"packages":{"node_modules/one":{"version":"1.0.0"}}}');
    const { code, lines } = await start({ PATH: '/nowhere', PORT: String(await freePort()) });
    expect(code).toBe(1);
    expect(lines).toHaveLength(2);
    expect(lines[1]).toMatch(/^npm is missing: /);
  });
});
