export class HeldLotDto {
  lot: string;
  part: string;
  name: string;
  measure: string;
  quantity: string;
  bins: string[];
  receivedOn: string | null;
  supplier: string | null;
}

export class ShortPartDto {
  part: string;
  name: string;
  measure: string;
  free: string;
  claimed: string;
  /** By how much more is claimed than can be used; null when only the reorder point is passed. */
  short: string | null;
  reorderPoint: string | null;
  /** The one to order from first. */
  supplier: string | null;
}

export class ExpiringLotDto {
  lot: string;
  part: string;
  name: string;
  measure: string;
  quantity: string;
  expiresOn: string;
  expired: boolean;
}

/** What needs a hand on the shelf; each list holds the most urgent, and says how many there are. */
export class ShelfQueueDto {
  heldLots: HeldLotDto[];
  heldLotCount: number;
  /** Claimed beyond what can be used first, then below the reorder point. */
  shortParts: ShortPartDto[];
  shortPartCount: number;
  expiringLots: ExpiringLotDto[];
  expiringLotCount: number;
}
