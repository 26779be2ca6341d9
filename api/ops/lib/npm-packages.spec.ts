import { describe, expect, it } from 'vitest';
import { isInstalled, type LockPackages } from './npm-packages.mjs';

const wanted = {
  '': { version: '0.1.0' },
  shared: { version: '0.1.0' },
  'node_modules/@ellwand/shared': { link: true },
  'node_modules/zod': { version: '4.6.7' },
  'node_modules/only-on-windows': { version: '1.0.0', optional: true },
  'node_modules/left-behind': { version: '2.0.0', extraneous: true },
};
const installed = {
  'node_modules/@ellwand/shared': { link: true },
  'node_modules/zod': { version: '4.6.7' },
};

const notInstalled: { name: string; there: LockPackages }[] = [
  { name: 'nothing is installed', there: {} },
  { name: 'a package is missing', there: { 'node_modules/@ellwand/shared': { link: true } } },
  {
    name: 'a package has another version',
    there: { ...installed, 'node_modules/zod': { version: '4.6.6' } },
  },
  {
    name: 'a workspace is a copy and not a link',
    there: { ...installed, 'node_modules/@ellwand/shared': { version: '0.1.0' } },
  },
  {
    name: 'an optional package has another version',
    there: { ...installed, 'node_modules/only-on-windows': { version: '0.9.0' } },
  },
];

describe('whether the packages of the lock file are installed', () => {
  it('they are when all but optional and extraneous ones are there', () => {
    expect(isInstalled(wanted, installed)).toBe(true);
  });

  it.each(notInstalled)('they are not when $name', ({ there }) => {
    expect(isInstalled(wanted, there)).toBe(false);
  });
});
