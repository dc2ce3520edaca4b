import { type BeforeApplicationShutdown, Inject, Injectable, type OnApplicationShutdown } from '@nestjs/common';
import { DiscoveryService } from '@nestjs/core';
import {
  type CronItem,
  Logger as QueueLogger,
  type Runner,
  type RunnerOptions,
  type TaskList,
  parseCronItems,
  run,
  runOnce,
} from 'graphile-worker';
import type pg from 'pg';
import type { Logger } from 'pino';
import { createPool } from '@emberlot/db/database';
import { Config } from '../config/config.js';
import { appLogger } from '../logging/logger.js';
import { type JobTask, Task } from './job-task.js';

/** Jobs done side by side. */
const concurrency = 2;

/** Takes jobs from the queue in the database and hands them to their tasks. Starts only when told to. */
@Injectable()
export class JobRunner implements BeforeApplicationShutdown, OnApplicationShutdown {
  #pool: pg.Pool | undefined;
  #runner: Runner | undefined;

  constructor(
    private readonly discovery: DiscoveryService,
    private readonly config: Config,
    @Inject(appLogger) private readonly logger: Logger,
  ) {}

  async start(): Promise<void> {
    const { taskList, cronItems } = this.#tasks();
    this.#runner = await run({ ...this.#options(), taskList, parsedCronItems: parseCronItems(cronItems) });
  }

  /**
   * Does what is due, once, and comes back: for tests and for the demo, whose clock is not the database's.
   *
   * @param now jobs set for this instant or before are due
   */
  async runPending(now: Date): Promise<void> {
    const options = this.#options();
    await options.pgPool?.query(
      'update graphile_worker._private_jobs set run_at = now() where run_at between now() and $1',
      [now],
    );
    await runOnce({ ...options, taskList: this.#tasks().taskList });
  }

  /** Lets running jobs finish; no new one begins. */
  async beforeApplicationShutdown(): Promise<void> {
    await this.#runner?.stop();
    this.#runner = undefined;
  }

  async onApplicationShutdown(): Promise<void> {
    await this.#pool?.end();
    this.#pool = undefined;
  }

  /** A pool of its own, so that waiting jobs never take connections from requests. */
  #options(): RunnerOptions {
    this.#pool ??= createPool(this.config.databaseUrl, {
      maxConnections: concurrency + 2,
      applicationName: 'emberlot-jobs',
      onConnectionError: (error) => this.logger.warn({ context: 'Jobs', err: error }),
    });
    return { pgPool: this.#pool, concurrency, noHandleSignals: true, pollInterval: 2_000, logger: this.#queueLogger() };
  }

  #tasks(): { taskList: TaskList; cronItems: CronItem[] } {
    const found = this.discovery.getProviders().flatMap((wrapper) => {
      const options = this.discovery.getMetadataByDecorator(Task, wrapper);
      return options ? [{ options, task: wrapper.instance as JobTask }] : [];
    });
    const taskList: TaskList = Object.fromEntries(
      found.map(({ options, task }) => [options.name, (payload: unknown) => task.run(payload)]),
    );
    const cronItems = found.flatMap(({ options }) =>
      options.cron ? [{ task: options.name, match: options.cron, identifier: options.name }] : [],
    );
    return { taskList, cronItems };
  }

  /** The queue's own messages, without payloads; a job that fails is a warning, since it is tried again. */
  #queueLogger(): QueueLogger {
    return new QueueLogger(() => (level: string, message) => {
      const line = { context: 'Jobs', msg: message };
      if (level === 'error') this.logger.warn(line);
      else this.logger.debug(line);
    });
  }
}
