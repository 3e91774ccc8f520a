import { spawn } from 'node:child_process';
import { appendFileSync, closeSync, openSync } from 'node:fs';
import { ROOT } from './root.mjs';
import { Stopped } from './trouble.mjs';

/**
 * @typedef {object} Options
 * @property {string} log        file that takes what the child says
 * @property {Record<string, string | undefined>} [env]  added to this process's own; undefined takes a name away
 * @property {'log' | 'text' | 'inherit'} [out]  where standard output goes: the log, the log and `text`, or the terminal
 * @property {number} [grace]    seconds a stop waits before it kills
 * @property {boolean} [patient] let it finish by itself: killed half-way it would leave a mess
 *
 * @typedef {object} Child
 * @property {string} name
 * @property {number} pid
 * @property {boolean} patient
 * @property {number} grace
 * @property {string} text
 * @property {Promise<{ code: number, missing: boolean }>} done
 */

/** @type {Set<Child>} */
const running = new Set();
let stopping = false;

/** @param {Record<string, string | undefined>} extra */
const environment = (extra) =>
  Object.fromEntries(Object.entries({ ...process.env, ...extra }).filter(([, value]) => value !== undefined));

/** @param {number} pid @param {NodeJS.Signals} name */
function signalGroup(pid, name) {
  try {
    process.kill(-pid, name);
  } catch {
    // Nobody of it is left.
  }
}

/**
 * Starts a program in a group of its own, so that a Ctrl-C reaches only this process, which stops the others in order.
 * @param {string} name @param {string} command @param {string[]} args @param {Options} options @returns {Child}
 */
export function launch(name, command, args, { log, env = {}, out = 'log', grace = 10, patient = false }) {
  if (stopping) throw new Stopped();
  const file = openSync(log, 'a', 0o600);
  const output = { log: file, text: /** @type {const} */ ('pipe'), inherit: /** @type {const} */ ('inherit') }[out];
  const errors = out === 'inherit' ? 'inherit' : file;
  const spawned = spawn(command, args, {
    cwd: ROOT,
    env: environment(env),
    detached: true,
    stdio: ['ignore', output, errors],
  });
  closeSync(file);
  /** @type {Child} */
  const child = { name, pid: spawned.pid ?? 0, patient, grace, text: '', done: ended(spawned, out) };
  spawned.stdout?.setEncoding('utf8').on('data', (part) => {
    child.text += part;
    appendFileSync(log, part);
  });
  if (child.pid) running.add(child);
  child.done.then(() => running.delete(child));
  return child;
}

/** @param {import('node:child_process').ChildProcess} spawned @param {string} out */
const ended = (spawned, out) =>
  new Promise((resolve) => {
    spawned.once('error', () => resolve({ code: 127, missing: true }));
    spawned.once(out === 'text' ? 'close' : 'exit', (code) => resolve({ code: code ?? 1, missing: false }));
  });

/** Runs a program to its end. @param {string} name @param {string} command @param {string[]} args @param {Options} options */
export async function run(name, command, args, options) {
  const child = launch(name, command, args, options);
  const { code, missing } = await child.done;
  if (stopping) throw new Stopped();
  return { code, missing, text: child.text };
}

/** Asks a child to stop, waits, and kills it only when it does not. @param {Child} child */
export async function stop(child) {
  if (!child.patient) signalGroup(child.pid, 'SIGTERM');
  const late = setTimeout(() => signalGroup(child.pid, 'SIGKILL'), child.grace * 1000);
  await child.done;
  clearTimeout(late);
  signalGroup(child.pid, 'SIGKILL');
}

/** Stops everything this process started, the last first, and lets nothing new begin. */
export async function stopAll() {
  stopping = true;
  for (const child of [...running].reverse()) await stop(child);
}

export const isStopping = () => stopping;
