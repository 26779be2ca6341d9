import { type Role, roles } from '@ellwand/shared/records/roles';
import { doors, rolesThrough } from './doors/doors';
import { addressFor, type Door, runningRoutes } from './doors/routes';
import { type Agent, type House, openHouse } from './harness/house';
import type { TestPerson } from './harness/people';

const mayPass = (role: Role, door: Door) =>
  door === 'public' || door === 'signed-in' || rolesThrough[door].includes(role);

/** Whether the guards turned somebody away, rather than the verb behind them. */
const turnedAway = (code: unknown) => code === 'permission.refused' || code === 'session.none';

describe('every door of the house (ASVS 8.2.1, 8.3.1)', () => {
  let house: House;
  const people = new Map<Role, TestPerson>();
  beforeAll(async () => {
    house = await openHouse();
    for (const role of roles) people.set(role, await house.person(role));
  });
  afterAll(() => house.close());

  const knock = (agent: Agent, method: string, path: string) => {
    const verb = method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
    const request = agent[verb](addressFor(path)).set('If-Match', '"1"');
    return verb === 'get' ? request : request.send({});
  };

  it('is written down, and each that is written down is there', () => {
    expect(runningRoutes(house.app)).toEqual(Object.keys(doors).sort());
  });

  describe.each(Object.entries(doors))('%s: %s', (route, door) => {
    const [method = '', path = ''] = route.split(' ');

    it('without an account', async () => {
      const { status, body } = await knock(house.visitor(), method, path);
      if (door === 'public') {
        expect(status).not.toBe(403);
        // The one public door that asks for a cookie, since the access token may have run out.
        if (path !== '/api/v1/session/refresh') expect(status).not.toBe(401);
      } else {
        expect({ status, code: body.code }).toEqual({ status: 401, code: 'session.none' });
      }
    });

    it.each(roles)('as %s', async (role) => {
      const person = people.get(role);
      if (!person) throw new Error(`There is nobody who is ${role}`);
      const { status, body } = await knock(await house.signInAs(person), method, path);
      if (mayPass(role, door)) {
        expect(status).not.toBe(500);
        expect(turnedAway(body.code)).toBe(false);
      } else {
        expect({ status, code: body.code }).toEqual({ status: 403, code: 'permission.refused' });
      }
    });
  });

  it('stays shut for a change that another site, another port or no page asks for (ASVS 3.5.1)', async () => {
    const curator = people.get('curator');
    if (!curator) throw new Error('There is no curator');
    const origins = [undefined, 'null', 'https://elsewhere.example', 'http://127.0.0.1:1'];
    const changes = Object.keys(doors).filter((route) => !route.startsWith('GET '));
    for (const route of changes) {
      const [method = '', path = ''] = route.split(' ');
      for (const origin of origins) {
        const agent = await house.signInAs(curator);
        const request = knock(agent, method, path);
        const { body } = await (origin ? request.set('Origin', origin) : request.unset('Origin'));
        expect({ route, origin, code: body.code }).toEqual({ route, origin, code: 'origin.refused' });
      }
    }
  });

  it('is not opened by a method that asks differently', async () => {
    const agent = house.visitor().set('X-HTTP-Method-Override', 'DELETE');
    expect((await agent.get('/api/v1/session')).status).toBe(401);
    expect(
      (await house.visitor().options('/api/v1/session')).get('Access-Control-Allow-Origin'),
    ).toBeUndefined();
  });
});
