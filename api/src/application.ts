import { type INestApplication, RequestMethod } from '@nestjs/common';
import { NestFactory, Reflector } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import compression from 'compression';
import cookieParser from 'cookie-parser';
import { Logger } from 'nestjs-pino';
import { constants } from 'node:zlib';
import { ZodSerializerInterceptor, ZodValidationPipe } from 'nestjs-zod';
import { AppModule } from './app.module';
import { ENVIRONMENT } from './common/environment.token';
import { ProblemFilter } from './common/problem.filter';
import { VersionTagInterceptor } from './common/version-tag.interceptor';
import { type Environment, readEnvironment } from './config/environment';
import { requestLog } from './config/logging';
import { OpenApi } from './openapi/openapi.service';
import { securityHeaders } from './security-headers';

/** Whatever is not part of the API keeps its address as its controller writes it. */
const outsideTheApi = [
  'api/openapi.json',
  'api/docs',
  'api/docs.css',
  'health/live',
  'health/ready',
  'media/:imageId/:form',
  // Written so that they mean the catch-all routes themselves, not every route that these would catch.
  'workroom',
  'workroom/\\{\\*path\\}',
  '\\{\\*page\\}',
];

/** Bodies are read by `furnish`, with our own limits. */
export const applicationOptions = { bodyParser: false, abortOnError: false, bufferLogs: true } as const;

/**
 * Builds the whole application, not yet listening.
 * @throws Error with one readable message, where the environment is wrong
 */
export async function createApplication(): Promise<NestExpressApplication> {
  // Looked at here first: out of a provider the same message would come with a page of Nest's own.
  readEnvironment(process.env);
  const application = await NestFactory.create<NestExpressApplication>(AppModule, applicationOptions);
  furnish(application);
  return application;
}

/** Everything that stands before and behind the rooms: headers, bodies, cookies, validation, errors. */
export function furnish(application: NestExpressApplication): void {
  const environment = application.get<Environment>(ENVIRONMENT);
  application.useLogger(application.get(Logger));
  application.disable('x-powered-by');
  if (environment.trustProxy) application.set('trust proxy', environment.trustProxy);
  application.set('query parser', 'simple');
  application.use(requestLog(environment.logLevel));
  application.use(securityHeaders(application));
  application.use(compression({ brotli: { params: { [constants.BROTLI_PARAM_QUALITY]: 4 } } }));
  application.use(cookieParser());
  application.useBodyParser('json', { limit: '1mb' });
  application.setGlobalPrefix('api/v1', {
    exclude: outsideTheApi.map((path) => ({ path, method: RequestMethod.ALL })),
  });
  furnishAnswers(application);
  application.get(OpenApi).describes(application);
}

function furnishAnswers(application: INestApplication): void {
  application.useGlobalPipes(new ZodValidationPipe());
  application.useGlobalInterceptors(
    new VersionTagInterceptor(),
    new ZodSerializerInterceptor(application.get(Reflector)),
  );
  application.useGlobalFilters(new ProblemFilter());
}
