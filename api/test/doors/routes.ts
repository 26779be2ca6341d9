import type { Permission } from '@ellwand/shared/records/roles';
import type { NestExpressApplication } from '@nestjs/platform-express';

/** Who may enter: everyone, whoever is signed in, whoever has the permission. */
export type Door = 'public' | 'signed-in' | Permission;

interface Layer {
  readonly route?: { readonly path: string; readonly methods: Readonly<Record<string, boolean>> };
}

/** Every route of the running application as Express knows it: `GET /api/v1/session`. */
export function runningRoutes(application: NestExpressApplication): string[] {
  const express = application.getHttpAdapter().getInstance() as { router: { stack: readonly Layer[] } };
  const routes = express.router.stack.flatMap(({ route }) => {
    if (!route) return [];
    const methods = Object.keys(route.methods).filter((method) => route.methods[method]);
    return methods.map((method) => `${method.toUpperCase()} ${route.path}`);
  });
  return [...new Set(routes)].sort();
}

/** An address that a route answers to: parameters filled with things that do not exist. */
export function addressFor(path: string): string {
  return path
    .replaceAll(/\{?\/?\*\w+\}?/g, '/nothing')
    .replaceAll(':form', '320.jpg')
    .replaceAll(/:width\.:\w+/g, '320.jpg')
    .replaceAll(/:(number|pointId)/g, 'nothing')
    .replaceAll(':version', '1')
    .replaceAll(/:\w+/g, '0190f3b0-0000-7000-8000-000000000000');
}
