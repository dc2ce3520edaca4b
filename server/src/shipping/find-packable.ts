import { Decimal } from '@emberlot/shared/measure/decimal';
import { AppError } from '../platform/errors/app-error.js';
import type { PackableRow } from './packing-lookup.repository.js';
import type { ParcelNeedRow } from './parcels.repository.js';

/** Still to be packed of a need. */
export function missingOf(need: ParcelNeedRow): Decimal {
  return new Decimal(need.quantity).minus(need.packed);
}

/** Why what lies there may not be packed; nothing when it may. */
export function refusalOf(row: PackableRow): string | undefined {
  if (row.status === 'held') return `{lot:${row.lot}} is held: it is not packed until the owner lets it go.`;
  if (row.status === 'rejected') return `{lot:${row.lot}} was rejected. Take another lot.`;
  if (row.quarantine) return `{lot:${row.lot}} lies in ${row.bin}, a quarantine bin. Take another lot.`;
  if (row.expired) return `{lot:${row.lot}} has expired. Take another lot.`;
  if (new Decimal(row.quantity).lessThanOrEqualTo(0))
    return `All of {lot:${row.lot}} in ${row.bin} is in parcels already.`;
  return undefined;
}

/**
 * The need a scanned part is for: the one that was pointed at, or the next open one.
 *
 * @throws AppError `rule_broken` when the order needs none of it, or all of it is packed
 */
export function needFor(
  needs: readonly ParcelNeedRow[],
  part: { readonly id: number; readonly code: string },
  needId: number | undefined,
  order: string,
): ParcelNeedRow {
  const ofPart = needs.filter(({ partId }) => partId === part.id);
  if (ofPart.length === 0) {
    throw new AppError('rule_broken', `{order:${order}} needs no {part:${part.code}}: put it back.`);
  }
  const open = ofPart.filter((need) => missingOf(need).greaterThan(0));
  const chosen = needId === undefined ? open[0] : open.find(({ id }) => id === needId);
  if (chosen) return chosen;
  if (needId !== undefined && open.length > 0) {
    throw new AppError('rule_broken', `{part:${part.code}} does not belong in this line. Choose the line it is for.`);
  }
  throw new AppError('rule_broken', `All {part:${part.code}} that {order:${order}} needs is in the parcel already.`);
}

/**
 * The one place something is taken from.
 *
 * @throws AppError `rule_broken` when it lies in several places and no bin was scanned, or may not be packed
 */
export function placeFor(lying: readonly PackableRow[], thing: string, bin: string | undefined): PackableRow {
  const here = bin === undefined ? lying : lying.filter((row) => row.bin === bin);
  const usable = here.filter((row) => refusalOf(row) === undefined);
  const [only, second] = usable;
  if (only && !second) return only;
  if (only) {
    const bins = [...new Set(usable.map((row) => row.bin))];
    const next =
      bins.length > 1 ? `lies in ${bins.join(', ')}: scan the bin first.` : `lies in several lots: scan the lot.`;
    throw new AppError('rule_broken', `${thing} ${next}`);
  }
  const [refused] = here;
  if (refused) throw new AppError('rule_broken', refusalOf(refused) ?? `${thing} cannot be packed.`);
  throw new AppError('not_enough_stock', `${thing} does not lie ${bin === undefined ? 'on the shelf' : `in ${bin}`}.`);
}
