import 'reflect-metadata';
import type { Server } from 'node:http';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { getDataSourceToken } from '@nestjs/typeorm';
import type { DataSource } from 'typeorm';
import { createApplication } from './application';
import { ENVIRONMENT } from './common/environment.token';
import { Lifecycle } from './common/lifecycle';
import type { Environment } from './config/environment';
import { Drain } from './drain';
import { refuseUnlessDurable } from './health/durability';

/** After the signal to stop: answers under way get this long, and the process is gone at the latest by the second. */
const forceAfterMs = 8_000;
const goneAfterMs = 10_000;

/** Half-open and dawdling clients are let go after these. */
const headersWithinMs = 10_000;
const idleMs = 5_000;

async function main(): Promise<void> {
  const application = await createApplication();
  await refuseUnlessDurable(application.get<DataSource>(getDataSourceToken()));
  const { host, port, publicUrl } = application.get<Environment>(ENVIRONMENT);
  const server: Server = application.getHttpServer();
  const drain = new Drain(server);
  server.headersTimeout = headersWithinMs;
  server.keepAliveTimeout = idleMs;
  await application.listen(port, host);
  process.stdout.write(`Ellwand is open at ${publicUrl}/\n`);
  let stopping = false;
  for (const signal of ['SIGTERM', 'SIGINT'] as const) {
    process.on(signal, () => {
      if (!stopping) void stop(application, drain);
      stopping = true;
    });
  }
}

async function stop(application: NestExpressApplication, drain: Drain): Promise<void> {
  setTimeout(() => process.exit(1), goneAfterMs).unref();
  application.get(Lifecycle).end();
  await drain.finish(forceAfterMs);
  await application.close();
  process.exit(0);
}

main().catch((fault: unknown) => {
  process.stderr.write(`${sentence(fault)}\n`);
  process.exit(1);
});

function sentence(fault: unknown): string {
  if (!(fault instanceof Error)) return String(fault);
  if ('code' in fault && fault.code === 'EADDRINUSE' && 'port' in fault) {
    return `Port ${String(fault.port)} is taken: stop what listens there, or set ELLWAND_PORT to another.`;
  }
  return fault.message;
}
