/** Lets so many through at once; whoever comes later waits in line. */
export class Gate {
  private free: number;
  private readonly line: (() => void)[] = [];

  constructor(atOnce: number) {
    this.free = atOnce;
  }

  async pass<T>(work: () => Promise<T>): Promise<T> {
    if (this.free > 0) this.free -= 1;
    else await new Promise<void>((turn) => this.line.push(turn));
    try {
      return await work();
    } finally {
      const next = this.line.shift();
      if (next) next();
      else this.free += 1;
    }
  }
}
