import { readdirSync, readFileSync } from 'node:fs';

/** The name in every child's environment that says which data folder it was started for. */
export const MARK = 'FUMELORE_RUN';
const OTHERS_SECONDS = 20;
const DATABASE_SECONDS = 60;

/** @param {string} path */
function readOr(path) {
  try {
    return readFileSync(path, 'utf8');
  } catch {
    return '';
  }
}

/** Lets leftovers of this run be told from every other process. @param {string} folder */
export const markChildren = (folder) => {
  process.env[MARK] = folder;
};

/**
 * Processes started for this data folder, this one left out. A number in a file would not do: another program may have it by now.
 * @param {string} folder @returns {{ pid: number, name: string }[]}
 */
export function startedFor(folder) {
  if (process.platform !== 'linux') return [];
  const mark = `${MARK}=${folder}`;
  return readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name) && Number(name) !== process.pid)
    .filter((pid) => readOr(`/proc/${pid}/environ`).split('\0').includes(mark))
    .map((pid) => ({ pid: Number(pid), name: readOr(`/proc/${pid}/comm`).trim() }));
}

/** @param {number} pid @param {NodeJS.Signals} signal */
function send(pid, signal) {
  try {
    process.kill(pid, signal);
  } catch {
    // It has ended meanwhile.
  }
}

/** @param {() => { pid: number }[]} left @param {number} seconds */
async function end(left, seconds) {
  for (const { pid } of left()) send(pid, 'SIGTERM');
  for (const until = Date.now() + seconds * 1000; left().length > 0;) {
    if (Date.now() > until) for (const { pid } of left()) send(pid, 'SIGKILL');
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
}

/** Stops what a killed run left behind, the database last. @param {string} folder @returns {Promise<number>} how many */
export async function stopLeftovers(folder) {
  const count = startedFor(folder).length;
  await end(() => startedFor(folder).filter(({ name }) => name !== 'mariadbd'), OTHERS_SECONDS);
  await end(() => startedFor(folder), DATABASE_SECONDS);
  return count;
}
