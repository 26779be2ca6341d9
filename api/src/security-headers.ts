import type { INestApplication } from '@nestjs/common';
import type { NextFunction, Request, Response } from 'express';
import helmet from 'helmet';
import { ContentSecurity } from './common/content-security';
import { ENVIRONMENT } from './common/environment.token';
import type { Environment } from './config/environment';

/** Half a year, as browsers' preload lists ask for at least. */
const hstsSeconds = 180 * 86_400;

/** Headers of every answer, refusals and errors too. What the API answers is not kept by caches unless it says so. */
export function securityHeaders(application: INestApplication) {
  const { secure } = application.get<Environment>(ENVIRONMENT);
  const contentSecurity = application.get(ContentSecurity);
  const headers = helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: [() => contentSecurity.scriptSources],
        styleSrc: ["'self'"],
        imgSrc: ["'self'", 'data:'],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        frameAncestors: ["'none'"],
        formAction: ["'self'"],
      },
    },
    // Not no-referrer: forms would then be sent with `Origin: null`, and refused.
    referrerPolicy: { policy: 'same-origin' },
    strictTransportSecurity: secure && { maxAge: hstsSeconds },
    crossOriginResourcePolicy: { policy: 'same-origin' },
    xFrameOptions: { action: 'deny' },
  });
  return (request: Request, response: Response, next: NextFunction): void => {
    if (request.path.startsWith('/api/')) response.setHeader('Cache-Control', 'no-store');
    headers(request, response, next);
  };
}
