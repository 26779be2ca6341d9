import { isProblem, NoAnswer } from '../../lib/problem-error.js';

/** Why signing in failed, without telling which of address and password was wrong. */
export function signInSentence(error: unknown): string {
  if (error instanceof NoAnswer) return 'The museum’s server did not answer. Try again in a moment.';
  if (isProblem(error) && error.status === 429) {
    return 'There were many tries. Wait a minute, then sign in again.';
  }
  if (isProblem(error, 'sign-in.refused')) {
    return 'The e-mail address and the password do not belong together. Check both.';
  }
  return error instanceof Error ? error.message : 'Signing in failed.';
}
