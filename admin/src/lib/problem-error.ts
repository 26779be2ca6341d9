import { Problem } from '@ellwand/shared/records/problem';

/** The API refused: RFC 9457 problem details as an error that screens can read. */
export class ProblemError extends Error {
  override readonly name = 'ProblemError';

  constructor(readonly problem: Problem) {
    super(problem.detail ?? problem.title);
  }

  get status(): number {
    return this.problem.status;
  }

  get code(): string {
    return this.problem.code;
  }

  /** Any further member of the problem, such as `current` or `findings`; undefined where there is none. */
  member(name: string): unknown {
    return this.problem[name];
  }
}

/** No answer came: no network, no server, or an answer that was not ours. Nothing is known of what was sent. */
export class NoAnswer extends Error {
  override readonly name = 'NoAnswer';

  constructor(readonly because: string) {
    super('The museum’s server did not answer. What you typed is still here.');
  }
}

export const isProblem = (error: unknown, code?: string): error is ProblemError =>
  error instanceof ProblemError && (code === undefined || error.code === code);

/** The refusal in an answer's text. An answer that is not problem+json (a proxy's page) still becomes one. */
export function problemOf(status: number, text: string): ProblemError {
  const parsed = Problem.safeParse(parseJson(text));
  if (parsed.success) return new ProblemError(parsed.data);
  return new ProblemError({
    type: 'about:blank',
    title: `The server answered ${status} without saying why.`,
    status,
    code: 'answer.unreadable',
  });
}

export function parseJson(text: string): unknown {
  try {
    return JSON.parse(text) as unknown;
  } catch {
    return undefined;
  }
}
