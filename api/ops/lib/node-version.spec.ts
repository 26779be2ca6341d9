import fs from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { nodeFault, OLDEST_NODE } from './node-version.mjs';
import { root } from './places.mjs';

describe('the version of Node', () => {
  it.each(['20.19.0', '20.20.2', '22.0.0', '24.11.1'])('%s is new enough', (version) => {
    expect(nodeFault(version)).toBeUndefined();
  });

  it.each(['20.18.3', '18.20.4', '12.22.12', '0.10.48'])(
    '%s is too old, and a sentence says so',
    (version) => {
      expect(nodeFault(version)).toBe(`Ellwand needs Node 20.19 or newer; this is Node ${version}.`);
    },
  );

  it('is the one that package.json asks for', () => {
    const { engines } = JSON.parse(fs.readFileSync(path.join(root, 'package.json'), 'utf8')) as {
      engines: { node: string };
    };
    expect(engines.node.startsWith(`>=${OLDEST_NODE}`)).toBe(true);
  });
});
