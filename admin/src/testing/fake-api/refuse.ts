import type { z } from 'zod';

/** How the house refuses: thrown by a route, answered as problem+json. */
export class Refusal extends Error {
  constructor(
    readonly status: number,
    readonly code: string,
    readonly more: Readonly<Record<string, unknown>> = {},
    title = code,
  ) {
    super(title);
  }

  answer(): Response {
    const { status, code, message, more } = this;
    return new Response(
      JSON.stringify({ type: `urn:ellwand:${code}`, title: message, status, code, ...more }),
      {
        status,
        headers: { 'Content-Type': 'application/problem+json' },
      },
    );
  }
}

/** Reads a body with the contract's own schema; what does not fit is refused with pointers, as the API does. */
export function read<T extends z.ZodType>(schema: T, body: unknown): z.output<T> {
  const parsed = schema.safeParse(body);
  if (parsed.success) return parsed.data;
  const errors = parsed.error.issues.map(({ path, message }) => ({
    pointer: `/${path.join('/')}`,
    detail: message,
  }));
  throw new Refusal(422, 'body.invalid', { errors }, 'The request does not fit.');
}
