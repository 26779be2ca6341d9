import { fileURLToPath } from 'node:url';

const shared = fileURLToPath(new URL('../shared', import.meta.url));

/**
 * The shared package from its sources, so that nothing need be built first. An alias and not the condition
 * `source`: other people's packages know that condition too and would hand over theirs.
 */
export const sharedSource = [
  { find: /^@ellwand\/shared\/look\/(.*)$/, replacement: `${shared}/look/$1` },
  { find: /^@ellwand\/shared\/(.*)$/, replacement: `${shared}/src/$1.ts` },
];
