import net from 'node:net';
import { describe, expect, it } from 'vitest';
import { freePort, portSentence, requirePort } from './ports.mjs';

async function occupied<T>(work: (port: number) => Promise<T>): Promise<T> {
  const port = await freePort();
  const occupant = net.createServer();
  await new Promise<void>((resolve) => occupant.listen(port, '127.0.0.1', resolve));
  try {
    return await work(port);
  } finally {
    occupant.close();
  }
}

describe('ports', () => {
  it('gives the wished port where it is free', async () => {
    const free = await freePort();
    expect(await freePort(free)).toBe(free);
  });

  it('gives another where the wished one is taken', async () => {
    await occupied(async (port) => {
      const other = await freePort(port);
      expect(other).not.toBe(port);
      await expect(requirePort(other, 'ELLWAND_PORT')).resolves.toBeUndefined();
    });
  });

  it('refuses a taken port in a sentence', async () => {
    await occupied(async (port) => {
      await expect(requirePort(port, 'ELLWAND_PORT')).rejects.toThrow(
        `Port ${port} is in use by another program`,
      );
    });
  });

  it.each([
    {
      port: 80,
      fault: 'EACCES',
      says: 'This account may not listen on port 80: choose one above 1023 with P.',
    },
    { port: 65_000, fault: 'EADDRINUSE', says: 'choose another port with P=64000.' },
    { port: 4310, fault: 'EADDRNOTAVAIL', says: 'Port 4310 cannot be listened on (EADDRNOTAVAIL)' },
  ])('says of $fault what to do', ({ port, fault, says }) => {
    expect(portSentence(port, fault, 'P')).toContain(says);
  });
});
