import type { z } from 'zod';
import { reach } from '../offline/reach.js';
import { NoAnswer, parseJson, problemOf } from './problem-error.js';
import { refreshSession, waitForSignIn } from './session-gate.js';

const PREFIX = '/api/v1';

export interface SendOptions {
  readonly body?: unknown;
  /** The version that the sender saw: becomes `If-Match: "<version>"`. */
  readonly version?: number;
  readonly signal?: AbortSignal;
  /** For the few requests that are about the session itself: a 401 is an answer, not an interruption. */
  readonly sessionless?: boolean;
}

function headersOf({ body, version }: SendOptions): HeadersInit {
  const headers: Record<string, string> = { Accept: 'application/json, application/problem+json' };
  if (body !== undefined) headers['Content-Type'] = 'application/json';
  if (version !== undefined) headers['If-Match'] = `"${version}"`;
  return headers;
}

async function ask(method: string, path: string, options: SendOptions): Promise<Response> {
  try {
    const answer = await fetch(PREFIX + path, {
      method,
      credentials: 'same-origin',
      headers: headersOf(options),
      body: options.body === undefined ? undefined : JSON.stringify(options.body),
      signal: options.signal,
    });
    reach.answered();
    return answer;
  } catch (error) {
    if (options.signal?.aborted) throw error;
    reach.unanswered();
    throw new NoAnswer(error instanceof Error ? error.message : 'unknown');
  }
}

/** Sends, and when the session has ended: refreshes once, else waits for a sign-in, then sends again. */
async function askSignedIn(method: string, path: string, options: SendOptions): Promise<Response> {
  const sentAt = Date.now();
  const answer = await ask(method, path, options);
  if (answer.status !== 401 || options.sessionless) return answer;
  if (!(await refreshSession(sentAt))) await waitForSignIn();
  return ask(method, path, options);
}

async function answerText(method: string, path: string, options: SendOptions): Promise<string> {
  const answer = await askSignedIn(method, path, options);
  const text = await answer.text();
  if (!answer.ok) throw problemOf(answer.status, text);
  return text;
}

/** A file and the name that the API gives it. */
export interface NamedFile {
  readonly name: string;
  readonly content: Blob;
}

async function askFile(path: string, options: SendOptions = {}): Promise<NamedFile> {
  const answer = await askSignedIn('GET', path, options);
  if (!answer.ok) throw problemOf(answer.status, await answer.text());
  const named = /filename="([^"]+)"/.exec(answer.headers.get('Content-Disposition') ?? '');
  return { name: named?.[1] ?? 'file', content: await answer.blob() };
}

async function request<T extends z.ZodType>(
  method: string,
  path: string,
  schema: T,
  options: SendOptions = {},
): Promise<z.output<T>> {
  const text = await answerText(method, path, options);
  const parsed = schema.safeParse(parseJson(text));
  if (!parsed.success) throw new NoAnswer(`${method} ${path}: ${parsed.error.message}`);
  return parsed.data;
}

/** The API's door. Every answer is read with a schema; every refusal is a ProblemError. */
export const api = {
  get: <T extends z.ZodType>(path: string, schema: T, options?: SendOptions) =>
    request('GET', path, schema, options),
  post: <T extends z.ZodType>(path: string, schema: T, options?: SendOptions) =>
    request('POST', path, schema, options),
  put: <T extends z.ZodType>(path: string, schema: T, options?: SendOptions) =>
    request('PUT', path, schema, options),
  patch: <T extends z.ZodType>(path: string, schema: T, options?: SendOptions) =>
    request('PATCH', path, schema, options),
  delete: <T extends z.ZodType>(path: string, schema: T, options?: SendOptions) =>
    request('DELETE', path, schema, options),
  file: askFile,
  /** For answers without a body (204). */
  deleteQuietly: async (path: string, options: SendOptions = {}): Promise<void> => {
    await answerText('DELETE', path, options);
  },
};

/** Search parameters in a settled order, empty ones dropped: equal questions have equal keys. */
export function queryString(values: Readonly<Record<string, string | number | undefined>>): string {
  const search = new URLSearchParams();
  for (const [name, value] of Object.entries(values).sort(([a], [b]) => a.localeCompare(b))) {
    if (value !== undefined && value !== '') search.set(name, String(value));
  }
  const text = search.toString();
  return text ? `?${text}` : '';
}
