import { Injectable } from '@nestjs/common';
import { Clock } from '../clock/clock.js';
import { Database } from '../database/database.js';
import { IdempotencyRepository } from '../idempotency/idempotency.repository.js';
import { AttemptLimits } from '../limits/attempt-limits.js';
import { type JobTask, Task } from './job-task.js';

/** How long a request can be sent again and still get its first answer. */
const keptKeyDays = 7;

/** Sweeps out, every night, what is kept for a while only. */
@Injectable()
@Task({ name: 'prune', cron: '40 2 * * *' })
export class PruneTask implements JobTask {
  constructor(
    private readonly database: Database,
    private readonly keys: IdempotencyRepository,
    private readonly limits: AttemptLimits,
    private readonly clock: Clock,
  ) {}

  async run(): Promise<void> {
    const before = new Date(this.clock.now().getTime() - keptKeyDays * 24 * 60 * 60 * 1_000);
    await this.keys.prune(this.database.handle, before);
    await this.limits.prune();
  }
}
