import type { ProblemError } from './problem-error';

/**
 * An expected "no": typed, with a stable code that programs may rely on and a sentence that people can use.
 * One filter turns it into problem+json; surprises are thrown as ordinary errors and told as 500 without detail.
 */
export class Refusal extends Error {
  constructor(
    readonly status: number,
    readonly code: string,
    message: string,
    /** Further members of the problem document: facts a screen needs. */
    readonly facts: Readonly<Record<string, unknown>> = {},
    readonly errors: readonly ProblemError[] = [],
    /** Response headers, such as Retry-After. */
    readonly headers: Readonly<Record<string, string>> = {},
  ) {
    super(message);
  }
}

export const notFound = (code: string, what: string) => new Refusal(404, code, `There is no such ${what}.`);
export const conflict = (code: string, message: string, facts?: Record<string, unknown>) =>
  new Refusal(409, code, message, facts);
export const forbidden = (code: string, message: string) => new Refusal(403, code, message);
