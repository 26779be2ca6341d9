import { refuseUnlessDurable } from './durability';

const serverSetTo = (setting: string) => ({ query: () => Promise.resolve([{ setting }]) });

describe('a database that may lose what it has acknowledged', () => {
  it.each(['0', '2', '3'])('is refused when it is set to %s, in one sentence', async (setting) => {
    await expect(refuseUnlessDurable(serverSetTo(setting))).rejects.toThrow(
      `set innodb_flush_log_at_trx_commit to 1, it is ${setting}.`,
    );
  });

  it('is taken when each commit reaches the disk', async () => {
    await expect(refuseUnlessDurable(serverSetTo('1'))).resolves.toBeUndefined();
  });
});
