import { Injectable } from '@nestjs/common';
import { Decimal, decimal, decimalText } from '@emberlot/shared/measure/decimal';
import { PartsService } from '../parts/parts.service.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import type { Page } from '../platform/paging/page.js';
import { MovesService } from './moves.service.js';
import { PartFiguresService, type PartFigures } from './part-figures.service.js';
import type { PartItemDto, PartsQuery } from './part-list.dto.js';
import { PartListRepository, type ListedPart } from './part-list.repository.js';
import type { PartClaimDto, PartStoryDto } from './part-story.dto.js';
import { PartStoryRepository, type ClaimRow } from './part-story.repository.js';

/** Parts as they lie on the shelf: the list with its figures, and one part's whole story. */
@Injectable()
export class ShelfPartsService {
  constructor(
    private readonly database: Database,
    private readonly clock: Clock,
    private readonly parts: PartsService,
    private readonly list: PartListRepository,
    private readonly story: PartStoryRepository,
    private readonly figures: PartFiguresService,
    private readonly moves: MovesService,
  ) {}

  async findPage(query: PartsQuery, person: SignedInUser): Promise<Page<PartItemDto>> {
    const handle = this.database.handle;
    const moment = { at: this.clock.now(), today: this.clock.today() };
    const page = await this.list.findPage(handle, query, moment);
    const figures = await this.figures.read(handle, page.items, await this.moves.currencyFor(person));
    const items = page.items.flatMap((part) => {
      const own = figures.get(part.id);
      return own ? [itemDto(part, own)] : [];
    });
    return { items, total: page.total };
  }

  /** @throws AppError `not_found` */
  async get(code: string, person: SignedInUser): Promise<PartStoryDto> {
    const handle = this.database.handle;
    const part = await this.parts.get(code);
    const currency = await this.moves.currencyFor(person);
    const asked = { id: part.id, reorderPoint: part.reorderPoint ?? null };
    const figures = (await this.figures.read(handle, [asked], currency)).get(part.id);
    if (!figures) throw new Error(`part ${code} has no figures`);
    const today = this.clock.today();
    const { bins: _bins, ...shown } = figures;
    return {
      part,
      figures: shown,
      places: (await this.story.placesOf(handle, part.id)).map((place) => ({
        ...place,
        expired: place.expiresOn !== null && place.expiresOn < today,
        quantity: decimalText(place.quantity),
      })),
      claims: (await this.story.claimsOf(handle, part.id, this.clock.now())).map(claimDto),
      uses: (await this.story.usesOf(handle, part.id)).map((use) => ({ ...use, quantity: decimalText(use.quantity) })),
      moves: await this.moves.latest({ partId: part.id }, person),
      ...(currency === undefined ? {} : { currency }),
    };
  }
}

function itemDto(part: ListedPart, figures: PartFigures): PartItemDto {
  return {
    ...figures,
    bins: [...figures.bins],
    code: part.code,
    name: part.name,
    measure: part.measure,
    traced: part.traced,
    reorderPoint: part.reorderPoint === null ? null : decimalText(part.reorderPoint),
    retired: part.retiredOn !== null,
  };
}

function claimDto(row: ClaimRow): PartClaimDto {
  const missing = Decimal.max(decimal(row.needed).minus(row.claimed).minus(row.awaited), 0);
  return {
    reference: row.reference,
    kind: row.kind,
    neededOn: row.neededOn,
    needed: decimalText(row.needed),
    claimed: decimalText(row.claimed),
    awaited: decimalText(row.awaited),
    missing: decimalText(missing),
  };
}
