// @ts-check
/**
 * `node --conditions=source run-typescript.mjs src/main.ts` runs one of our sources as a process of its own, as jest
 * runs it: translated by swc one file at a time, shared's from its own TypeScript.
 */
import { readFileSync } from 'node:fs';
import Module, { createRequire } from 'node:module';
import { resolve as absolute } from 'node:path';
import { transformSync } from '@swc/core';

/**
 * Node's own hooks for `require`; their names are stable, their types are not published.
 * @typedef {(module: { _compile(code: string, file: string): void }, file: string) => void} Translate
 * @typedef {(request: string, ...rest: unknown[]) => string} Resolve
 * @typedef {{ _extensions: Record<string, Translate>, _resolveFilename: Resolve }} RequireHooks
 */

/** @type {import('@swc/core').Options} */
const options = {
  jsc: {
    target: 'es2023',
    parser: { syntax: 'typescript', decorators: true },
    transform: { legacyDecorator: true, decoratorMetadata: true },
    keepClassNames: true,
  },
  module: { type: 'commonjs' },
  sourceMaps: 'inline',
};

/** @type {object} */
const required = Module;
const hooks = /** @type {RequireHooks} */ (required);

/** @type {Translate} */
const translate = (module, filename) => {
  module._compile(transformSync(readFileSync(filename, 'utf8'), { ...options, filename }).code, filename);
};
hooks._extensions['.ts'] = translate;

const resolveAsNode = hooks._resolveFilename;
/** @type {Resolve} */
const resolve = (request, ...rest) => {
  try {
    return resolveAsNode(request, ...rest);
  } catch (fault) {
    // shared writes its imports as the browser needs them, `./length.js`; the file is `length.ts`.
    if (!/^\.{1,2}\/.*\.js$/.test(request)) throw fault;
    return resolveAsNode(request.replace(/\.js$/, '.ts'), ...rest);
  }
};
hooks._resolveFilename = resolve;

const script = absolute(process.argv[2] ?? '');
createRequire(script)(script);
