// @ts-check
/** `npm run check`: types, lint and unit tests, in at most three minutes. */
import { requireNode } from './lib/node-version.mjs';

requireNode(process.versions.node);
void import('./lib/test-ellwand.mjs').then(({ checkEllwand }) => checkEllwand(['types', 'lint', 'unit']));
