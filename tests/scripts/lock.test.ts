import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { holderOf, takeFolder } from '@/scripts/lib/lock.mjs';

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'lock-'));
});
afterEach(() => rmSync(folder, { recursive: true }));

/** Another process that takes the folder and stays. */
async function otherHolder() {
  const script = `import { takeFolder } from './scripts/lib/lock.mjs';
    await takeFolder(process.argv[1], 'npm start');
    console.log('taken');
    setInterval(() => {}, 1000);`;
  const child = spawn(process.execPath, ['--input-type=module', '-e', script, folder]);
  await once(child.stdout, 'data');
  return child;
}

describe('a data folder', () => {
  it('has no holder at first', async () => {
    expect(await holderOf(folder)).toBeNull();
  });

  it('is held by one command, which tells others about itself', async () => {
    const holder = await takeFolder(folder, 'npm start');
    holder.address = 'http://127.0.0.1:3999';
    expect(await holderOf(folder)).toEqual({ what: 'npm start', pid: process.pid, address: 'http://127.0.0.1:3999' });
    await expect(takeFolder(folder, 'npm start')).rejects.toThrow(
      `\`npm start\` already runs in this folder, process ${process.pid}: http://127.0.0.1:3999.`,
    );
  });

  it('does not stand in the way of another', async () => {
    await takeFolder(folder, 'npm start');
    expect(await takeFolder(join(folder, 'test'), 'npm test')).toMatchObject({ what: 'npm test' });
  });

  it('is free again once its holder was killed', async () => {
    const child = await otherHolder();
    await expect(takeFolder(folder, 'npm start')).rejects.toThrow(`process ${child.pid}`);
    child.kill('SIGKILL');
    await once(child, 'exit');
    expect(await takeFolder(folder, 'npm start')).toMatchObject({ pid: process.pid });
  });
});
