import { againstPassword } from './password-rules';

const owner = { name: 'Wenna Oddie', email: 'w.oddie@larkmoor.example' };

describe('passwords that others would think of', () => {
  it.each([
    'password1234',
    'P@ssw0rd!P@ssw0rd!',
    'qwertyuiop12',
    '123456789012',
    'poiuytrewq09',
    'aaaaaaaaaaaaaaaa',
    'abababababab',
    'Larkmoor2026!',
    'ellwand-museum-1',
    'WennaOddie1902',
    'w.oddie.oddie.w',
    'Summer2026Summer2026',
    'letmeinletmein',
  ])('%s is refused', (password) => {
    expect(againstPassword(password, owner)).toMatch(/^(Easily guessed|Too few different)/);
  });
});

describe('passwords that nobody would think of', () => {
  it.each([
    'seven brass hooks and eyes',
    'correct thimble battery staple',
    'kvä7 ünd fröhlich',
    'xK9#mQ2$vL5p',
    '雨が降る夕方の庭に猫がいる',
    'the oyster walks to church on sunday',
  ])('%s is taken', (password) => {
    expect(againstPassword(password, owner)).toBeUndefined();
  });
});
