import type { Server } from 'node:http';

/** How often connections that have just fallen idle are let go. */
const lookEveryMs = 50;

/**
 * Stops a server without breaking what it has accepted: takes no new connection, closes those that are idle, waits
 * for answers under way, and cuts off what still runs after `forceAfterMs`.
 * @returns whether everything was answered
 */
export async function drain(server: Server, forceAfterMs: number): Promise<boolean> {
  let forced = false;
  const closed = new Promise<void>((resolve) => server.close(() => resolve()));
  const idle = setInterval(() => server.closeIdleConnections(), lookEveryMs);
  const force = setTimeout(() => {
    forced = true;
    server.closeAllConnections();
  }, forceAfterMs);
  await closed;
  clearInterval(idle);
  clearTimeout(force);
  return !forced;
}
