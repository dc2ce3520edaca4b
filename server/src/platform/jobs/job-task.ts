import { DiscoveryService } from '@nestjs/core';

export interface TaskOptions {
  /** What `Jobs.add` calls it: `send_mail`. */
  readonly name: string;
  /** When it also runs by itself, as five fields of cron in UTC: `0 3 * * *` is three in the morning. */
  readonly cron?: string;
}

/** Marks a provider as the one that does a kind of job; the runner finds it by this. It implements `JobTask`. */
export const Task = DiscoveryService.createDecorator<TaskOptions>();

/**
 * Does one kind of job. It must bear being run twice: a process can die after the deed and before the queue is told.
 * What it throws makes the queue try again later, each time after a longer wait.
 */
export interface JobTask<Payload = unknown> {
  run(payload: Payload): Promise<void>;
}
