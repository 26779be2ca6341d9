/**
 * Measures how fast the public catalogue answers on a running house: `npm run bench -- --url http://127.0.0.1:4310`.
 * Ends with 1 only where an answer failed; how fast is fast enough is for a person to judge.
 */
import { parseArgs } from 'node:util';
import type { SearchAnswer } from '@ellwand/shared/records/published-garment';
import autocannon from 'autocannon';
import { percentile } from './percentile';
import { variedQueries } from './varied-queries';

const connections = 20;
/** Two runs of this stay below what one address may ask in a minute (common/limits.ts). */
const requestsEach = 1_200;
/** Asked beforehand and not counted: a house that has just opened compiles its code while it answers. */
const warmingUp = 300;
const longestMs = 15_000;
/** The aim on a machine of two cores. */
const aimMs = 50;

interface Measured {
  readonly name: string;
  readonly times: readonly number[];
  readonly seconds: number;
  readonly failed: number;
  readonly statuses: ReadonlyMap<number, number>;
}

async function measure(
  name: string,
  url: string,
  paths: readonly string[],
  amount = requestsEach,
): Promise<Measured> {
  const times: number[] = [];
  const statuses = new Map<number, number>();
  const run = autocannon({
    url,
    connections,
    amount,
    timeout: 10,
    requests: paths.map((path) => ({ method: 'GET', path })),
    setupClient: (client) =>
      client.on('response', (status, _bytes, timeMs) => {
        times.push(timeMs);
        statuses.set(status, (statuses.get(status) ?? 0) + 1);
      }),
  });
  const end = setTimeout(() => run.stop(), longestMs);
  const { duration, errors, timeouts, non2xx } = await run;
  clearTimeout(end);
  return { name, times, seconds: duration, failed: errors + timeouts + non2xx, statuses };
}

function say({ name, times, seconds, failed, statuses }: Measured): void {
  const ms = (share: number) => `${percentile(times, share).toFixed(1)} ms`;
  const rate = (times.length / seconds).toFixed(0);
  const aim = percentile(times, 0.95) <= aimMs ? 'within' : 'beyond';
  process.stdout.write(
    `${name.padEnd(14)} p50 ${ms(0.5)}  p95 ${ms(0.95)} (${aim} ${aimMs} ms)  p99 ${ms(0.99)}  ${rate} requests/s\n`,
  );
  if (failed === 0) return;
  const counted = [...statuses].map(([status, count]) => `${status}: ${count}`).join(', ');
  process.stdout.write(`  ${failed} failed (${counted}). 429 means: wait a minute, then measure again.\n`);
}

async function main(): Promise<void> {
  const { values } = parseArgs({ options: { url: { type: 'string', default: 'http://127.0.0.1:4310' } } });
  const url = values.url.replace(/\/$/, '');
  const base = '/api/v1/catalogue/garments';
  const response = await fetch(`${url}${base}?size=100`);
  if (!response.ok) throw new Error(`${url} answered ${response.status}`);
  const answer = (await response.json()) as SearchAnswer;
  if (answer.items.length === 0)
    throw new Error('Nothing is published there, so there is nothing to measure');
  const garments = answer.items.map(({ number }) => `${base}/${number}`);
  const searches = variedQueries(answer).map((query) => base + query);
  await measure('Warming up', url, [...garments, ...searches], warmingUp);
  const measured = [await measure('Garments', url, garments), await measure('Searches', url, searches)];
  measured.forEach(say);
  if (measured.some(({ failed }) => failed > 0)) process.exitCode = 1;
}

main().catch((fault: unknown) => {
  process.stderr.write(`${fault instanceof Error ? fault.message : String(fault)}\n`);
  process.exitCode = 1;
});
