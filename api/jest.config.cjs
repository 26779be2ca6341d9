// @ts-check
/**
 * Nest reads constructor types at run time, so swc writes them out as tsc does.
 * @type {import('jest').Config['transform']}
 */
const transform = {
  '^.+\\.(ts|js|mjs)$': [
    '@swc/jest',
    {
      jsc: {
        target: 'es2023',
        parser: { syntax: 'typescript', decorators: true },
        transform: { legacyDecorator: true, decoratorMetadata: true },
        keepClassNames: true,
      },
      module: { type: 'commonjs' },
      sourceMaps: 'inline',
    },
  ],
};

/** Packages that publish ES modules only; jest requires, so they are translated like our own sources. */
const modulesOnly = ['@edtf-ts'];

/** @type {import('jest').Config} */
const common = {
  rootDir: __dirname,
  testEnvironment: 'node',
  // `source` is shared's own TypeScript: what is tested is never a stale build.
  testEnvironmentOptions: { customExportConditions: ['source', 'node', 'node-addons'] },
  moduleFileExtensions: ['ts', 'js', 'mjs', 'cjs', 'json', 'node'],
  // shared writes its imports as the browser needs them, `./length.js`; the file is `length.ts`.
  moduleNameMapper: { '^(\\.{1,2}/.*)\\.js$': '$1' },
  transform,
  transformIgnorePatterns: [`/node_modules/(?!(${modulesOnly.join('|')})/)`],
};

/**
 * Two kinds of specs: `unit` stands beside its source and needs nothing; `house` (everything in test/, and
 * `*.house.spec.ts` beside sources) runs the application on a real MariaDB that is started once for all of them.
 * @type {import('jest').Config}
 */
module.exports = {
  maxWorkers: 1,
  testTimeout: 30_000,
  projects: [
    {
      ...common,
      displayName: 'unit',
      testMatch: ['<rootDir>/src/**/*.spec.ts'],
      testPathIgnorePatterns: ['\\.house\\.spec\\.ts$'],
    },
    {
      ...common,
      displayName: 'house',
      testMatch: ['<rootDir>/test/**/*.spec.ts', '<rootDir>/src/**/*.house.spec.ts'],
      globalSetup: '<rootDir>/test/harness/start-database.ts',
      globalTeardown: '<rootDir>/test/harness/stop-database.ts',
    },
  ],
};
