import { MoneyDto } from '../platform/api/money.dto.js';
import { BillPartDto } from '../bills/bill.dto.js';

export class MissingPartDto {
  part: BillPartDto;
  /** How much of it is missing. */
  missing: string;
  /** What lies on the shelf, what of it may be used, and what of that is promised already. */
  onShelf: string;
  usable: string;
  claimed: string;
}

export class TakenPartDto {
  part: BillPartDto;
  /** What building all of them takes from the shelf. */
  taken: string;
  free: string;
}

export class MadeOnTheWayDto {
  part: BillPartDto;
  quantity: string;
}

export class BuildableDto {
  /** How many can be built now from what is free. */
  quantity: string;
  /** The most that could be possible; equal to `quantity` unless the search was cut short. */
  atMost: string;
  /** Everything that is missing for the next one: all of these together let it be built. */
  stops: MissingPartDto[];
  /** Whether less than `stops` would not do. */
  proven: boolean;
  /** Of these, one alone would be enough, and how much of it. */
  aloneEnough: MissingPartDto[];
  takes: TakenPartDto[];
  made: MadeOnTheWayDto[];
}

export class CostLineDto {
  position: number;
  part: BillPartDto;
  /** Of the component, for one made, with its allowance for scrap; in its stock unit. */
  taken: string;
  /** For one stock unit of the component, in major units with six places. */
  unitCost: string | null;
  /** Where the cost comes from: the average of what lies on the shelf, the last that came in, its own bill, or nowhere. */
  basis: 'average' | 'last' | 'bill' | 'unknown';
  amount: MoneyDto;
}

export class BillCostDto {
  lines: CostLineDto[];
  /** Minutes of the bill's own steps, and on all levels. */
  ownMinutes: string;
  minutes: string;
  labourPerHour: MoneyDto;
  material: MoneyDto;
  labour: MoneyDto;
  total: MoneyDto;
  /** Parts whose cost is not known and counts as nothing. */
  unknown: BillPartDto[];
}

export class DesignQueueItemDto {
  kind: 'draft_waiting' | 'component_retired' | 'cannot_build';
  part: BillPartDto;
  number: number;
  /** Since when: the draft was begun or the revision released. */
  since: Date;
  /** Codes of the parts it is about: retired or missing ones. */
  parts: string[];
  /** For a draft: what stands against releasing it, a sentence each. */
  against: string[];
}

export class DesignQueueDto {
  items: DesignQueueItemDto[];
}
