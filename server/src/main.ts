import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import type { Logger } from 'pino';
import { AppModule } from './app.module.js';
import { FirstOwnerService } from './people/first-owner.service.js';
import { Config } from './platform/config/config.js';
import { ConfigFault } from './platform/config/environment.js';
import { PrivilegeFault, refuseRewritableLedgers } from './platform/database/append-only.js';
import { Database } from './platform/database/database.js';
import { Readiness } from './platform/health/readiness.js';
import { configureApp } from './platform/http/configure-app.js';
import { ServerAdapter } from './platform/http/server.adapter.js';
import { JobRunner } from './platform/jobs/job-runner.js';
import { PinoLoggerService, appLogger } from './platform/logging/logger.js';

/** Requests that are running when the server is told to stop may take this long to end. */
const lastRequestsMilliseconds = 10_000;

async function start(): Promise<void> {
  // Before anything is built, so that faults of the settings are all that is shown.
  Config.read(process.env);
  const app = await NestFactory.create<NestExpressApplication>(AppModule, new ServerAdapter(), {
    abortOnError: false,
    bodyParser: false,
    bufferLogs: true,
    rawBody: true,
  });
  const logger = app.get<Logger>(appLogger);
  app.useLogger(new PinoLoggerService(logger));
  stopOnSignal(app, logger);
  const config = app.get(Config);
  await refuseRewritableLedgers(app.get(Database));
  configureApp(app);
  await app.listen(config.port, config.host);
  await app.get(JobRunner).start();
  logger.info({ event: 'started', address: await app.getUrl() });
  if (await app.get(FirstOwnerService).isNeeded()) {
    const code = config.setupCodeIsMadeUp ? { setupCode: config.setupCode } : {};
    logger.info({ event: 'first_owner_needed', page: `${config.baseUrl}/first-owner`, ...code });
  }
}

/** Not ready first, then no new requests, then jobs, then connections: the order that loses nothing. */
function stopOnSignal(app: NestExpressApplication, logger: Logger): void {
  let stopping = false;
  const stop = async (signal: string) => {
    if (stopping) return;
    stopping = true;
    logger.info({ event: 'stopping', signal });
    app.get(Readiness).leave();
    const server = app.getHttpServer();
    const cut = setTimeout(() => server.closeAllConnections(), lastRequestsMilliseconds);
    await app.close();
    clearTimeout(cut);
    logger.info({ event: 'stopped' });
  };
  for (const signal of ['SIGTERM', 'SIGINT'] as const) {
    process.on(signal, () => {
      stop(signal).catch((error: unknown) => fail(error));
    });
  }
}

function fail(error: unknown): never {
  const known = error instanceof ConfigFault || error instanceof PrivilegeFault;
  const text = error instanceof Error ? (known ? error.message : (error.stack ?? error.message)) : String(error);
  process.stderr.write(`The server does not start.\n${text}\n`);
  process.exit(1);
}

process.on('unhandledRejection', (reason) => fail(reason));
start().catch((error: unknown) => fail(error));
