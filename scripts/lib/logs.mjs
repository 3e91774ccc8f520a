import { readdirSync, renameSync, statSync } from 'node:fs';
import { dirname, join } from 'node:path';

const MOST_BYTES = 5 * 1024 * 1024;

/** Sets a log that has grown long aside; the one set aside before it goes. @param {import('./data-folder.mjs').Place} place */
export function trimLogs(place) {
  const folder = dirname(place.log('any'));
  for (const name of readdirSync(folder).filter((file) => file.endsWith('.log'))) {
    const path = join(folder, name);
    if (statSync(path).size > MOST_BYTES) renameSync(path, `${path}.old`);
  }
}
