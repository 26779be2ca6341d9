/** Where (a JSON pointer into `points` and `ownPoints`), and one sentence on what was wanted and what came. */
export interface ProtocolFault {
  readonly pointer: string;
  readonly detail: string;
}
