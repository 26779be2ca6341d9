import { waitAfter } from './slow-down';

describe('the wait after failed sign-ins', () => {
  it.each([
    [0, 0],
    [4, 0],
    [5, 2_000],
    [6, 4_000],
    [8, 16_000],
    [14, 900_000],
    [1_000_000, 900_000],
  ])('after %i for one account is %i ms', (failures, ms) => {
    expect(waitAfter('account', failures)).toBe(ms);
  });

  it('comes later for an address that many people share', () => {
    expect(waitAfter('address', 39)).toBe(0);
    expect(waitAfter('address', 40)).toBe(2_000);
  });
});
