// @ts-check
/**
 * A failure that a person can act upon: its message is one plain sentence (or the sentence and the one
 * command that mends it) and is printed without a stack.
 */
export class PlainFailure extends Error {
  /**
   * @param {string} message what is wrong and what to do
   * @param {{ detail?: string }} [more] output of a tool, printed above the sentence
   */
  constructor(message, { detail } = {}) {
    super(message);
    this.name = 'PlainFailure';
    this.detail = detail;
  }
}

/**
 * Runs a script's main function; a plain failure becomes its sentence on stderr and exit code 1.
 * @param {() => Promise<number | void>} main resolves to the exit code, 0 when it says nothing
 */
export async function runMain(main) {
  try {
    process.exitCode = (await main()) ?? 0;
  } catch (failure) {
    printFailure(failure);
    process.exitCode = 1;
  }
}

/** @param {unknown} failure */
export function printFailure(failure) {
  if (!(failure instanceof PlainFailure)) {
    console.error(failure);
    return;
  }
  if (failure.detail) console.error(failure.detail.trimEnd());
  console.error(failure.message);
}
