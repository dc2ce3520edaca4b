import type { Decimal } from '@emberlot/shared/measure/decimal';
import type { IsoDay } from '@emberlot/shared/plan/iso-day';

/** A quantity of a part that must leave the shelf for something that is sold. */
export interface Need {
  readonly partId: number;
  readonly quantity: Decimal;
}

/** How a need is met: from the shelf, from batches under way, or both. */
export interface Cover {
  readonly partId: number;
  readonly fromShelf: Decimal;
  readonly fromBatches: readonly { readonly batchId: number; readonly quantity: Decimal }[];
}

/** The day by which something leaves the shop, or that nobody can say. */
export type ShopPromise =
  | {
      readonly kind: 'by';
      readonly day: IsoDay;
      /** The batch it waits for, where the shelf is not enough. */
      readonly batchNumber: string | null;
      readonly covers: readonly Cover[];
    }
  | { readonly kind: 'ask' };
