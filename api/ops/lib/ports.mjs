// @ts-check
import net from 'node:net';
import { PlainFailure } from './plain-failure.mjs';
import { codeOf } from './private-files.mjs';

const LOOPBACK = '127.0.0.1';
const HIGHEST_PORT = 65_535;

/**
 * @param {string} name of the setting, for the message
 * @param {string} text
 * @returns {number}
 */
export function parsePort(name, text) {
  const port = /^\d{1,5}$/.test(text) ? Number(text) : 0;
  if (port < 1 || port > HIGHEST_PORT) {
    throw new PlainFailure(`${name} must be a port from 1 to ${HIGHEST_PORT}, not "${text}".`);
  }
  return port;
}

/**
 * Refuses, in a sentence, a port that cannot be listened on.
 * @param {number} port
 * @param {string} setting the environment variable that chooses another
 */
export async function requirePort(port, setting) {
  const fault = await portFault(port);
  if (fault !== undefined) throw new PlainFailure(portSentence(port, fault, setting));
}

/**
 * @param {number} port
 * @param {string} fault the system's code
 * @param {string} setting
 * @returns {string}
 */
export function portSentence(port, fault, setting) {
  if (fault === 'EADDRINUSE') {
    return `Port ${port} is in use by another program: stop it, or choose another port with ${setting}=${otherPort(port)}.`;
  }
  if (fault === 'EACCES') {
    return `This account may not listen on port ${port}: choose one above 1023 with ${setting}.`;
  }
  return `Port ${port} cannot be listened on (${fault}): choose another with ${setting}.`;
}

/**
 * A suggestion that is itself a port.
 * @param {number} port
 */
function otherPort(port) {
  return port + 1000 <= HIGHEST_PORT ? port + 1000 : port - 1000;
}

/**
 * The wished port if it is free, else any free one.
 * @param {number} [wished]
 * @returns {Promise<number>}
 */
export async function freePort(wished) {
  if (wished !== undefined && (await portFault(wished)) === undefined) return wished;
  const server = await listen(0);
  const address = server.address();
  await new Promise((resolve) => server.close(resolve));
  if (address === null || typeof address === 'string') throw new PlainFailure('No free port could be found.');
  return address.port;
}

/**
 * @param {number} port
 * @returns {Promise<string | undefined>} the system's code of what is wrong with it
 */
async function portFault(port) {
  try {
    const server = await listen(port);
    await new Promise((resolve) => server.close(resolve));
    return undefined;
  } catch (error) {
    return codeOf(error);
  }
}

/**
 * @param {number} port
 * @returns {Promise<net.Server>}
 */
function listen(port) {
  return new Promise((resolve, reject) => {
    const server = net.createServer();
    server.once('error', reject);
    server.listen({ port, host: LOOPBACK, exclusive: true }, () => resolve(server));
  });
}
