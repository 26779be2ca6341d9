import { randomUUID } from 'node:crypto';
import type { IncomingMessage, ServerResponse } from 'node:http';
import { LoggerModule } from 'nestjs-pino';
import pinoHttp, { type HttpLogger, type Options } from 'pino-http';
import { ENVIRONMENT } from '../common/environment.token';
import type { Environment } from './environment';

interface LoggedRequest {
  readonly id: unknown;
  readonly method: string;
  readonly url: string;
}

const options = (level: Environment['logLevel']): Options => ({
  level,
  base: { pid: process.pid },
  genReqId: () => randomUUID(),
  autoLogging: { ignore: (request: IncomingMessage) => request.url?.startsWith('/health/') ?? false },
  customLogLevel: (_: IncomingMessage, response: ServerResponse) =>
    response.statusCode >= 500 ? 'error' : 'info',
  serializers: {
    req: ({ id, method, url }: LoggedRequest) => ({ id, method, path: url.split('?')[0] }),
    res: ({ statusCode }: { statusCode: number }) => ({ statusCode }),
    // What went wrong is told once, by the filter, in its own words.
    err: () => undefined,
  },
});

/**
 * One line of JSON a request, in UTC: what was asked, how it ended, how long it took in milliseconds. No addresses,
 * headers, bodies or search words: whatever could tell of a person stays out.
 */
export const requestLog = (level: Environment['logLevel']): HttpLogger => pinoHttp(options(level));

/** Nest's own logger, in the same form. Requests are logged before the router, so that nothing of it is a route. */
export const loggingModule = LoggerModule.forRootAsync({
  inject: [ENVIRONMENT],
  useFactory: ({ logLevel }: Pick<Environment, 'logLevel'>) => ({
    pinoHttp: options(logLevel),
    forRoutes: [],
  }),
});
