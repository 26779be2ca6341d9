import { type ArgumentsHost, Catch, type ExceptionFilter, HttpException, Logger } from '@nestjs/common';
import { ThrottlerException } from '@nestjs/throttler';
import type { Response } from 'express';
import { ZodSerializationException, ZodValidationException } from 'nestjs-zod';
import type { ZodError } from 'zod';
import type { ProblemError } from './problem-error';
import { Refusal } from './refusal';

interface ProblemDocument {
  readonly type: 'about:blank';
  readonly title: string;
  readonly status: number;
  readonly code: string;
  readonly detail?: string;
  readonly errors?: readonly ProblemError[];
}

const titles: Readonly<Record<number, string>> = {
  400: 'The request could not be read',
  401: 'Not signed in',
  403: 'Not allowed',
  404: 'Not found',
  406: 'No such form',
  409: 'Not possible now',
  410: 'Withdrawn',
  412: 'Changed meanwhile',
  413: 'Too large',
  415: 'Wrong type',
  422: 'Refused',
  428: 'Version needed',
  429: 'Too many requests',
  500: 'Something went wrong here',
  503: 'Not available just now',
  507: 'No room left',
};

/** Names of database faults that pass by themselves: the caller may try again. */
const passing =
  /ECONNREFUSED|PROTOCOL_CONNECTION_LOST|ECONNRESET|ER_CON_COUNT_ERROR|POOL_CLOSED|Queue limit reached|ETIMEDOUT|ER_LOCK_DEADLOCK|ER_LOCK_WAIT_TIMEOUT|ER_STATEMENT_TIMEOUT|ER_CHECKREAD/;

interface FaultLog {
  error(text: string): void;
}

/** The request's own log names the request with each line. */
interface LoggedRequest {
  readonly log?: FaultLog;
}

/** The only place that speaks of errors. What was not expected is logged and told without detail. */
@Catch()
export class ProblemFilter implements ExceptionFilter {
  catch(fault: unknown, host: ArgumentsHost): void {
    const http = host.switchToHttp();
    const response = http.getResponse<Response>();
    const { problem, headers } = this.describe(
      fault,
      http.getRequest<LoggedRequest>().log ?? new Logger('problem'),
    );
    if (response.headersSent) {
      response.destroy();
      return;
    }
    response.status(problem.status).set(headers).set('Cache-Control', 'no-store');
    response.type('application/problem+json').send(JSON.stringify(problem));
  }

  private describe(
    fault: unknown,
    log: FaultLog,
  ): { problem: ProblemDocument; headers: Record<string, string> } {
    if (fault instanceof Refusal) {
      const problem = { ...fault.facts, ...document(fault.status, fault.code, fault.message, fault.errors) };
      return { problem, headers: { ...fault.headers } };
    }
    if (fault instanceof ZodValidationException) {
      const errors = pointers(fault.getZodError() as ZodError);
      return {
        problem: document(400, 'request.invalid', 'Some of what was sent needs mending.', errors),
        headers: {},
      };
    }
    if (fault instanceof ThrottlerException) {
      return {
        problem: document(429, 'request.too-many', 'Too many requests; wait a little.'),
        headers: {},
      };
    }
    if (fault instanceof HttpException && !(fault instanceof ZodSerializationException)) {
      const status = fault.getStatus();
      return { problem: document(status, `http.${status}`, fault.message), headers: {} };
    }
    return this.surprise(fault, log);
  }

  private surprise(
    fault: unknown,
    log: FaultLog,
  ): { problem: ProblemDocument; headers: Record<string, string> } {
    const clientFault = bodyFault(fault);
    // A body that cannot be read is the sender's affair, not a fault to wake anybody for.
    if (clientFault) return { problem: clientFault, headers: {} };
    log.error(withoutValues(fault instanceof Error ? (fault.stack ?? fault.message) : String(fault)));
    const text =
      fault instanceof Error ? `${fault.message} ${'code' in fault ? String(fault.code) : ''}` : '';
    if (passing.test(text)) {
      return {
        problem: document(503, 'service.unavailable', 'The database does not answer; try again.'),
        headers: { 'Retry-After': '2' },
      };
    }
    return {
      problem: document(500, 'service.fault', 'Nothing was changed. The fault has been noted.'),
      headers: {},
    };
  }
}

/** A database names the values that it could not take ("Duplicate entry 'somebody@…'"): those are not for the log. */
const withoutValues = (text: string) => text.replaceAll(/'[^'\n]*'/g, "'…'").replaceAll(/"[^"\n]*"/g, '"…"');

/** Faults of body-parser and of the router carry a status of their own. */
function bodyFault(fault: unknown): ProblemDocument | undefined {
  if (!(fault instanceof Error) || !('status' in fault) || typeof fault.status !== 'number') return undefined;
  if (fault.status < 400 || fault.status > 499) return undefined;
  return document(
    fault.status,
    `http.${fault.status}`,
    titles[fault.status] ?? 'The request could not be read',
  );
}

function document(
  status: number,
  code: string,
  detail: string,
  errors: readonly ProblemError[] = [],
): ProblemDocument {
  const base = {
    type: 'about:blank' as const,
    title: titles[status] ?? 'Not possible',
    status,
    code,
    detail,
  };
  return errors.length > 0 ? { ...base, errors } : base;
}

function pointers(error: ZodError): ProblemError[] {
  return error.issues.map((issue) => ({
    pointer: `/${issue.path.map((step) => String(step).replaceAll('~', '~0').replaceAll('/', '~1')).join('/')}`,
    detail: issue.message,
  }));
}
