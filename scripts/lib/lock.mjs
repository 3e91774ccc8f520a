import { createHash } from 'node:crypto';
import { connect, createServer } from 'node:net';
import { Trouble } from './trouble.mjs';

/**
 * @typedef {object} Holder  what the one command that uses a data folder says of itself
 * @property {string} what     the command
 * @property {number} pid
 * @property {string} [address]  of the website, once it answers
 * @property {boolean} [database]  whether its database takes connections
 */

/** A name in the kernel, not a file: it is gone the moment its holder is, however that ended. @param {string} folder */
const nameOf = (folder) => `\0fumelore-${createHash('sha256').update(folder).digest('hex').slice(0, 32)}`;

/** Who uses the folder now, or null. @param {string} folder @returns {Promise<Holder | null>} */
export const holderOf = (folder) =>
  new Promise((resolve) => {
    if (process.platform !== 'linux') return resolve(null);
    let text = '';
    const socket = connect(nameOf(folder))
      .setEncoding('utf8')
      .setTimeout(3000, () => socket.destroy());
    socket.on('data', (part) => (text += part)).on('error', () => resolve(null));
    socket.on('close', () => resolve(text ? JSON.parse(text) : null));
  });

/** @param {Holder | null} holder */
function inUse(holder) {
  if (!holder) return 'Another command is using this data folder.';
  const at = holder.address ? `: ${holder.address}` : '';
  return `\`${holder.what}\` already runs in this folder, process ${holder.pid}${at}.`;
}

/**
 * Takes the data folder for this process alone, until it ends.
 * @param {string} folder @param {string} what @returns {Promise<Holder>} fill it in as things come up
 * @throws {Trouble} when another command has it
 */
export async function takeFolder(folder, what) {
  /** @type {Holder} */
  const holder = { what, pid: process.pid };
  if (process.platform !== 'linux') return holder;
  const server = createServer((socket) => {
    socket.on('error', () => undefined).end(JSON.stringify(holder));
  }).unref();
  const taken = await new Promise((resolve) => {
    server.once('error', () => resolve(false)).listen(nameOf(folder), () => resolve(true));
  });
  if (!taken) throw new Trouble(inUse(await holderOf(folder)));
  return holder;
}
