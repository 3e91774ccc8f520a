import { Agent, request } from 'node:http';
import { median } from './timing.mjs';

/** One GET over a kept connection; gives the status and the milliseconds until the last byte. */
const get = (agent, url) =>
  new Promise((resolve, reject) => {
    const begun = performance.now();
    request(url, { agent }, (response) => {
      response.resume();
      response.on('end', () => resolve({ status: response.statusCode, taken: performance.now() - begun }));
    })
      .on('error', reject)
      .end();
  });

/**
 * Asks an address `count` times over `connections` kept connections, after as many again that are not counted.
 * @throws Error when an answer is not 200, for a fault is answered faster than a page
 */
async function load(url, count, connections) {
  const agent = new Agent({ keepAlive: true, maxSockets: connections });
  const answers = [];
  const once = async (left, keep) => {
    while (left.count > 0) {
      left.count -= 1;
      const answer = await get(agent, url);
      if (answer.status !== 200) throw new Error(`${url} answered ${answer.status}`);
      if (keep) answers.push(answer.taken);
    }
  };
  const all = (keep) => {
    const left = { count };
    return Promise.all(Array.from({ length: connections }, () => once(left, keep)));
  };
  try {
    await all(false);
    const begun = performance.now();
    await all(true);
    const seconds = (performance.now() - begun) / 1000;
    return { perSecond: count / seconds, median: median(answers) };
  } finally {
    agent.destroy();
  }
}

/** Addresses that answer a real question, each beside one that does nothing: what is above the bare server is ours. */
const MEASURED = [
  ['/api/check?material=pvc&process=laser-cutting', '/api/health/live'],
  ['/api/search?q=laser+cut+vinyl', '/api/health/live'],
  ['/api/entries/material/pvc', '/api/health/live'],
  ['/materials/pvc', '/check'],
];

const ROUNDS = 3;
const middle = (rounds) => ({
  perSecond: median(rounds.map((round) => round.perSecond)),
  median: median(rounds.map((round) => round.median)),
});

/** Requests a second and median milliseconds of each address against its trivial neighbour, round by round. Loopback only. */
export async function serverSpeed(base, count = 200, connections = 8) {
  const { hostname } = new URL(base);
  if (!['127.0.0.1', 'localhost', '[::1]'].includes(hostname)) throw new Error('BENCH_BASE_URL must be on loopback');
  const rows = [];
  for (const [address, trivial] of MEASURED) {
    const rounds = { ours: [], rival: [] };
    for (let round = 0; round < ROUNDS; round += 1) {
      rounds.rival.push(await load(new URL(trivial, base), count, connections));
      rounds.ours.push(await load(new URL(address, base), count, connections));
    }
    const [ours, rival] = [middle(rounds.ours), middle(rounds.rival)];
    rows.push({ address, trivial, ours, rival, ratio: rival.perSecond / ours.perSecond });
  }
  return rows;
}
