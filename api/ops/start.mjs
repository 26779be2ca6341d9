// @ts-check
/**
 * `npm start`: opens Ellwand on this machine. Nothing but Node itself is needed when it begins, and a Node too
 * old to run the rest must still be able to read this file: everything else is imported after that question.
 */
import { requireNode } from './lib/node-version.mjs';

requireNode(process.versions.node);
void import('./lib/open-ellwand.mjs').then(({ openEllwand }) => openEllwand());
