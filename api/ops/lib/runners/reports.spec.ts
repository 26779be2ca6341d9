import { describe, expect, it } from 'vitest';
import { PlainFailure } from '../plain-failure.mjs';
import { countJestReport } from './jest-report.mjs';
import { outcomeOf } from './outcome.mjs';
import { countPlaywrightReport } from './playwright-report.mjs';
import { isGreen, summary } from './summary.mjs';

const well = { code: 0, output: '' };
const badly = { code: 1, output: 'out of memory' };

function jestFile(statuses: string[], more: { status?: string; message?: string } = {}) {
  return {
    name: '/house/shared/src/waist.spec.ts',
    status: 'passed',
    ...more,
    assertionResults: statuses.map((status, n) => ({
      fullName: `rule ${n}`,
      status,
      failureMessages: status === 'failed' ? ['expected 612, got 611'] : [],
    })),
  };
}

describe('the report of jest and vitest', () => {
  it('counts what passed and names what failed, by file and rule', () => {
    const report = { testResults: [jestFile(['passed', 'failed', 'passed'])] };
    expect(countJestReport(report, badly, '/house')).toEqual({
      passed: 2,
      failures: [{ test: 'shared/src/waist.spec.ts: rule 1', message: 'expected 612, got 611' }],
    });
  });

  it.each(['pending', 'skipped', 'todo'])(
    'counts a test that is %s as failed: it has shown nothing',
    (status) => {
      const { passed, failures } = countJestReport(
        { testResults: [jestFile(['passed', status])] },
        well,
        '/house',
      );
      expect(passed).toBe(1);
      expect(failures[0]?.message).toBe(`was not run (${status})`);
    },
  );

  it('counts a file that broke before its first test', () => {
    const broken = jestFile([], { status: 'failed', message: 'cannot find module' });
    expect(countJestReport({ testResults: [broken] }, badly, '/house').failures).toEqual([
      { test: 'shared/src/waist.spec.ts', message: 'cannot find module' },
    ]);
  });

  it('counts a runner that ended badly although every test passed', () => {
    const { failures } = countJestReport({ testResults: [jestFile(['passed'])] }, badly, '/house');
    expect(failures).toEqual([{ test: 'the runner ended with code 1', message: 'out of memory' }]);
  });
});

function journey(title: string, status: string, message = '') {
  const tests = [{ projectName: 'site', status, results: [{ errors: message ? [{ message }] : [] }] }];
  return { title, file: 'search.spec.ts', tests };
}

describe('the report of Playwright', () => {
  it('counts journeys in suites within suites, and strips the colours of messages', () => {
    const inner = {
      title: 'inner',
      specs: [journey('finds a waist', 'unexpected', '\u001b[31mno such page\u001b[0m')],
    };
    const suites = [{ title: 'outer', specs: [journey('opens', 'expected')], suites: [inner] }];
    expect(countPlaywrightReport({ suites }, badly)).toEqual({
      passed: 1,
      failures: [{ test: 'site: search.spec.ts: finds a waist', message: 'no such page' }],
    });
  });

  it.each(['skipped', 'flaky'])('counts a %s journey as failed', (status) => {
    const { passed, failures } = countPlaywrightReport(
      { suites: [{ title: '', specs: [journey('a', status)] }] },
      well,
    );
    expect(passed).toBe(0);
    expect(failures[0]?.message).toContain(status);
  });

  it('counts an error outside of any journey', () => {
    const { failures } = countPlaywrightReport(
      { suites: [], errors: [{ message: 'no tests found' }] },
      badly,
    );
    expect(failures).toEqual([{ test: 'outside of any journey', message: 'no tests found' }]);
  });
});

describe('a runner', () => {
  const runner = (work: () => Promise<{ passed: number; failures: { test: string; message: string }[] }>) =>
    outcomeOf({ name: 'shared (vitest)', after: [], work });

  it('has failed when it ran nothing', async () => {
    const outcome = await runner(() => Promise.resolve({ passed: 0, failures: [] }));
    expect(outcome.failures).toEqual([{ test: 'shared (vitest)', message: 'ran no test at all' }]);
    expect(isGreen([outcome])).toBe(false);
  });

  it('has failed when it could not run, and says why', async () => {
    const outcome = await runner(() =>
      Promise.reject(new PlainFailure('Building site failed.', { detail: 'line 3' })),
    );
    expect(outcome.failures).toEqual([{ test: 'could not run', message: 'line 3\nBuilding site failed.' }]);
  });
});

describe('the summary', () => {
  const green = { name: 'shared (vitest)', passed: 120, failures: [], seconds: 4 };
  const red = {
    name: 'api (jest)',
    passed: 7,
    failures: [{ test: 'a rule', message: 'broke' }],
    seconds: 61,
  };

  it('ends in the sum over all runners', () => {
    expect(summary([green, red]).split('\n').at(-1)).toBe('127 passed, 1 failed');
  });

  it('names each failing test with its message, and shows every runner with its count and time', () => {
    const text = summary([green, red]);
    expect(text).toContain('✗ api (jest): a rule\n    broke');
    expect(text).toMatch(/shared \(vitest\) +120 +0 +4 s/);
    expect(text).toMatch(/api \(jest\) +7 +1 +61 s/);
  });

  it('is green only when every runner passed something and failed nothing', () => {
    expect(isGreen([green])).toBe(true);
    expect(isGreen([green, red])).toBe(false);
    expect(isGreen([])).toBe(false);
  });
});
