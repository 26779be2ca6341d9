import type { IncomingMessage, Server, ServerResponse } from 'node:http';
import type { Socket } from 'node:net';

/** How often connections that have just fallen idle are let go. */
const lookEveryMs = 50;
/** A connection that was taken just before may still be bringing its first request; longer it brings none. */
const firstRequestWithinMs = 1_000;

/**
 * Stops a server without breaking what it has accepted. Watches it from its start on, since Node counts a connection
 * that has never asked for anything as one that is busy.
 */
export class Drain {
  private readonly silent = new Set<Socket>();
  private readonly underWay = new Set<ServerResponse>();
  private ending = false;

  constructor(private readonly server: Server) {
    server.on('connection', (socket: Socket) => {
      this.silent.add(socket);
      socket.once('close', () => this.silent.delete(socket));
    });
    server.prependListener('request', (request: IncomingMessage, response: ServerResponse) => {
      this.silent.delete(request.socket);
      this.underWay.add(response);
      response.once('close', () => this.underWay.delete(response));
      if (this.ending) closeAfter(response);
    });
  }

  /**
   * Takes no new connection, closes those that are idle, waits for answers under way, and cuts off what still runs
   * after `forceAfterMs`.
   * @returns whether everything was answered
   */
  async finish(forceAfterMs: number): Promise<boolean> {
    this.ending = true;
    for (const response of this.underWay) closeAfter(response);
    let answeredAll = true;
    const closed = new Promise<void>((resolve) => this.server.close(() => resolve()));
    const timers = [
      setInterval(() => this.server.closeIdleConnections(), lookEveryMs),
      setTimeout(() => this.silent.forEach((socket) => socket.destroy()), firstRequestWithinMs),
      setTimeout(() => {
        answeredAll = false;
        this.server.closeAllConnections();
      }, forceAfterMs),
    ];
    await closed;
    timers.forEach((timer) => clearTimeout(timer));
    return answeredAll;
  }
}

/** Tells the client to come back on another connection, and so perhaps to another process. */
function closeAfter(response: ServerResponse): void {
  if (!response.headersSent) response.setHeader('Connection', 'close');
}
