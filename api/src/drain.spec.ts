import { once } from 'node:events';
import { createServer, type RequestListener } from 'node:http';
import { type AddressInfo, connect } from 'node:net';
import { setTimeout as wait } from 'node:timers/promises';
import { Drain } from './drain';

async function listening(answer: RequestListener) {
  const server = createServer(answer);
  const drain = new Drain(server);
  server.listen(0, '127.0.0.1');
  await once(server, 'listening');
  const { port } = server.address() as AddressInfo;
  return { drain, port, url: `http://127.0.0.1:${port}/` };
}

describe('stopping a server', () => {
  it('lets an answer under way end, and asks its client not to come back on that connection', async () => {
    const { drain, url } = await listening((_, response) => void wait(300).then(() => response.end('whole')));
    const asked = fetch(url);
    await wait(100);
    const finished = drain.finish(5_000);
    const answer = await asked;
    expect(await answer.text()).toBe('whole');
    expect(answer.headers.get('connection')).toBe('close');
    expect(await finished).toBe(true);
  });

  it('takes no new connection', async () => {
    const { drain, url } = await listening((_, response) => response.end());
    await drain.finish(1_000);
    await expect(fetch(url)).rejects.toThrow('fetch failed');
  });

  it('lets go of a connection that has asked for nothing', async () => {
    const { drain, port } = await listening((_, response) => response.end());
    connect(port, '127.0.0.1').on('error', () => undefined);
    await wait(50);
    const began = Date.now();
    expect(await drain.finish(5_000)).toBe(true);
    expect(Date.now() - began).toBeLessThan(2_000);
  });

  it('cuts off what never ends, and says so', async () => {
    const { drain, url } = await listening(() => undefined);
    const asked = fetch(url).catch((fault: unknown) => fault);
    await wait(50);
    expect(await drain.finish(200)).toBe(false);
    expect(String(await asked)).toContain('fetch failed');
  });
});
