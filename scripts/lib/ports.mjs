import { createServer } from 'node:net';
import { Trouble } from './trouble.mjs';

/** Listens on loopback for a moment. @param {number} port 0 for any @returns {Promise<{ port: number, fault?: string }>} */
const tryPort = (port) =>
  new Promise((resolve) => {
    const server = createServer();
    server.once('error', (/** @type {NodeJS.ErrnoException} */ error) => resolve({ port, fault: error.code }));
    server.listen({ port, host: '127.0.0.1', exclusive: true }, () => {
      const address = server.address();
      const got = address && typeof address === 'object' ? address.port : port;
      server.close(() => resolve({ port: got }));
    });
  });

/** The wanted port when nobody listens there, else any free one. @param {number} [wanted] */
export async function freePort(wanted) {
  const first = await tryPort(wanted ?? 0);
  return first.fault ? (await tryPort(0)).port : first.port;
}

/** The website's port. @param {string | undefined} text as in PORT @throws {Trouble} when it cannot be had */
export async function sitePort(text) {
  const port = Number(text || 3000);
  if (!Number.isInteger(port) || port < 1 || port > 65535)
    throw new Trouble(`PORT is "${text}": it takes a whole number from 1 to 65535.`);
  const { fault } = await tryPort(port);
  if (fault === 'EADDRINUSE')
    throw new Trouble(
      `Port ${port} is taken by another program: stop that one, or choose another, PORT=${port + 1} npm start.`,
    );
  if (fault) throw new Trouble(`Port ${port} may not be used here (${fault}): choose another, PORT=3000 npm start.`);
  return port;
}
