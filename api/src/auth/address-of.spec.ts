import { addressOf } from './address-of';

describe('where a request comes from', () => {
  it.each([
    ['192.0.2.7', '192.0.2.7'],
    ['::ffff:192.0.2.7', '192.0.2.7'],
    ['2001:db8::1', '2001:db8:0:0'],
    ['2001:DB8:1:2:3:4:5:6', '2001:db8:1:2'],
    ['2001:db8:1:2::9', '2001:db8:1:2'],
    ['fe80::1%eth0', 'fe80:0:0:0'],
    ['::1', '0:0:0:0'],
  ])('%s counts as %s', (ip, place) => {
    expect(addressOf({ ip })).toBe(place);
  });
});
