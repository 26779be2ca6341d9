import { getDataSourceToken } from '@nestjs/typeorm';
import type { DataSource } from 'typeorm';
import { CATALOGUE } from '../src/common/catalogue-connection';
import { type House, openHouse } from './harness/house';

const poolSize = 10;

describe('the connections to the database', () => {
  let house: House;
  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());

  it.each(['default', CATALOGUE])(
    '%s: each one has strict types and an end to every statement',
    async (name) => {
      const source = house.app.get<DataSource>(getDataSourceToken(name));
      const runners = Array.from({ length: poolSize }, () => source.createQueryRunner());
      try {
        for (const runner of runners) {
          const rows: unknown[] = await runner.query(
            'SELECT @@max_statement_time AS seconds, @@innodb_lock_wait_timeout AS waits, @@sql_mode AS mode',
          );
          expect(rows).toEqual([
            { seconds: expect.anything(), waits: '5', mode: expect.stringContaining('STRICT_ALL_TABLES') },
          ]);
          expect(Number((rows[0] as { seconds: string }).seconds)).toBe(15);
        }
      } finally {
        for (const runner of runners) await runner.release();
      }
    },
  );

  it('that are all taken make a caller come back later instead of waiting for ever, and then serve again', async () => {
    const agent = await house.signInAs('administrator');
    const source = house.app.get<DataSource>(getDataSourceToken());
    const runners = Array.from({ length: poolSize }, () => source.createQueryRunner());
    for (const runner of runners) await runner.connect();
    const refused = await agent.get('/api/v1/workroom/users');
    for (const runner of runners) await runner.release();
    expect(refused.body).toMatchObject({ status: 503, code: 'service.unavailable' });
    expect(refused.get('Retry-After')).toBe('2');
    expect((await agent.get('/api/v1/workroom/users')).status).toBe(200);
  });
});
