import { connect, createServer } from 'node:net';
import { codeOf, Failure, reasonOf } from './failure.mjs';

/** Nothing that Coldbench starts listens anywhere else. */
export const loopback = '127.0.0.1';

/**
 * Listens for a moment, to learn what stands in the way.
 * @param {number} port 0 lets the system choose
 * @returns {Promise<number>} the port listened on; rejects with the system's error
 */
function tryPort(port) {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen({ port, host: loopback, exclusive: true }, () => {
      const address = probe.address();
      const found = address !== null && typeof address === 'object' ? address.port : port;
      probe.close(() => resolve(found));
    });
  });
}

/** A port that nothing uses at this moment. */
export function freePort() {
  return tryPort(0);
}

/**
 * @param {number} port
 * @param {string} variable the variable that chooses another one
 * @throws {Failure} when the port cannot be listened on
 */
export async function requirePort(port, variable) {
  try {
    await tryPort(port);
  } catch (error) {
    const code = codeOf(error);
    const advice = `choose another one with ${variable}, for example ${variable}=${port + 10}`;
    if (code === 'EADDRINUSE') {
      throw new Failure(`Port ${port} on ${loopback} is in use: stop what uses it or ${advice}.`);
    }
    if (code === 'EACCES') throw new Failure(`Port ${port} needs more rights: ${advice}.`);
    throw new Failure(`Cannot listen on ${loopback}:${port} (${reasonOf(error)}): ${advice}.`);
  }
}

/**
 * Opens a connection and closes it again.
 * @param {string} host
 * @param {number} port
 * @param {number} within milliseconds
 * @returns {Promise<string>} '' when somebody answers, otherwise what went wrong
 */
export function faultOfConnection(host, port, within) {
  return new Promise((resolve) => {
    const socket = connect({ host, port });
    /** @param {string} fault */
    const settle = (fault) => {
      socket.destroy();
      resolve(fault);
    };
    socket.setTimeout(within, () => settle(`no answer within ${within / 1000} s`));
    socket.once('connect', () => settle(''));
    socket.once('error', (error) => settle(codeOf(error) || reasonOf(error)));
  });
}

/**
 * @param {URL} database
 * @throws {Failure} when nothing answers there
 */
export async function requireDatabase(database) {
  const host = decodeURIComponent(database.hostname).replace(/^\[(.*)\]$/, '$1');
  const port = database.port === '' ? 5432 : Number(database.port);
  const fault = await faultOfConnection(host, port, 5000);
  if (fault !== '') {
    throw new Failure(`No PostgreSQL answers at ${host}:${port} (DATABASE_URL): ${fault}.`);
  }
}
