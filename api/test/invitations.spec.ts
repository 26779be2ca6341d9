import { type Agent, type House, openHouse } from './harness/house';

const invitations = '/api/v1/workroom/invitations';
const lookUp = '/api/v1/invitations/look-up';
const accept = '/api/v1/invitations/accept';
const wanted = { email: 'Corin.Vaisey@Larkmoor.example', name: 'Corin Vaisey', roles: ['recorder'] };
const email = 'corin.vaisey@larkmoor.example';
const password = 'oyster thimble lantern';

describe('invitations', () => {
  let house: House;
  let administrator: Agent;
  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());
  beforeEach(async () => {
    administrator = await house.signInAs(await house.person('administrator', 'Tamsin Hale'));
  });
  afterEach(() => house.empty());

  const invite = (changes: object = {}) => administrator.post(invitations).send({ ...wanted, ...changes });
  const take = (token: string, changes: object = {}) =>
    house
      .visitor()
      .post(accept)
      .send({ token, name: 'Corin Vaisey', password, ...changes });

  it('go from the administrator by letter to the person, who chooses a password and is signed in', async () => {
    expect((await invite()).body).toMatchObject({ email, state: 'open', invitedBy: 'Tamsin Hale' });
    const token = await house.tokenFor(email);
    const shown = await house.visitor().post(lookUp).send({ token });
    expect(shown.body).toMatchObject({ email, name: 'Corin Vaisey', roles: ['recorder'] });
    const corin = house.visitor();
    const accepted = await corin.post(accept).send({ token, name: 'Corin J. Vaisey', password });
    expect(accepted.status).toBe(200);
    expect((await corin.get('/api/v1/session')).body.user).toMatchObject({ name: 'Corin J. Vaisey', email });
    const again = await house.visitor().post('/api/v1/session').send({ email, password });
    expect(again.status).toBe(200);
    expect((await administrator.get(invitations)).body.items).toMatchObject([{ state: 'accepted' }]);
  });

  it('are good once, also for two requests at once', async () => {
    await invite();
    const token = await house.tokenFor(email);
    const statuses = (await Promise.all([take(token), take(token), take(token)])).map(({ status }) => status);
    expect(statuses.sort()).toEqual([200, 404, 404]);
    expect((await take(token)).body.code).toBe('invitation.unknown');
  });

  it('that are expired, withdrawn, replaced or made up all look alike', async () => {
    await invite();
    const replaced = await house.tokenFor(email);
    const second = await invite();
    const withdrawn = await house.tokenFor(email);
    expect((await administrator.delete(`${invitations}/${String(second.body.id)}`)).status).toBe(204);
    await invite({ email: 'late@larkmoor.example' });
    const expired = await house.tokenFor('late@larkmoor.example');
    house.clock.advance({ days: 7, minutes: 1 });
    const answers = await Promise.all(
      [replaced, withdrawn, expired, 'A'.repeat(43)].map((token) =>
        house.visitor().post(lookUp).send({ token }),
      ),
    );
    for (const answer of answers) {
      expect(answer.status).toBe(404);
      expect(answer.body).toEqual(answers[0]?.body);
    }
  });

  it('cannot be taken back once accepted', async () => {
    const { body } = await invite();
    await take(await house.tokenFor(email));
    expect((await administrator.delete(`${invitations}/${String(body.id)}`)).body.code).toBe(
      'invitation.closed',
    );
  });

  it('are refused for somebody who works here already', async () => {
    await invite();
    await take(await house.tokenFor(email));
    expect((await invite()).body).toMatchObject({ status: 409, code: 'invitation.known' });
  });

  it('refuse a password that others would think of, and stay open', async () => {
    await invite();
    const token = await house.tokenFor(email);
    const refused = await take(token, { password: 'CorinVaisey2026' });
    expect(refused.body).toMatchObject({ status: 422, code: 'password.common' });
    expect(refused.body.errors[0].pointer).toBe('/password');
    expect((await take(token, { password: 'short' })).body.errors[0].pointer).toBe('/password');
    expect((await take(token)).status).toBe(200);
  });

  it.each([
    'a@larkmoor.example\r\nBcc: b@larkmoor.example',
    'a@larkmoor.example, b@larkmoor.example',
    '"a@larkmoor.example" <b@larkmoor.example>',
    'a@larkmoor.example\u0000',
  ])('take one address and nothing else (ASVS 1.3.11): %j', async (address) => {
    expect((await invite({ email: address })).status).toBe(400);
    expect(await house.inbox()).toHaveLength(0);
  });

  it('send nobody a second header by a name (ASVS 1.3.11)', async () => {
    expect((await invite({ name: 'Corin\r\nBcc: b@larkmoor.example' })).status).toBe(400);
    await invite({ name: 'Corin “,;:<b@larkmoor.example>' });
    const [letter] = await house.inbox();
    expect(letter?.recipients).toEqual([email]);
    expect(letter?.mail.headers.has('bcc')).toBe(false);
  });

  it('leave neither a row nor a letter where the trail cannot be written', async () => {
    await house.owner.source.query('RENAME TABLE ellwand_audit.entry TO ellwand_audit.away');
    try {
      expect((await invite()).status).toBe(500);
    } finally {
      await house.owner.source.query('RENAME TABLE ellwand_audit.away TO ellwand_audit.entry');
    }
    expect((await administrator.get(invitations)).body.items).toEqual([]);
    expect(await house.inbox()).toHaveLength(0);
  });
});
