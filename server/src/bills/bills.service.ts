import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely } from 'kysely';
import { AppError, notFound } from '../platform/errors/app-error.js';
import { BillsRepository } from './bills.repository.js';
import type { BillPart, BillRevision } from './bill-revision.js';

/**
 * Bills as others read them. For the arithmetic give what is read to `billsOf`, `partsOf` and `issueDecimalsOf` of
 * `bill-arithmetic.ts`.
 */
@Injectable()
export class BillsService {
  constructor(private readonly repository: BillsRepository) {}

  /** @throws AppError `not_found` */
  async part(handle: Kysely<DB>, code: string): Promise<BillPart> {
    const part = (await this.repository.partsByCode(handle, [code])).get(code);
    if (!part) throw notFound('part');
    return part;
  }

  /** A revision by its id, whatever its status. @throws AppError `not_found` */
  async get(handle: Kysely<DB>, revisionId: number): Promise<BillRevision> {
    const [revision] = await this.repository.read(handle, [revisionId]);
    if (!revision) throw notFound('revision');
    return revision;
  }

  /** Revisions by their ids, in the order of these; those that do not exist are left out. */
  async read(handle: Kysely<DB>, revisionIds: readonly number[]): Promise<BillRevision[]> {
    const revisions = await this.repository.read(handle, revisionIds);
    const byId = new Map(revisions.map((revision) => [revision.id, revision]));
    return revisionIds.flatMap((id) => byId.get(id) ?? []);
  }

  /** A revision of a part by its number. @throws AppError `not_found` */
  async getByNumber(handle: Kysely<DB>, code: string, number: number): Promise<BillRevision> {
    const part = await this.part(handle, code);
    const id = await this.repository.findRevisionId(handle, part.id, number);
    if (id === undefined) throw notFound('revision');
    return this.get(handle, id);
  }

  /** The released revision of a part, if it has one. */
  async findReleased(handle: Kysely<DB>, partId: number): Promise<BillRevision | undefined> {
    return (await this.released(handle, [partId])).get(partId);
  }

  /** @throws AppError `wrong_state` when nothing is released */
  async getReleased(handle: Kysely<DB>, partId: number): Promise<BillRevision> {
    const revision = await this.findReleased(handle, partId);
    if (!revision) throw new AppError('wrong_state', 'This part has no released bill. Release one first.');
    return revision;
  }

  /** Released revisions by the id of the part they make; parts without one are left out. */
  async released(handle: Kysely<DB>, partIds: readonly number[]): Promise<ReadonlyMap<number, BillRevision>> {
    const revisions = await this.repository.read(handle, await this.repository.releasedIds(handle, partIds));
    return new Map(revisions.map((revision) => [revision.part.id, revision]));
  }

  /**
   * Everything that building to a revision may need: the revision itself, whatever its status, and the released
   * revisions of all made parts below it, over lines and alternates, at any depth.
   *
   * @returns by the id of the part they make; the given one first
   */
  async withAllBelow(handle: Kysely<DB>, revision: BillRevision): Promise<ReadonlyMap<number, BillRevision>> {
    const ids = await this.repository.releasedIdsBelow(handle, [revision.id]);
    const below = await this.repository.read(
      handle,
      ids.filter((id) => id !== revision.id),
    );
    return new Map([revision, ...below].map((each) => [each.part.id, each]));
  }
}
