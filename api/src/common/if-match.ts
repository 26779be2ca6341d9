import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';
import { Refusal } from './refusal';

/**
 * The version that the caller saw, from `If-Match: "7"`.
 * @throws Refusal 428 where the header is absent, 400 where it is not one quoted whole number.
 */
export const IfMatch = createParamDecorator((_: unknown, context: ExecutionContext): number => {
  const header = context.switchToHttp().getRequest<Request>().header('if-match');
  if (header === undefined) {
    throw new Refusal(428, 'version.required', 'Say which version you saw: If-Match: "<version>".');
  }
  const version = /^"(\d{1,9})"$/.exec(header.trim())?.[1];
  if (version === undefined) {
    throw new Refusal(
      400,
      'version.unreadable',
      `Expected If-Match: "<version>", got ${header.slice(0, 40)}`,
    );
  }
  return Number(version);
});

/** Refuses with 412 and the facts of what happened in between. */
export function staleVersion(
  seen: number,
  current: number,
  changedBy: string | null,
  changedAt: Date | null,
): Refusal {
  return new Refusal(
    412,
    'version.stale',
    `You saw version ${seen}; since then ${changedBy ?? 'somebody'} made version ${current}.`,
    { seen, current, changedBy, changedAt: changedAt?.toISOString() ?? null },
  );
}
