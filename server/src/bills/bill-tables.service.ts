import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { decimalText } from '@emberlot/shared/measure/decimal';
import type { Kysely, Transaction } from 'kysely';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { BillContentRepository } from './bill-content.repository.js';
import { inputOf, type Parts } from './bill-content.js';
import type { BillContentDto } from './bill.dto.js';
import type { BillPart, BillRevision } from './bill-revision.js';
import {
  faultsOfRows,
  loopFaults,
  repeatedComponents,
  rowsByOwner,
  type SectionItem,
  type SectionKey,
  type TableFault,
  type TableRow,
} from './bill-table-faults.js';
import { BillsRepository } from './bills.repository.js';
import { DraftBillsService } from './draft-bills.service.js';

/** What a table would do to the bills it names. */
export interface TableCheck<Key extends SectionKey> {
  readonly faults: readonly TableFault[];
  /** Codes of parts for which a draft would be begun. */
  readonly begun: readonly string[];
  /** Codes of parts whose draft would hold something else than it does. */
  readonly replaced: readonly string[];
  /** Codes of parts whose bill says the same already. */
  readonly same: readonly string[];
  /** What would be written, by the code of the bill's part. */
  readonly sections: ReadonlyMap<string, readonly SectionItem<Key>[]>;
}

/** Bills as tables of rows: lines, steps or test plans of many parts at once, each put into that part's draft. */
@Injectable()
export class BillTablesService {
  constructor(
    private readonly repository: BillsRepository,
    private readonly content: BillContentRepository,
    private readonly drafts: DraftBillsService,
  ) {}

  /** Looks at the lines of many bills together. @param placed whether each row gave its position itself */
  async checkLines(
    handle: Kysely<DB>,
    rows: readonly TableRow<'lines'>[],
    placed: readonly boolean[],
  ): Promise<TableCheck<'lines'>> {
    const check = await this.check(handle, 'lines', rows);
    const outside = await this.content.edgesOutside(handle, [...rowsByOwner(rows).keys()]);
    const faults = [...check.faults, ...repeatedComponents(rows, placed), ...loopFaults(rows, outside)];
    return { ...check, faults };
  }

  /** Looks at steps or test plans of many bills. */
  async check<Key extends SectionKey>(
    handle: Kysely<DB>,
    key: Key,
    rows: readonly TableRow<Key>[],
  ): Promise<TableCheck<Key>> {
    const owners = rowsByOwner(rows);
    const parts = await this.repository.partsByCode(handle, [...owners.keys(), ...codesInRows(rows)]);
    const faults = faultsOfRows(key, rows, parts);
    if (faults.length > 0) return { faults, begun: [], replaced: [], same: [], sections: new Map() };
    const inHand = await this.#inHand(handle, parts, owners);
    const [begun, replaced, same]: [string[], string[], string[]] = [[], [], []];
    const sections = new Map<string, readonly SectionItem<Key>[]>();
    for (const [code, places] of owners) {
      const items = places.flatMap((row) => (rows[row] ? [rows[row].item] : []));
      const { draft, released } = inHand.get(code) ?? {};
      const current = draft ?? released;
      if (current && isSame(key, inputOf(current), items)) {
        same.push(code);
        continue;
      }
      (draft ? replaced : begun).push(code);
      sections.set(code, items);
    }
    return { faults, begun, replaced, same, sections };
  }

  /** Puts sections into the drafts of their parts, beginning one from the released revision where there is none. */
  async put<Key extends SectionKey>(
    trx: Transaction<DB>,
    person: SignedInUser,
    key: Key,
    sections: ReadonlyMap<string, readonly SectionItem<Key>[]>,
  ): Promise<void> {
    await this.content.lockAll(trx);
    const parts = await this.repository.partsByCode(trx, [...sections.keys()]);
    const inHand = await this.#inHand(trx, parts, sections);
    const revisions = new Map<string, BillRevision>();
    for (const part of parts.values()) {
      const { draft, released } = inHand.get(part.code) ?? {};
      revisions.set(part.code, draft ?? (await this.#begin(trx, person, part, released !== undefined)));
    }
    // Old lines of one draft and new ones of another must not seem to close a loop in passing.
    if (key === 'lines') {
      await this.content.clearLines(
        trx,
        [...revisions.values()].map(({ id }) => id),
      );
    }
    for (const [code, items] of sections) {
      const revision = revisions.get(code);
      if (!revision) continue;
      const content = { ...inputOf(revision), [key]: [...items], version: revision.version };
      await this.drafts.replace(trx, person, revision, content);
    }
  }

  async #begin(trx: Transaction<DB>, person: SignedInUser, part: BillPart, released: boolean): Promise<BillRevision> {
    const id = await this.drafts.begin(trx, person, part, released ? 'released' : 'nothing');
    const [revision] = await this.repository.read(trx, [id]);
    if (!revision) throw new Error('the draft was not kept');
    return revision;
  }

  async #inHand(
    handle: Kysely<DB>,
    parts: Parts,
    owners: ReadonlyMap<string, unknown>,
  ): Promise<ReadonlyMap<string, { draft?: BillRevision; released?: BillRevision }>> {
    const partIds = [...owners.keys()].flatMap((code) => parts.get(code)?.id ?? []);
    const ids = await this.repository.idsInHand(handle, partIds);
    const found = new Map<string, { draft?: BillRevision; released?: BillRevision }>();
    for (const revision of await this.repository.read(handle, ids)) {
      const state = revision.status === 'draft' ? { draft: revision } : { released: revision };
      found.set(revision.part.code, { ...found.get(revision.part.code), ...state });
    }
    return found;
  }
}

function codesInRows<Key extends SectionKey>(rows: readonly TableRow<Key>[]): string[] {
  return rows.flatMap(({ item }) => ('part' in item ? [item.part, ...item.alternates] : []));
}

const decimalFields = new Set(['quantityPer', 'scrapPercent', 'minutes', 'lowerLimit', 'target', 'upperLimit']);

function isSame<Key extends SectionKey>(
  key: Key,
  content: BillContentDto,
  items: readonly SectionItem<Key>[],
): boolean {
  const own: readonly object[] = content[key];
  const inOrder = (entries: readonly object[]) =>
    key === 'lines' ? entries.toSorted((a, b) => positionOf(a) - positionOf(b)) : entries;
  const text = (entries: readonly object[]) => JSON.stringify(inOrder(entries).map(plainEntry));
  return text(own) === text(items);
}

function positionOf(entry: object): number {
  return 'position' in entry && typeof entry.position === 'number' ? entry.position : 0;
}

/** Members in one order, numbers without idle zeros, nothing said as null: two that mean the same read the same. */
function plainEntry(entry: object): unknown {
  const pairs = Object.entries(entry).filter(([, value]) => value !== null && value !== undefined && value !== '');
  return pairs
    .map(([field, value]): [string, unknown] => [
      field,
      decimalFields.has(field) && typeof value === 'string' ? decimalText(value) : value,
    ])
    .toSorted(([a], [b]) => (a < b ? -1 : 1));
}
