/** One thing wrong in a request: a JSON pointer (RFC 6901) and how to mend it. */
export interface ProblemError {
  readonly pointer: string;
  readonly detail: string;
}
