import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { startedFor, stopLeftovers } from '@/scripts/lib/processes.mjs';

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'stopping-'));
});
afterEach(() => rmSync(folder, { recursive: true }));

/** A server that takes a while to stop, and writes down that it came to its end. */
const SERVER = `const { writeFileSync } = require('node:fs');
  process.on('SIGTERM', () => setTimeout(() => { writeFileSync(process.argv[1], 'clean'); process.exit(); }, 400));
  setInterval(() => {}, 1000);
  writeFileSync(process.argv[1] + '.up', '');`;

/** A command that starts it and says so; with `fault`, it then fails with that. */
const COMMAND = `import { command } from './scripts/lib/command.mjs';
  import { launch } from './scripts/lib/children.mjs';
  import { markChildren } from './scripts/lib/processes.mjs';
  import { existsSync } from 'node:fs';
  import { setTimeout as wait } from 'node:timers/promises';
  const [folder, server, fault] = process.argv.slice(1);
  markChildren(folder);
  await command(async () => {
    const child = launch('server', process.execPath, ['-e', server, folder + '/end'], { log: folder + '/log' });
    while (!existsSync(folder + '/end.up')) await wait(20);
    console.log('up');
    if (fault) throw new Error(fault);
    await child.done;
  }, JSON.parse(process.env.CODES ?? '{}'));`;

async function started(...more: string[]) {
  const args = ['--input-type=module', '-e', COMMAND, folder, SERVER, ...more];
  const child = spawn(process.execPath, args, { env: { ...process.env, npm_lifecycle_event: '' } });
  let said = '';
  child.stdout.on('data', (part) => (said += part));
  child.stderr.on('data', (part) => (said += part));
  const ended = once(child, 'close').then(([code]) => ({ code, said }));
  await Promise.race([once(child.stdout, 'data'), ended]);
  return { child, ended };
}

const wroteItsEnd = () => existsSync(join(folder, 'end')) && readFileSync(join(folder, 'end'), 'utf8');

describe('a command', () => {
  it.each(['SIGINT', 'SIGTERM', 'SIGHUP'] as const)('stops what it started and waits for it, on %s', async (signal) => {
    const { child, ended } = await started();
    child.kill(signal);
    expect(await ended).toEqual({ code: 0, said: 'up\nStopping.\n' });
    expect(wroteItsEnd()).toBe('clean');
    expect(startedFor(folder)).toEqual([]);
  });

  it('is not hurried by a second and a third Ctrl-C', async () => {
    const { child, ended } = await started();
    for (const signal of ['SIGINT', 'SIGINT', 'SIGTERM'] as const) child.kill(signal);
    expect(await ended).toEqual({ code: 0, said: 'up\nStopping.\n' });
    expect(wroteItsEnd()).toBe('clean');
  });

  it('ends with a code of its own where to be cut short is to fail', async () => {
    process.env.CODES = '{"stopped":130}';
    const { child, ended } = await started();
    delete process.env.CODES;
    child.kill('SIGINT');
    expect(await ended).toEqual({ code: 130, said: 'up\nStopping.\n' });
    expect(wroteItsEnd()).toBe('clean');
  });

  it('says a fault in one line, and stops what it started', async () => {
    const { ended } = await started('a fault\nof two lines');
    expect(await ended).toEqual({ code: 1, said: 'up\nUnexpected: a fault\n' });
    expect(wroteItsEnd()).toBe('clean');
  });

  it('stops when the npm that ran it is killed', async () => {
    const args = ['-c', '"$0" "$@" & wait', process.execPath, '--input-type=module', '-e', COMMAND, folder, SERVER];
    const shell = spawn('sh', args, { env: { ...process.env, npm_lifecycle_event: 'start' } });
    await once(shell.stdout, 'data');
    shell.kill('SIGKILL');
    await once(shell, 'close');
    expect(wroteItsEnd()).toBe('clean');
  });
});

describe('what a killed command leaves behind', () => {
  it('is found by the folder it was started for, and stopped', async () => {
    const { child, ended } = await started();
    child.kill('SIGKILL');
    await ended.catch(() => undefined);
    expect(startedFor(folder)).toEqual([{ pid: expect.any(Number), name: 'node' }]);
    expect(startedFor(`${folder}-other`)).toEqual([]);
    expect(await stopLeftovers(folder)).toBe(1);
    expect(startedFor(folder)).toEqual([]);
    expect(wroteItsEnd()).toBe('clean');
  });
});
