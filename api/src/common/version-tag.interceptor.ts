import { type CallHandler, type ExecutionContext, Injectable, type NestInterceptor } from '@nestjs/common';
import type { Request, Response } from 'express';
import { map, type Observable } from 'rxjs';

/** Gives the answer of a single shared record its `ETag: "<version>"`, which the next change sends as `If-Match`. */
@Injectable()
export class VersionTagInterceptor implements NestInterceptor {
  intercept(context: ExecutionContext, next: CallHandler<unknown>): Observable<unknown> {
    const http = context.switchToHttp();
    // The catalogue's `version` is that of a frozen copy: its answers have tags of their own.
    if (!http.getRequest<Request>().path.startsWith('/api/v1/workroom/')) return next.handle();
    return next.handle().pipe(
      map((answer) => {
        const version = versionOf(answer);
        if (version !== undefined) http.getResponse<Response>().setHeader('ETag', `"${version}"`);
        return answer;
      }),
    );
  }
}

function versionOf(answer: unknown): number | undefined {
  if (typeof answer !== 'object' || answer === null || !('version' in answer)) return undefined;
  return typeof answer.version === 'number' ? answer.version : undefined;
}
