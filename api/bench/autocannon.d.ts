/** The part of autocannon 9 that is used here; it brings no types of its own. */
declare module 'autocannon' {
  interface Percentiles {
    readonly p50: number;
    readonly p97_5: number;
    readonly p99: number;
    readonly max: number;
  }

  interface Client {
    on(
      event: 'response',
      listener: (statusCode: number, resBytes: number, responseTimeMs: number) => void,
    ): void;
  }

  interface Options {
    readonly url: string;
    readonly connections: number;
    readonly amount: number;
    /** Seconds that a request may take. */
    readonly timeout: number;
    readonly requests: readonly { readonly method: 'GET'; readonly path: string }[];
    readonly setupClient?: (client: Client) => void;
  }

  interface Result {
    readonly latency: Percentiles;
    /** Seconds. */
    readonly duration: number;
    readonly errors: number;
    readonly timeouts: number;
    readonly non2xx: number;
    readonly '2xx': number;
  }

  export default function autocannon(options: Options): Promise<Result> & { stop(): void };
}
