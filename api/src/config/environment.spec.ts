import { readEnvironment } from './environment';

const least = {
  ELLWAND_DB_PORT: '3306',
  ELLWAND_DB_WORKROOM_USER: 'w',
  ELLWAND_DB_WORKROOM_PASSWORD: 'w',
  ELLWAND_DB_CATALOGUE_USER: 'c',
  ELLWAND_DB_CATALOGUE_PASSWORD: 'c',
  ELLWAND_SECRET: 'x'.repeat(32),
  ELLWAND_SMTP_URL: 'smtp://127.0.0.1:25',
};

describe('the environment', () => {
  it('needs little: the rest follows', () => {
    expect(readEnvironment(least)).toMatchObject({
      host: '127.0.0.1',
      port: 4310,
      publicUrl: 'http://127.0.0.1:4310',
      secure: false,
      mailFrom: 'workroom@ellwand.invalid',
      owner: undefined,
    });
  });

  it('takes cookies and the letters’ sender from the public address', () => {
    const environment = readEnvironment({ ...least, ELLWAND_PUBLIC_URL: 'https://dress.larkmoor.example/' });
    expect(environment).toMatchObject({
      publicUrl: 'https://dress.larkmoor.example',
      secure: true,
      mailFrom: 'workroom@dress.larkmoor.example',
    });
  });

  it('lets the catalogue read from a replica', () => {
    const { workroom, catalogue } = readEnvironment({ ...least, ELLWAND_CATALOGUE_DB_HOST: '192.0.2.5' });
    expect([workroom.host, catalogue.host]).toEqual(['127.0.0.1', '192.0.2.5']);
  });

  it.each([
    ['ELLWAND_PORT', '70000'],
    ['ELLWAND_SECRET', 'too short'],
    ['ELLWAND_PUBLIC_URL', 'ftp://larkmoor.example'],
    ['ELLWAND_SMTP_URL', 'http://127.0.0.1'],
    ['ELLWAND_DISK_FLOOR', '-1'],
    ['ELLWAND_MAIL_FROM', 'a@b.example, c@d.example'],
  ])('names %s where it is %s', (name, value) => {
    expect(() => readEnvironment({ ...least, [name]: value })).toThrow(
      new RegExp(`variables are wrong:\\n  ${name}: `),
    );
  });

  it('names every fault at once', () => {
    const faults = Object.keys(least).length;
    const message = thrownBy(() => readEnvironment({}));
    expect(message.split('\n')).toHaveLength(1 + faults);
  });
});

function thrownBy(act: () => unknown): string {
  try {
    act();
  } catch (fault) {
    return fault instanceof Error ? fault.message : String(fault);
  }
  throw new Error('Nothing was thrown');
}
