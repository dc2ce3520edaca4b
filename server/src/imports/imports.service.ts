import { createHash } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely } from 'kysely';
import type { Plain } from '../platform/api/plain.js';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError } from '../platform/errors/app-error.js';
import type { Page } from '../platform/paging/page.js';
import { chosenColumns } from './chosen-columns.js';
import { columnFaults, columnFor, findColumns, type FoundColumn } from './find-columns.js';
import type { ImportCheck, ImportKind, RowFault } from './import-kind.js';
import { ImportKinds } from './import-kinds.js';
import type { AppliedImportDto, ImportCheckDto, ImportFormDto, ImportRunDto, ImportsQuery } from './imports.dto.js';
import { ImportsRepository, type ImportRunRow } from './imports.repository.js';
import { readCsv, type CsvTable } from './read-csv.js';
import { readTable, type ReadTable } from './read-table.js';

export interface UploadedCsv {
  readonly fileName: string;
  readonly bytes: Buffer;
}

/** A file as far as it can be read without the shelf. */
interface ReadFile {
  readonly file: UploadedCsv;
  readonly kind: ImportKind;
  readonly table: CsvTable;
  readonly columns: readonly FoundColumn[];
  readonly read: ReadTable;
}

/** Faults listed in an answer; all of them are counted. */
const mostListed = 1_000;

@Injectable()
export class ImportsService {
  constructor(
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly clock: Clock,
    private readonly audit: Audit,
    private readonly kinds: ImportKinds,
    private readonly runs: ImportsRepository,
  ) {}

  /** Says what a file would do, and every fault of it by line. Writes nothing. */
  async dryRun(key: string, file: UploadedCsv, form: ImportFormDto): Promise<ImportCheckDto> {
    const read = await this.read(key, file, form);
    return checkDto(read, await this.check(this.database.handle, read));
  }

  /**
   * Takes a file in, whole or not at all.
   *
   * @throws AppError `invalid_input` with the dry run's answer when there is a fault; `rule_broken` when the file holds
   *   nothing new
   */
  async apply(key: string, file: UploadedCsv, form: ImportFormDto, person: SignedInUser): Promise<AppliedImportDto> {
    const read = await this.read(key, file, form);
    return this.transactions.run(async (trx) => {
      await this.runs.lock(trx);
      const check = await this.check(trx, read);
      refuse(read, check);
      const { documentId } = await read.kind.apply(trx, check.plan, { person, fileName: file.fileName });
      const id = await this.runs.insert(trx, {
        kind: read.kind.key,
        fileName: file.fileName,
        content: digest(file),
        rowCount: read.table.rows.length,
        appliedAt: this.clock.now(),
        appliedBy: person.id,
        documentId,
      });
      await this.audit.record(trx, {
        actor: person,
        action: 'import.applied',
        subjectKind: 'import_run',
        subjectId: id,
        subjectCode: file.fileName,
        after: { kind: read.kind.key, rows: read.table.rows.length, notes: check.notes },
      });
      return { ...this.runDto(await this.runs.get(trx, id)), notes: [...check.notes] };
    });
  }

  async list(query: ImportsQuery): Promise<Page<ImportRunDto>> {
    const page = await this.runs.findPage(this.database.handle, query);
    return { items: page.items.map((row) => this.runDto(row)), total: page.total };
  }

  private async read(key: string, file: UploadedCsv, form: ImportFormDto): Promise<ReadFile> {
    const kind = this.kinds.get(key);
    const table = await readCsv(file.bytes, (header) => columnFor(header, kind) !== undefined);
    const columns = findColumns(table.headers, kind, chosenColumns(form.mapping, kind));
    const faults = faultsOfColumns(columns, kind);
    const read =
      faults.length > 0 ? { rows: [], faults, decimalSign: undefined } : readTable(table, columns, form.decimalSign);
    return { file, kind, table, columns, read };
  }

  private async check(handle: Kysely<DB>, { file, kind, table, read }: ReadFile): Promise<ImportCheck<unknown>> {
    const same = kind.repeatable ? undefined : await this.runs.findSame(handle, kind.key, digest(file));
    if (same) return { faults: [takenInAlready(same)], notes: [], additions: 0, plan: null };
    // With lines missing, the check over all rows would find faults that are none.
    const whole = read.rows.length === table.rows.length && read.faults.length === 0;
    const check = await kind.check(handle, read.rows);
    const faults = [...read.faults, ...check.faults].toSorted((left, right) => left.line - right.line);
    return whole ? { ...check, faults } : { faults, notes: [], additions: 0, plan: null };
  }

  private runDto(row: ImportRunRow): Plain<ImportRunDto> {
    return { ...row, title: this.kinds.get(row.kind).title, appliedAt: row.appliedAt.toISOString() };
  }
}

function digest(file: UploadedCsv): Buffer {
  return createHash('sha256').update(file.bytes).digest();
}

function faultsOfColumns(columns: readonly FoundColumn[], kind: ImportKind): RowFault[] {
  const { missing, doubled } = columnFaults(columns, kind);
  return [
    ...missing.map(({ title }) => ({
      line: 1,
      column: title,
      sentence: `No column of the file fills ${title}, which is needed. Choose one.`,
    })),
    ...doubled.map((title) => ({
      line: 1,
      column: title,
      sentence: `More than one column of the file fills ${title}. Leave all but one alone.`,
    })),
  ];
}

function takenInAlready(run: ImportRunRow): RowFault {
  const day = run.appliedAt.toISOString().slice(0, 10);
  const sentence = `This very file was taken in on ${day} by ${run.appliedBy}. It is not taken in twice.`;
  return { line: 1, column: null, sentence };
}

function refuse(read: ReadFile, check: ImportCheck<unknown>): void {
  if (check.faults.length > 0) {
    const sentence = `${read.file.fileName} has faults (${check.faults.length}), so nothing of it was taken in.`;
    throw new AppError('invalid_input', sentence, { extra: { check: checkDto(read, check) } });
  }
  if (check.additions === 0) {
    throw new AppError('rule_broken', 'All that this file holds is there already, so nothing was changed.');
  }
}

function checkDto({ file, kind, table, columns, read }: ReadFile, check: ImportCheck<unknown>): ImportCheckDto {
  return {
    kind: kind.key,
    fileName: file.fileName,
    rowCount: table.rows.length,
    separator: table.separator,
    decimalSign: read.decimalSign ?? null,
    columns: columns.map(({ index, header, column }) => ({
      index,
      header,
      key: column?.key ?? null,
      title: column?.title ?? null,
      sample: (table.rows.find(({ cells }) => cells[index])?.cells[index] ?? '').slice(0, 80),
    })),
    faultCount: check.faults.length,
    faults: check.faults.slice(0, mostListed),
    notes: [...check.notes],
    additions: check.additions,
    ready: check.faults.length === 0 && check.additions > 0,
  };
}
