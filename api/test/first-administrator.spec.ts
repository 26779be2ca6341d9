import { newFirstToken } from '../src/auth/first-administrator.service';
import { Work } from '../src/common/work';
import { type House, openHouse } from './harness/house';

const address = '/api/v1/first-administrator';
const person = {
  email: 'tamsin.hale@larkmoor.example',
  name: 'Tamsin Hale',
  password: 'oyster thimble lantern',
};

describe('the first administrator of an empty house', () => {
  let house: House;
  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  afterEach(() => house.empty());

  const newToken = () => house.app.get(Work).run((tx) => newFirstToken(tx, house.clock.now()));
  const enter = (token: string | undefined) =>
    house
      .visitor()
      .post(address)
      .send({ ...person, token });

  it('comes in by the address that was printed, and may invite', async () => {
    const agent = house.visitor();
    const answer = await agent.post(address).send({ ...person, token: await newToken() });
    expect(answer.status).toBe(200);
    expect(answer.body.user).toMatchObject({ roles: ['administrator'] });
    expect((await agent.get('/api/v1/workroom/users')).body.total).toBe(1);
  });

  it('is one, though two requests come at once', async () => {
    const token = await newToken();
    const statuses = (await Promise.all([enter(token), enter(token)])).map(({ status }) => status);
    expect(statuses.sort()).toEqual([200, 404]);
  });

  it('comes in only by the latest address, within the week', async () => {
    const first = await newToken();
    const second = await newToken();
    expect((await enter(first)).body.code).toBe('invitation.unknown');
    house.clock.advance({ days: 8 });
    expect((await enter(second)).body.code).toBe('invitation.unknown');
  });

  it('cannot be made where somebody works already', async () => {
    const token = await newToken();
    await house.person('recorder');
    expect((await enter(token)).status).toBe(404);
    expect(await newToken()).toBeUndefined();
  });

  it('has a link that no invitation’s door opens to', async () => {
    const token = await newToken();
    expect((await house.visitor().post('/api/v1/invitations/look-up').send({ token })).status).toBe(404);
  });
});
