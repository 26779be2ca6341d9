import { createHmac } from 'node:crypto';
import { isAncestor } from './refresh-chain';
import { hashOf } from './secrets';

const successor = (secret: string) => createHmac('sha256', 'key').update(secret).digest('base64url');

describe('the chain of refresh tokens', () => {
  it('knows a token that was good any number of renewals ago', () => {
    let current = 'first';
    for (let renewal = 0; renewal < 1_008; renewal++) current = successor(current);
    expect(isAncestor('first', hashOf(current), successor)).toBe(true);
  });

  it('does not take a stranger’s token, nor the present one, for an earlier one', () => {
    const current = successor('first');
    expect(isAncestor('another', hashOf(current), successor)).toBe(false);
    expect(isAncestor(current, hashOf(current), successor)).toBe(false);
  });
});
