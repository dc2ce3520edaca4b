import { Injectable } from '@nestjs/common';
import type { Role, SignedInUser } from '../platform/auth/signed-in-user.js';
import { Database } from '../platform/database/database.js';
import { foundKinds, type FoundDto, type FoundKind, type FindQuery } from './find.dto.js';
import { FindRepository, type FoundRow } from './find.repository.js';

/** Kinds that a role does not meet, as its areas have no place for them. */
const hiddenFrom: Readonly<Partial<Record<Role, readonly FoundKind[]>>> = {
  assembler: ['invoice', 'person'],
  accountant: ['unit', 'batch'],
  customer: foundKinds,
};

/** Goes from a scanned code, or from a few letters, to the thing. */
@Injectable()
export class FindService {
  constructor(
    private readonly database: Database,
    private readonly repository: FindRepository,
  ) {}

  async find({ q, limit }: FindQuery, person: SignedInUser): Promise<FoundDto[]> {
    const hidden = hiddenFrom[person.role] ?? [];
    const kinds = foundKinds.filter((kind) => !hidden.includes(kind));
    const token = unitTokenIn(q);
    if (token !== null && kinds.includes('unit')) {
      const unit = await this.repository.unitByToken(this.database.handle, token);
      return unit ? [foundDto(unit)] : [];
    }
    const rows = await this.repository.find(this.database.handle, kinds, { text: q, unitToken: token, limit });
    return rows.map(foundDto);
  }
}

/** A unit's label leads to its public page: the scanner types that address. */
function unitTokenIn(text: string): string | null {
  return /\/u\/([\w-]{22,})\/?$/.exec(text)?.[1] ?? null;
}

function foundDto({ kind, code, story, rank }: FoundRow): FoundDto {
  const found = { kind, code, story, exact: rank === 0 };
  if (kind === 'document') return { ...found, to: `/shelf/deliveries/${encodeURIComponent(code)}` };
  // A buyer is met through the orders.
  if (kind === 'person') return { ...found, to: `/counter/orders?q=${encodeURIComponent(story)}` };
  return found;
}
