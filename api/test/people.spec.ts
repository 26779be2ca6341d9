import { type Agent, type House, openHouse } from './harness/house';
import type { TestPerson } from './harness/people';

const users = '/api/v1/workroom/users';

describe('the people who work here', () => {
  let house: House;
  let tamsin: TestPerson;
  let administrator: Agent;
  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  beforeEach(async () => {
    tamsin = await house.person('administrator', 'Tamsin Hale');
    administrator = await house.signInAs(tamsin);
  });
  afterEach(() => house.empty());

  const change = (person: TestPerson, seen: number, body: object) =>
    administrator.patch(`${users}/${person.id}`).set('If-Match', `"${seen}"`).send(body);

  it('are listed by page, without anything of their passwords', async () => {
    await house.person('recorder', 'Wenna Oddie');
    const { body } = await administrator.get(`${users}?page=2&size=1`);
    expect(body).toMatchObject({ total: 2, page: 2, size: 1 });
    expect(Object.keys(body.items[0] as object).sort()).toEqual(
      ['active', 'email', 'id', 'lastSignInAt', 'name', 'roles', 'version'].sort(),
    );
  });

  it('get other roles with their next request', async () => {
    const wenna = await house.person('recorder');
    const agent = await house.signInAs(wenna);
    expect((await agent.get('/api/v1/workroom/audit')).status).toBe(403);
    const answer = await change(wenna, 1, { roles: ['curator', 'curator'] });
    expect(answer.body).toMatchObject({ roles: ['curator'], version: 2 });
    expect(answer.get('ETag')).toBe('"2"');
    expect((await agent.get('/api/v1/workroom/audit')).status).toBe(200);
  });

  it('are signed out everywhere, and not let in again, once they have left', async () => {
    const wenna = await house.person('recorder');
    const agents = [await house.signInAs(wenna), await house.signInAs(wenna)];
    expect((await change(wenna, 1, { active: false })).status).toBe(200);
    for (const agent of agents) {
      expect((await agent.get('/api/v1/session')).status).toBe(401);
      expect((await agent.post('/api/v1/session/refresh')).status).toBe(401);
    }
    const { body } = await administrator.get('/api/v1/workroom/colleagues');
    expect(body.items).toEqual([{ id: tamsin.id, name: 'Tamsin Hale' }]);
    await change(wenna, 2, { active: true });
    expect((await agents[0]?.get('/api/v1/session'))?.status).toBe(401);
  });

  it('are changed only by whoever saw how they are now', async () => {
    const wenna = await house.person('recorder');
    const unseen = await administrator.patch(`${users}/${wenna.id}`).send({ name: 'Wenna' });
    expect(unseen.body).toMatchObject({ status: 428, code: 'version.required' });
    await change(wenna, 1, { name: 'Wenna A. Oddie' });
    expect((await change(wenna, 1, { name: 'Lost' })).body).toMatchObject({
      status: 412,
      code: 'version.stale',
      current: 2,
      changedBy: 'Tamsin Hale',
      changedAt: expect.any(String),
    });
  });

  it.each([{ active: false }, { roles: ['curator'] }])('keep one administrator: %j', async (body) => {
    expect((await change(tamsin, 1, body)).body.code).toBe('user.last-administrator');
    await house.person('administrator');
    expect((await change(tamsin, 1, body)).status).toBe(200);
  });

  it('keep one administrator also when two dismiss one another at once', async () => {
    const other = await house.person('administrator');
    const others = await house.signInAs(other);
    const answers = await Promise.all([
      change(other, 1, { active: false }),
      others.patch(`${users}/${tamsin.id}`).set('If-Match', '"1"').send({ active: false }),
    ]);
    expect(answers.filter(({ status }) => status === 200)).toHaveLength(1);
  });

  it.each([{ active: false }, { roles: ['curator'] }])(
    'leave no open invitation of theirs when they may invite nobody any more: %j',
    async (body) => {
      const other = await house.person('administrator');
      const others = await house.signInAs(other);
      const invited = { email: 'late@larkmoor.example', name: 'Perrin Late', roles: ['administrator'] };
      await others.post('/api/v1/workroom/invitations').send(invited);
      const token = await house.tokenFor('late@larkmoor.example');
      expect((await change(other, 1, body)).status).toBe(200);
      const answer = await house.visitor().post('/api/v1/invitations/look-up').send({ token });
      expect(answer.body).toMatchObject({ status: 404, code: 'invitation.unknown' });
    },
  );

  it('cannot be given fields that nobody may set', async () => {
    for (const body of [
      { email: 'x@larkmoor.example' },
      { passwordHash: 'x' },
      { version: 9 },
      { id: tamsin.id },
    ]) {
      expect((await change(tamsin, 1, body)).status).toBe(400);
    }
  });

  it('leave a trail of what was changed, which tells each person’s story', async () => {
    const wenna = await house.person('recorder', 'Wenna Oddie');
    await change(wenna, 1, { name: 'Wenna A. Oddie' });
    await change(wenna, 2, { active: false });
    const { body } = await administrator.get(`/api/v1/workroom/audit?subjectId=${wenna.id}`);
    expect(body.items).toMatchObject([
      { actor: 'Tamsin Hale', verb: 'deactivate-user', summary: 'Wenna A. Oddie no longer works here' },
      { actor: 'Tamsin Hale', verb: 'change-user' },
    ]);
  });
});
