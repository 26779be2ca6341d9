import { hashOf } from './secrets';

/** One renewal every ten minutes makes 1,008 in the week that a session lasts at most; a busy client makes some more. */
export const longestChain = 2_000;

/**
 * Refresh tokens form a chain: each one's successor is its keyed digest, so that the server, which keeps only
 * hashes, can hand out the same successor twice.
 */
export type Successor = (secret: string) => string;

/**
 * Whether a token was once a good one of the session whose present token has `currentHash`: then it has been
 * copied, for its owner has long had a later one.
 */
export function isAncestor(secret: string, currentHash: string, successor: Successor): boolean {
  let later = secret;
  for (let step = 0; step < longestChain; step++) {
    later = successor(later);
    if (hashOf(later) === currentHash) return true;
  }
  return false;
}
