import fs from 'node:fs';
import path from 'node:path';
import { ESLint } from 'eslint';
import { describe, expect, it } from 'vitest';
import { root } from '../lib/places.mjs';
import { walls } from './walls.mjs';

/** Rules that hold walls; the others need types, which a file that is not on disk has none of. */
const HOLDING = ['import-x/no-restricted-paths', 'no-restricted-imports'];

const linter = new ESLint({
  cwd: root,
  ruleFilter: ({ ruleId }) => HOLDING.includes(ruleId),
  overrideConfig: { languageOptions: { parserOptions: { projectService: false } } },
});

/** Lints one import as if it stood in a file of that name, and returns what is said against it. */
async function objectionsTo(specifier: string, inFile: string): Promise<string[]> {
  const [result] = await linter.lintText(`import '${specifier}';\n`, { filePath: path.join(root, inFile) });
  return (result?.messages ?? []).map(({ message }) => message);
}

/** A relative import from one file of the house to another. */
function relativeImport(from: string, to: string): string {
  const relative = path.relative(path.dirname(from), to).replace(/\.tsx?$/, '');
  return relative.startsWith('.') ? relative : `./${relative}`;
}

/** The first module below a folder that lies outside of the wall's exceptions. */
function moduleBehind(wall: (typeof walls)[number]): string {
  const allowed = [wall.target, ...(wall.except ?? []).map((name) => path.join(wall.from, name))];
  const found = modulesBelow(wall.from).find((file) => allowed.every((folder) => isOutside(file, folder)));
  if (!found) throw new Error(`no module stands behind the wall ${wall.target} from ${wall.from}`);
  return found;
}

function modulesBelow(folder: string): string[] {
  return fs
    .readdirSync(path.join(root, folder), { recursive: true, encoding: 'utf8' })
    .filter((name) => /(^|\/)src\/.*\.tsx?$/.test(path.join(folder, name)))
    .filter((name) => !name.includes('node_modules') && !name.endsWith('.spec.ts'))
    .map((name) => path.join(folder, name))
    .sort();
}

function isOutside(file: string, folder: string): boolean {
  return path.relative(folder, file).startsWith('..');
}

describe('the walls between rooms', () => {
  it.each(walls)('$target may not import what lies behind its wall in $from', async (wall) => {
    const probe = path.join(wall.target, 'probe.ts');
    const objections = await objectionsTo(relativeImport(probe, moduleBehind(wall)), probe);
    expect(objections.join('\n')).toContain(wall.message);
  });

  it('are the same for an import by the name of a package', async () => {
    const objections = await objectionsTo('@ellwand/api/src/app.module', 'admin/src/probe.ts');
    expect(objections.join('\n')).toContain('The Workroom meets the API over HTTP.');
  });

  it.each([
    { file: 'api/src/catalogue/probe.ts', specifier: '@ellwand/shared/units/length' },
    { file: 'api/src/catalogue/probe.ts', specifier: '../common/refusal' },
    { file: 'api/src/publishing/probe.ts', specifier: '../catalogue/catalogue.module' },
    { file: 'site/src/probe.ts', specifier: '@ellwand/shared/units/length' },
  ])('let $file import $specifier', async ({ file, specifier }) => {
    expect(await objectionsTo(specifier, file)).toEqual([]);
  });
});

describe('shared', () => {
  it.each(['react', '@nestjs/common', 'node:fs', 'fs', 'typeorm', '@ellwand/api/src/main'])(
    'may not import %s: no framework, no input or output',
    async (specifier) => {
      const objections = await objectionsTo(specifier, 'shared/src/probe.ts');
      expect(objections.join('\n')).toContain('shared knows no framework and does no I/O');
    },
  );

  it.each(['zod', 'fraction.js', '@edtf-ts/core', './units/length.js'])(
    'may import %s',
    async (specifier) => {
      expect(await objectionsTo(specifier, 'shared/src/probe.ts')).toEqual([]);
    },
  );
});

describe('the public catalogue', () => {
  it('takes its connection from common: @nestjs/typeorm by itself would hand it the account of the Workroom', async () => {
    const objections = await objectionsTo('@nestjs/typeorm', 'api/src/catalogue/probe.ts');
    expect(objections.join('\n')).toContain('common/catalogue-connection');
    expect(await objectionsTo('@nestjs/typeorm', 'api/src/common/probe.ts')).toEqual([]);
  });
});
