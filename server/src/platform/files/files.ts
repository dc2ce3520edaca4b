import { createHash } from 'node:crypto';
import { Readable } from 'node:stream';
import { Injectable } from '@nestjs/common';
import { type Transaction, sql } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import { largestFileBytes } from '@emberlot/shared/limits/files';
import { Clock } from '../clock/clock.js';
import { Config } from '../config/config.js';
import { Database } from '../database/database.js';
import { AppError, notFound } from '../errors/app-error.js';
import { storableTypes, type StorableType, typeOfContent } from './content-type.js';

export interface StoreOptions {
  /** The name it came or was made under: its extension must agree with the content. */
  readonly fileName: string;
  /** The types that the place it is stored for takes; all storable ones when nothing is said. */
  readonly types?: readonly StorableType[];
}

export interface StoredFile {
  readonly id: number;
  /** Lower-case hexadecimal. */
  readonly sha256: string;
  readonly byteSize: number;
  readonly mediaType: StorableType;
}

/** Bytes in one row of the database. */
const chunkBytes = 256 * 1_024;

/**
 * Files in the database, addressed by their content: the same content stored twice is one file. Names, and who may read
 * it, belong to the documents that refer to it; a route that gives a file out checks those first.
 */
@Injectable()
export class Files {
  constructor(
    private readonly database: Database,
    private readonly clock: Clock,
    private readonly config: Config,
  ) {}

  /**
   * @throws AppError `too_large` beyond the largest file or the shop's quota, `unsupported_media` when the content is
   *   not of a type that is taken, `invalid_input` when it is empty
   */
  async store(
    trx: Transaction<DB>,
    content: Uint8Array | AsyncIterable<Uint8Array>,
    options: StoreOptions,
  ): Promise<StoredFile> {
    const bytes = content instanceof Uint8Array ? content : await collect(content);
    if (bytes.length === 0) throw new AppError('invalid_input', 'The file is empty.');
    if (bytes.length > largestFileBytes) throw tooLarge();
    const mediaType = await typeOfContent(bytes, options.fileName);
    const allowed = options.types ?? (Object.keys(storableTypes) as StorableType[]);
    if (!mediaType || !allowed.includes(mediaType)) throw wrongType(allowed);
    const digest = createHash('sha256').update(bytes).digest();
    const id = (await this.#find(trx, digest)) ?? (await this.#insert(trx, bytes, digest, mediaType));
    return { id, sha256: digest.toString('hex'), byteSize: bytes.length, mediaType };
  }

  /** @throws AppError `not_found` */
  async describe(id: number): Promise<StoredFile> {
    const row = await this.database.handle
      .selectFrom('file_object')
      .select(['id', 'sha256', 'byte_size', 'media_type'])
      .where('id', '=', id)
      .executeTakeFirst();
    if (!row) throw notFound('file');
    const mediaType = row.media_type as StorableType;
    return { id: row.id, sha256: row.sha256.toString('hex'), byteSize: row.byte_size, mediaType };
  }

  /** The content, a chunk at a time, so that a large file is never whole in memory. */
  stream(id: number): Readable {
    return Readable.from(this.#chunks(id), { objectMode: false });
  }

  async #find(trx: Transaction<DB>, digest: Buffer): Promise<number | undefined> {
    const row = await trx.selectFrom('file_object').select('id').where('sha256', '=', digest).executeTakeFirst();
    return row?.id;
  }

  async #insert(trx: Transaction<DB>, bytes: Uint8Array, digest: Buffer, mediaType: StorableType): Promise<number> {
    await this.#refuseOverQuota(trx, bytes.length);
    const file = await trx
      .insertInto('file_object')
      .values({ sha256: digest, byte_size: bytes.length, media_type: mediaType, stored_at: this.clock.now() })
      .onConflict((conflict) => conflict.column('sha256').doNothing())
      .returning('id')
      .executeTakeFirst();
    // Another transaction stored the same content a moment ago; its row is to be seen now that it is committed.
    if (!file) return this.#getExisting(trx, digest);
    for (let position = 0; position * chunkBytes < bytes.length; position += 1) {
      const chunk = Buffer.from(bytes.subarray(position * chunkBytes, (position + 1) * chunkBytes));
      await trx.insertInto('file_chunk').values({ file_id: file.id, position, bytes: chunk }).execute();
    }
    return file.id;
  }

  async #getExisting(trx: Transaction<DB>, digest: Buffer): Promise<number> {
    const id = await this.#find(trx, digest);
    if (id === undefined) throw new AppError('changed_meanwhile', 'The same file was being stored. Try again.');
    return id;
  }

  async #refuseOverQuota(trx: Transaction<DB>, more: number): Promise<void> {
    const { used } = await trx
      .selectFrom('file_object')
      .select(sql<number>`coalesce(sum(byte_size), 0)::bigint`.as('used'))
      .executeTakeFirstOrThrow();
    if (used + more > this.config.fileQuotaBytes) {
      throw new AppError('too_large', 'There is no room left for files. Ask the owner to make some.');
    }
  }

  async *#chunks(id: number): AsyncGenerator<Buffer> {
    for (let position = 0; ; position += 1) {
      const row = await this.database.handle
        .selectFrom('file_chunk')
        .select('bytes')
        .where('file_id', '=', id)
        .where('position', '=', position)
        .executeTakeFirst();
      if (!row) return;
      yield row.bytes;
    }
  }
}

async function collect(content: AsyncIterable<Uint8Array>): Promise<Uint8Array> {
  const chunks: Uint8Array[] = [];
  let size = 0;
  for await (const chunk of content) {
    size += chunk.length;
    if (size > largestFileBytes) throw tooLarge();
    chunks.push(chunk);
  }
  return Buffer.concat(chunks);
}

function tooLarge(): AppError {
  return new AppError('too_large', `A file may have at most ${largestFileBytes / 1_024 / 1_024} MB.`);
}

function wrongType(allowed: readonly StorableType[]): AppError {
  const extensions = allowed.flatMap((type) => storableTypes[type]).join(', ');
  return new AppError('unsupported_media', `The content is not of a kind that is taken here: ${extensions}.`);
}
