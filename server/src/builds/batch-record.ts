import type { DB } from '@emberlot/db/database.types';
import type { Transaction } from 'kysely';
import { AppError, notFound } from '../platform/errors/app-error.js';
import type { BatchesRepository, BatchRow, BatchStatus } from './batches.repository.js';

/** A batch as people say how it stands. */
export const statusWords: Readonly<Record<BatchStatus, string>> = {
  planned: 'planned',
  picking: 'being picked',
  in_build: 'being built',
  done: 'done',
  withdrawn: 'withdrawn',
};

/**
 * Holds a batch while something is done to it.
 *
 * @throws AppError `not_found`; `wrong_state` when it stands otherwise
 */
export async function lockBatch(
  batches: BatchesRepository,
  trx: Transaction<DB>,
  number: string,
  expected: readonly BatchStatus[],
): Promise<BatchRow> {
  const batch = await batches.lock(trx, number);
  if (!batch) throw notFound('batch');
  if (!expected.includes(batch.status)) throw wrongState(batch);
  return batch;
}

export function wrongState(batch: Pick<BatchRow, 'number' | 'status'>): AppError {
  return new AppError('wrong_state', `Batch ${batch.number} is ${statusWords[batch.status]}; this cannot be done now.`);
}
