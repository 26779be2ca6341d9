import { describe, expect, it } from 'vitest';
import { readSettings } from './settings.mjs';

describe('settings of npm start', () => {
  it('are those of a private house where nothing is said', () => {
    expect(readSettings({}, [], '/house')).toEqual({
      port: 4310,
      dataFolder: '/house/.data',
      empty: false,
      publicUrl: 'http://127.0.0.1:4310',
      smtpUrl: undefined,
      ownDatabase: true,
    });
  });

  it('let the public address follow the port, and lose a slash at its end', () => {
    expect(readSettings({ ELLWAND_PORT: '5000' }, [], '/house').publicUrl).toBe('http://127.0.0.1:5000');
    expect(readSettings({ ELLWAND_PUBLIC_URL: 'https://dress.example/' }, [], '/house').publicUrl).toBe(
      'https://dress.example',
    );
  });

  it('take an empty variable for one that is not set', () => {
    expect(readSettings({ ELLWAND_DB_HOST: '', ELLWAND_DATA: ' ' }, [], '/house')).toMatchObject({
      ownDatabase: true,
      dataFolder: '/house/.data',
    });
  });

  it('leave a database server alone that is already there', () => {
    expect(readSettings({ ELLWAND_DB_HOST: '10.0.0.5' }, [], '/house').ownDatabase).toBe(false);
  });

  it.each(['0', '70000', '-1', '4310x', '1e3'])('refuse %s as a port', (port) => {
    expect(() => readSettings({ ELLWAND_PORT: port }, [], '/house')).toThrow(
      `ELLWAND_PORT must be a port from 1 to 65535, not "${port}".`,
    );
  });

  it.each(['dress.example', 'ftp://dress.example', 'javascript:alert(1)'])(
    'refuse %s as an address',
    (url) => {
      expect(() => readSettings({ ELLWAND_PUBLIC_URL: url }, [], '/house')).toThrow(
        'ELLWAND_PUBLIC_URL must be',
      );
    },
  );
});
