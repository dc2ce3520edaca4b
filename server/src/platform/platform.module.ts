import { Global, Module } from '@nestjs/common';
import { APP_GUARD, DiscoveryModule } from '@nestjs/core';
import type { Logger } from 'pino';
import { createPool } from '@emberlot/db/database';
import { AuditController } from './audit/audit.controller.js';
import { Audit } from './audit/audit.js';
import { AuditRepository } from './audit/audit.repository.js';
import { AccessGuard } from './auth/access.guard.js';
import { FormTokenGuard } from './auth/form-token.guard.js';
import { SessionStore } from './auth/session.store.js';
import { SessionStoreCloser } from './auth/session-store-closer.js';
import { UsersReader } from './auth/users.reader.js';
import { Clock, SystemClock } from './clock/clock.js';
import { Config } from './config/config.js';
import { Database, pgPool } from './database/database.js';
import { Transactions } from './database/transactions.js';
import { ConstraintSentences } from './errors/constraints.js';
import { Files } from './files/files.js';
import { HealthController } from './health/health.controller.js';
import { Readiness } from './health/readiness.js';
import { IdempotencyRepository } from './idempotency/idempotency.repository.js';
import { JobRunner } from './jobs/job-runner.js';
import { Jobs } from './jobs/jobs.js';
import { PruneTask } from './jobs/prune.task.js';
import { AttemptLimits } from './limits/attempt-limits.js';
import { LimitGuard } from './limits/limited.js';
import { appLogger, createLogger } from './logging/logger.js';
import { LetterheadReader } from './mail/letterhead.reader.js';
import { MailTransport } from './mail/mail-transport.js';
import { OutboxController } from './mail/outbox.controller.js';
import { Outbox } from './mail/outbox.js';
import { OutboxRepository } from './mail/outbox.repository.js';
import { OutboxService } from './mail/outbox.service.js';
import { SendMailTask } from './mail/send-mail.task.js';
import { Numbers } from './numbers/numbers.js';

const sessionPruneSeconds = 15 * 60;

/** What every module may inject without importing it. */
const offered = [
  AttemptLimits,
  Audit,
  Clock,
  Config,
  ConstraintSentences,
  Database,
  Files,
  IdempotencyRepository,
  JobRunner,
  Jobs,
  Numbers,
  Outbox,
  Readiness,
  SessionStore,
  Transactions,
  UsersReader,
  appLogger,
  pgPool,
];

@Global()
@Module({
  imports: [DiscoveryModule],
  controllers: [AuditController, HealthController, OutboxController],
  providers: [
    { provide: Config, useFactory: () => Config.read(process.env) },
    { provide: Clock, useFactory: (config: Config) => new SystemClock(config.shopZone), inject: [Config] },
    { provide: appLogger, useFactory: (config: Config) => createLogger(config.logLevel), inject: [Config] },
    {
      provide: pgPool,
      useFactory: (config: Config, logger: Logger) =>
        createPool(config.databaseUrl, {
          maxConnections: 16,
          applicationName: 'emberlot-server',
          onConnectionError: (error) => logger.warn({ context: 'Database', err: error }),
        }),
      inject: [Config, appLogger],
    },
    {
      provide: SessionStore,
      useFactory: (database: Database, logger: Logger) =>
        new SessionStore(database.pool, {
          pruneSeconds: sessionPruneSeconds,
          onError: (...details) => logger.error({ context: 'Sessions', details: details.map(String) }),
        }),
      inject: [Database, appLogger],
    },
    // The guards run in this order: how often, whether this site's own page sent it, and who may.
    { provide: APP_GUARD, useClass: LimitGuard },
    { provide: APP_GUARD, useClass: FormTokenGuard },
    { provide: APP_GUARD, useClass: AccessGuard },
    AttemptLimits,
    Audit,
    AuditRepository,
    ConstraintSentences,
    Database,
    Files,
    IdempotencyRepository,
    JobRunner,
    Jobs,
    LetterheadReader,
    MailTransport,
    Numbers,
    Outbox,
    OutboxRepository,
    OutboxService,
    PruneTask,
    Readiness,
    SendMailTask,
    SessionStoreCloser,
    Transactions,
    UsersReader,
  ],
  exports: offered,
})
export class PlatformModule {}
