import { setTimeout as wait } from 'node:timers/promises';
import { Controller, Get } from '@nestjs/common';
import { sql } from 'kysely';
import { Public } from '../auth/access.js';
import { Database } from '../database/database.js';
import { AppError } from '../errors/app-error.js';
import { HealthDto } from './health.dto.js';
import { Readiness } from './readiness.js';

const patienceMilliseconds = 2_000;

/** For whatever watches over the server: says nothing that would help anybody else. */
@Controller('health')
export class HealthController {
  constructor(
    private readonly database: Database,
    private readonly readiness: Readiness,
  ) {}

  /** The process is alive. */
  @Get()
  @Public()
  live(): HealthDto {
    return { status: 'ok' };
  }

  /** The process can take requests: it is not stopping, and the database answers in time. */
  @Get('ready')
  @Public()
  async ready(): Promise<HealthDto> {
    if (this.readiness.leaving || !(await this.#databaseAnswers())) {
      throw new AppError('service_unavailable', 'Not ready just now.');
    }
    return { status: 'ok' };
  }

  async #databaseAnswers(): Promise<boolean> {
    const stop = new AbortController();
    const answer = sql`select 1`.execute(this.database.handle).then(
      () => true,
      () => false,
    );
    const late = wait(patienceMilliseconds, false, { signal: stop.signal }).catch(() => false);
    const answered = await Promise.race([answer, late]);
    stop.abort();
    return answered;
  }
}
