// @ts-check
/** `npm run types`, `npm run lint`, `npm run unit`: one part of the check by itself. */
import { requireNode } from './lib/node-version.mjs';

requireNode(process.versions.node);
const [part = ''] = process.argv.slice(2);
if (['types', 'lint', 'unit'].includes(part)) {
  void import('./lib/test-ellwand.mjs').then(({ checkEllwand }) => checkEllwand([part]));
} else {
  console.error('Usage: node api/ops/run.mjs types|lint|unit');
  process.exitCode = 1;
}
