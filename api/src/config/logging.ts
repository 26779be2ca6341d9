import { randomUUID } from 'node:crypto';
import type { IncomingMessage, ServerResponse } from 'node:http';
import { LoggerModule } from 'nestjs-pino';
import { ENVIRONMENT } from '../common/environment.token';
import type { Environment } from './environment';

interface LoggedRequest {
  readonly id: unknown;
  readonly method: string;
  readonly url: string;
}

/**
 * One line of JSON a request, in UTC: what was asked, how it ended, how long it took. No addresses, headers,
 * bodies or search words: whatever could tell of a person stays out. Times are in milliseconds.
 */
export const loggingModule = LoggerModule.forRootAsync({
  inject: [ENVIRONMENT],
  useFactory: (environment: Pick<Environment, 'logLevel'>) => ({
    pinoHttp: {
      level: environment.logLevel,
      base: { pid: process.pid },
      genReqId: () => randomUUID(),
      autoLogging: { ignore: (request: IncomingMessage) => request.url?.startsWith('/health/') ?? false },
      customLogLevel: (_: IncomingMessage, response: ServerResponse) =>
        response.statusCode >= 500 ? 'error' : 'info',
      // What went wrong is told once, by the filter, in its own words.
      customErrorObject: (_request: IncomingMessage, response: ServerResponse) => ({ res: response }),
      serializers: {
        req: ({ id, method, url }: LoggedRequest) => ({ id, method, path: url.split('?')[0] }),
        res: ({ statusCode }: { statusCode: number }) => ({ statusCode }),
      },
    },
  }),
});
