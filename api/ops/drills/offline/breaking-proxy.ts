import net from 'node:net';

/**
 * `through`: every byte passes. `down`: nobody answers. `lose-answer`: what is sent arrives and is worked on, but the
 * connection breaks before the first byte of the answer has come back.
 */
export type Weather = 'through' | 'down' | 'lose-answer';

/** A network that breaks on command, between the browser and the house. Loopback only. */
export class BreakingProxy {
  weather: Weather = 'through';
  /** How many answers were lost on their way. */
  lost = 0;
  private readonly sockets = new Set<net.Socket>();
  private readonly server: net.Server;

  private constructor(private readonly target: () => number) {
    this.server = net.createServer((client) => this.join(client));
  }

  static async open(port: number, target: () => number): Promise<BreakingProxy> {
    const proxy = new BreakingProxy(target);
    await new Promise<void>((resolve, reject) => {
      proxy.server.once('error', reject);
      proxy.server.listen(port, '127.0.0.1', resolve);
    });
    return proxy;
  }

  /** From now on; connections that are open break off. */
  turn(weather: Weather): void {
    this.weather = weather;
    this.breakAll();
  }

  async close(): Promise<void> {
    this.breakAll();
    await new Promise<void>((resolve) => this.server.close(() => resolve()));
  }

  private breakAll(): void {
    for (const socket of this.sockets) socket.destroy();
  }

  private join(client: net.Socket): void {
    if (this.weather === 'down') {
      client.destroy();
      return;
    }
    const house = net.connect(this.target(), '127.0.0.1');
    for (const socket of [client, house]) this.keep(socket);
    client.on('data', (bytes) => void house.write(bytes));
    house.on('data', (bytes) => {
      if (this.weather !== 'lose-answer') {
        client.write(bytes);
        return;
      }
      this.lost += 1;
      client.destroy();
      house.destroy();
    });
    client.on('close', () => house.destroy());
    house.on('close', () => client.destroy());
  }

  private keep(socket: net.Socket): void {
    this.sockets.add(socket);
    // A broken connection is what this is for.
    socket.on('error', () => undefined);
    socket.on('close', () => this.sockets.delete(socket));
  }
}
