// @ts-check
/**
 * `npm test`: lint, types, unit tests, the API on a real MariaDB, journeys in a real browser. Installs what is
 * missing, runs beside a started Ellwand, and ends in the line `N passed, N failed`.
 */
import { requireNode } from './lib/node-version.mjs';

requireNode(process.versions.node);
void import('./lib/test-ellwand.mjs').then(({ testEllwand }) => testEllwand());
