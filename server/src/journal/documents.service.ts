import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Transaction } from 'kysely';
import { Clock } from '../platform/clock/clock.js';
import { Numbers } from '../platform/numbers/numbers.js';
import { documentKinds, type DocumentKind } from './document-kinds.js';
import { DocumentsRepository } from './documents.repository.js';

export interface NewDocument {
  readonly kind: DocumentKind;
  /** Needed for kinds that carry the number of the thing they belong to. */
  readonly number?: string;
  /** Who recorded it; nobody for what an outside service reports. */
  readonly recordedBy: number | null;
  readonly note?: string | undefined;
  /** Of a reversal: the document that it takes back. */
  readonly reverses?: number;
}

/** A document as moves and entries need it. */
export interface RecordedDocument {
  readonly id: number;
  readonly kind: DocumentKind;
  readonly number: string;
  readonly occurredAt: Date;
  readonly recordedBy: number | null;
}

/** Records what happened. Stock moves and journal entries hang from documents, and from nothing else. */
@Injectable()
export class DocumentsService {
  constructor(
    private readonly clock: Clock,
    private readonly numbers: Numbers,
    private readonly repository: DocumentsRepository,
  ) {}

  /** @throws Error when a kind that carries a foreign number is recorded without one: a mistake of ours. */
  async record(trx: Transaction<DB>, document: NewDocument): Promise<RecordedDocument> {
    const number = document.number ?? (await this.nextNumber(trx, document.kind));
    const occurredAt = this.clock.now();
    const { kind, recordedBy } = document;
    const id = await this.repository.insert(trx, {
      kind,
      number,
      occurredAt,
      recordedBy,
      note: document.note ?? null,
      reverses: document.reverses ?? null,
    });
    return { id, kind, number, occurredAt, recordedBy };
  }

  /** Reads a document that was recorded earlier, to post to it. */
  async get(trx: Transaction<DB>, id: number): Promise<RecordedDocument> {
    return this.repository.get(trx, id);
  }

  private async nextNumber(trx: Transaction<DB>, kind: DocumentKind): Promise<string> {
    const letters = documentKinds[kind];
    if (letters === null) throw new Error(`a document of kind ${kind} carries the number of what it belongs to`);
    const next = await this.numbers.next(trx, kind, '');
    return `${letters}-${String(next).padStart(4, '0')}`;
  }
}
