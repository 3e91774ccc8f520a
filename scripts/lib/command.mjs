import { isStopping, stopAll } from './children.mjs';
import { lineFor, Stopped } from './trouble.mjs';

const SIGNALS = /** @type {NodeJS.Signals[]} */ (['SIGINT', 'SIGTERM', 'SIGHUP']);
const LOOK_MS = 300;

/** Npm passes a signal to the shell between it and us, which dies of it and tells nobody: being orphaned is the sign. @param {() => void} ask */
function heedNpm(ask) {
  if (!process.env.npm_lifecycle_event) return;
  const parent = process.ppid;
  setInterval(() => process.ppid !== parent && ask(), LOOK_MS).unref();
}

/** Rejects at the first signal. Npm passes on what the terminal sent already, so later ones say nothing new. */
const stopAsked = () =>
  new Promise((_, reject) => {
    let asked = false;
    const ask = () => {
      if (asked) return;
      asked = true;
      if (!isStopping()) console.log('Stopping.');
      reject(new Stopped());
    };
    for (const name of SIGNALS) process.on(name, ask);
    heedNpm(ask);
  });

/**
 * Runs a command to its end: its code when it has one, 1 and one line for any fault, `stopped` when it was asked to stop; and always
 * with everything it started stopped first.
 * @param {() => Promise<number | void>} work @param {{ stopped?: number }} [codes] 0 unless told: a website is stopped, not broken
 */
export async function command(work, { stopped = 0 } = {}) {
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => undefined);
  let code = stopped;
  try {
    code = (await Promise.race([work(), stopAsked()])) ?? 0;
  } catch (error) {
    if (!(error instanceof Stopped)) {
      console.log(lineFor(error));
      code = 1;
    }
  }
  await stopAll();
  process.exit(code);
}
