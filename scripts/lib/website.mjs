import { launch } from './children.mjs';
import { programEnv } from './jobs.mjs';
import { NEXT } from './build.mjs';
import { shown } from './root.mjs';
import { Trouble } from './trouble.mjs';

const READY_SECONDS = 60;

/** @typedef {{ port: number, dist: string, baseUrl: string, dev?: boolean }} Site */

/** What the website says of itself at its health address. @param {number} port */
async function health(port) {
  try {
    const reply = await fetch(`http://127.0.0.1:${port}/api/health/ready`, { signal: AbortSignal.timeout(30_000) });
    const text = await reply.text();
    return {
      ready: reply.ok,
      said: reply.ok ? '' : (/"detail":"([^"]*)"/.exec(text)?.[1] ?? `it answers ${reply.status}`),
    };
  } catch {
    return { ready: false, said: 'it does not answer' };
  }
}

/**
 * Starts the website and waits until it says that it is ready.
 * @param {import('./data-folder.mjs').Place} place @param {import('./database.mjs').Database} database @param {Site} site
 */
export async function startWebsite(place, database, { port, dist, baseUrl, dev = false }) {
  const log = place.log('website');
  const env = { ...programEnv(database), NEXT_DIST_DIR: dist, BASE_URL: baseUrl, PORT: String(port) };
  const args = [NEXT, dev ? 'dev' : 'start', '-H', '127.0.0.1', '-p', String(port)];
  const child = launch('website', process.execPath, args, { log, env, out: dev ? 'inherit' : 'log' });
  let ended = false;
  child.done.then(() => (ended = true));
  let now = await health(port);
  for (const until = Date.now() + READY_SECONDS * 1000; !now.ready && !ended && Date.now() < until;) {
    await new Promise((resolve) => setTimeout(resolve, 200));
    now = await health(port);
  }
  if (ended) throw new Trouble(`The website stopped while starting; see ${shown(log)}.`);
  if (!now.ready) throw new Trouble(`The website does not become ready: ${now.said}; see ${shown(log)}.`);
  return child;
}
