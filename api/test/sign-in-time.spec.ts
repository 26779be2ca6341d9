import { Passwords } from '../src/auth/passwords.service';
import { SignInService } from '../src/auth/sign-in.service';
import { SlowDown } from '../src/auth/slow-down.service';
import { type House, openHouse } from './harness/house';

/** As ISO/IEC 17825 takes a leak for shown: two equal distributions reach it once in some 100,000 runs. */
const leakAt = 4.5;
const caller = { address: '192.0.2.1', agent: 'specs' };

describe('the time that a refused sign-in takes (ASVS 6.3.8)', () => {
  let house: House;
  beforeAll(async () => {
    house = await openHouse();
    // Counting tries is the same for everybody and waits for the disk: it would drown what is measured here.
    jest.spyOn(house.app.get(SlowDown), 'count').mockResolvedValue({ accountKey: '', addressKey: '' });
  });
  afterAll(() => house.close());

  it('does not tell whether the account exists', async () => {
    // A busy machine can put one measuring out; a leak shows in each of them, as the next test proves.
    const found: number[] = [];
    while (found.length < 3 && !found.some((t) => t < leakAt)) {
      const { known, unknown } = await measure(400);
      found.push(Math.abs(welch(known, unknown)));
    }
    expect(Math.min(...found)).toBeLessThan(leakAt);
  }, 180_000);

  it('would tell, if the password of an unknown person were not compared with anything', async () => {
    const passwords = house.app.get(Passwords);
    const fits = passwords.fits.bind(passwords);
    const spy = jest
      .spyOn(passwords, 'fits')
      .mockImplementation((password, kept) => (kept ? fits(password, kept) : Promise.resolve(false)));
    const { known, unknown } = await measure(100);
    spy.mockRestore();
    expect(Math.abs(welch(known, unknown))).toBeGreaterThan(leakAt);
  }, 60_000);

  /** By turns, so that whatever else the machine does falls on both alike. */
  async function measure(samples: number) {
    const { email } = await house.person('recorder');
    const known: number[] = [];
    const unknown: number[] = [];
    for (let sample = 0; sample < samples; sample++) {
      const turns = [
        async () => known.push(await msOf(email)),
        async () => unknown.push(await msOf('nobody.at.all@larkmoor.example')),
      ];
      // Whoever goes second finds everything warm: each goes second half of the time.
      for (const turn of sample % 2 === 0 ? turns : turns.reverse()) await turn();
    }
    return { known, unknown };
  }

  async function msOf(email: string): Promise<number> {
    const began = performance.now();
    await expect(
      house.app.get(SignInService).signIn({ email, password: 'not the password' }, caller),
    ).rejects.toThrow('do not belong together');
    return performance.now() - began;
  }
});

/** Welch's t of two samples, after the slowest tenth of each is cut off: pauses of the machine are not the code's. */
function welch(one: readonly number[], other: readonly number[]): number {
  const [a, b] = [one, other].map(withoutSlowest).map(momentsOf);
  if (!a || !b) throw new Error('Two samples are needed');
  return (a.mean - b.mean) / Math.sqrt(a.variance / a.n + b.variance / b.n);
}

const withoutSlowest = (sample: readonly number[]) =>
  [...sample].sort((x, y) => x - y).slice(0, Math.floor(sample.length * 0.9));

function momentsOf(sample: readonly number[]) {
  const n = sample.length;
  const mean = sample.reduce((sum, x) => sum + x, 0) / n;
  const variance = sample.reduce((sum, x) => sum + (x - mean) ** 2, 0) / (n - 1);
  return { n, mean, variance };
}
