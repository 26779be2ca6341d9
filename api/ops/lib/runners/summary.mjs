// @ts-check
/** @typedef {import('./outcome.mjs').RunnerOutcome} RunnerOutcome */

/**
 * Everything a run has to say, ending in the line `N passed, N failed`.
 * @param {readonly RunnerOutcome[]} outcomes
 * @returns {string}
 */
export function summary(outcomes) {
  return [...outcomes.flatMap(failureLines), '', ...tableLines(outcomes), '', totalLine(outcomes)].join('\n');
}

/** @param {readonly RunnerOutcome[]} outcomes */
export function isGreen(outcomes) {
  return outcomes.length > 0 && outcomes.every(({ passed, failures }) => passed > 0 && failures.length === 0);
}

/** @param {RunnerOutcome} outcome */
export function outcomeLine({ name, passed, failures, seconds }) {
  return `${name}: ${passed} passed, ${failures.length} failed (${seconds} s)`;
}

/** @param {readonly RunnerOutcome[]} outcomes */
function totalLine(outcomes) {
  return `${sum(outcomes.map(({ passed }) => passed))} passed, ${sum(outcomes.map(({ failures }) => failures.length))} failed`;
}

/** @param {RunnerOutcome} outcome */
function failureLines({ name, failures }) {
  return failures.flatMap(({ test, message }) => ['', `✗ ${name}: ${test}`, indented(message)]);
}

/** @param {readonly RunnerOutcome[]} outcomes */
function tableLines(outcomes) {
  const rows = [
    ['runner', 'passed', 'failed', 'time'],
    ...outcomes.map(({ name, passed, failures, seconds }) => [
      name,
      `${passed}`,
      `${failures.length}`,
      `${seconds} s`,
    ]),
  ];
  const widths = [0, 1, 2, 3].map((column) => Math.max(...rows.map((row) => row[column]?.length ?? 0)));
  return rows.map((row) =>
    row
      .map((cell, column) =>
        column === 0 ? cell.padEnd(widths[0] ?? 0) : cell.padStart(widths[column] ?? 0),
      )
      .join('  '),
  );
}

/** @param {string} text */
function indented(text) {
  return text.replace(/^/gm, '    ');
}

/** @param {readonly number[]} numbers */
function sum(numbers) {
  return numbers.reduce((total, number) => total + number, 0);
}
