import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely } from 'kysely';
import { AppError } from '../platform/errors/app-error.js';
import { PackingLookupRepository, type ScannedUnit } from './packing-lookup.repository.js';

export type Scanned =
  | {
      readonly kind: 'unit';
      readonly unitId: number;
      readonly partId: number;
      readonly part: string;
      readonly lotId: number;
      readonly tag: string;
    }
  | {
      readonly kind: 'lot' | 'part';
      readonly partId: number;
      readonly part: string;
      /** Nothing for a part that is followed by count: its standing lot. */
      readonly lotId: number | null;
      readonly tag: string;
    }
  | { readonly kind: 'bin'; readonly code: string; readonly quarantine: boolean };

/** Says what a scan means: a unit's serial number or the address on its label, a lot, a part, or a bin. */
@Injectable()
export class ScanReader {
  constructor(private readonly lookup: PackingLookupRepository) {}

  /** @throws AppError `not_found` for what names nothing, `rule_broken` for a unit that may not be packed */
  async read(handle: Kysely<DB>, text: string): Promise<Scanned> {
    const code = text.toUpperCase();
    const unit = await this.lookup.unit(handle, code, pageTokenIn(text));
    if (unit) return packableUnit(unit);
    const lot = await this.lookup.lot(handle, code);
    if (lot) return { kind: 'lot', partId: lot.partId, part: lot.part, lotId: lot.id, tag: `{lot:${lot.code}}` };
    const part = await this.lookup.part(handle, code);
    if (part) return { kind: 'part', partId: part.id, part: part.code, lotId: null, tag: `{part:${part.code}}` };
    const bin = await this.lookup.bin(handle, code);
    if (bin) return { kind: 'bin', code: bin.code, quarantine: bin.quarantine };
    throw new AppError('not_found', `Nothing here is called ${code}. Scan the label of a unit, a lot or a bin.`);
  }
}

function packableUnit(unit: ScannedUnit): Scanned {
  const tag = `{unit:${unit.serial}}`;
  if (unit.scrapped) throw new AppError('rule_broken', `${tag} was scrapped.`);
  if (unit.parcel !== null) throw new AppError('rule_broken', `${tag} lies in parcel ${unit.parcel} already.`);
  if (unit.lotId === null) throw new AppError('rule_broken', `${tag} is not finished yet.`);
  if (!unit.sound) {
    throw new AppError('rule_broken', `${tag} has no valid pass: its last test failed, or something was done since.`);
  }
  return { kind: 'unit', unitId: unit.id, partId: unit.partId, part: unit.part, lotId: unit.lotId, tag };
}

/** The label's code holds the address of the unit's page, which ends with its token. */
function pageTokenIn(text: string): string | null {
  const [, token] = /^https?:\/\/\S+\/([A-Za-z0-9_-]{22,})$/.exec(text) ?? [];
  return token ?? null;
}
