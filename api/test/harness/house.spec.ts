import { type House, openHouse } from './house';

describe('the house that specs open', () => {
  let house: House;
  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  afterEach(() => house.empty());

  it('answers an unknown address as a problem document', async () => {
    const answer = await house.visitor().get('/api/v1/no-such-thing');
    expect(answer.status).toBe(404);
    expect(answer.type).toBe('application/problem+json');
    expect(answer.body.code).toBe('http.404');
  });

  it('is empty again after each test', async () => {
    await house.person('recorder');
    await house.empty();
    const rows: { n: string }[] = await house.owner.source.query('SELECT COUNT(*) AS n FROM ellwand.user');
    expect(Number(rows[0]?.n)).toBe(0);
  });
});
