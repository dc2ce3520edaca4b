import { Decimal } from '@emberlot/shared/measure/decimal';
import { AppError, type FieldFault } from '../platform/errors/app-error.js';
import type { Availability } from '../stock/reservations.service.js';
import { fault, type ResolvedLine } from '../stock/stock-lines.service.js';
import type { BatchLineRow, LinePart } from './batch-lines.repository.js';
import type { IssueLineDto } from './picking.dto.js';

/** A line of an issue with all it names. */
export interface IssueLine extends ResolvedLine {
  readonly line: BatchLineRow;
  readonly quantity: Decimal;
}

/** What cannot be used may not be built in, whoever scans it. */
export function unusable({ lot, bin, part }: ResolvedLine, today: string, index: number): FieldFault | undefined {
  const pointer = `/lines/${index}/lot`;
  if (lot.status === 'held')
    return fault(pointer, `Lot ${lot.code} is held. Nothing of it may be used until it is released.`);
  if (lot.status === 'rejected') return fault(pointer, `Lot ${lot.code} was rejected and may not be used.`);
  if (lot.expiresOn !== null && lot.expiresOn < today) {
    return fault(pointer, `Lot ${lot.code} expired on ${lot.expiresOn} and may not be used.`);
  }
  if (bin.quarantine) {
    return fault(`/lines/${index}/bin`, `${bin.code} is a quarantine bin. ${part.code} from there may not be used.`);
  }
  return undefined;
}

/** Only the line's own part, or one approved to stand in for it. */
export function notOfLine(
  asked: IssueLineDto,
  line: BatchLineRow,
  alternates: readonly (LinePart & { lineId: number })[],
  index: number,
): FieldFault | undefined {
  if (asked.part === line.code) return undefined;
  const approved = alternates.filter(({ lineId }) => lineId === line.billLineId).map(({ code }) => code);
  if (approved.includes(asked.part)) return undefined;
  const others =
    approved.length === 0 ? 'nothing is approved to stand in for it' : `approved for it: ${approved.join(', ')}`;
  return fault(`/lines/${index}/part`, `This place takes ${line.code}; ${others}.`);
}

/** While a batch is being picked nobody takes more than it needs; at the bench, what broke is replaced. */
export function refuseTooMuch(lines: readonly IssueLine[]): void {
  const asked = new Map<number, Decimal>();
  lines.forEach(({ line, quantity }, index) => {
    const sum = (asked.get(line.id) ?? new Decimal(0)).plus(quantity);
    asked.set(line.id, sum);
    const needed = Decimal.max(new Decimal(line.required).minus(line.issued), 0);
    if (sum.lessThanOrEqualTo(needed)) return;
    const sentence = `The batch needs ${needed.toFixed()} more of ${line.code} here, and ${sum.toFixed()} were picked.`;
    throw new AppError('rule_broken', sentence, {
      faults: [{ pointer: `/lines/${index}/quantity`, code: 'too_much', detail: sentence }],
    });
  });
}

/** What others have claimed stays for them: beyond its own claim a line takes only what is free. */
export function refuseClaimedByOthers(lines: readonly IssueLine[], available: ReadonlyMap<number, Availability>): void {
  const beyond = new Map<number, Decimal>();
  const claims = new Map<number, Decimal>();
  for (const { line, part, quantity } of lines) {
    const own = part.id === line.partId ? (claims.get(line.id) ?? new Decimal(line.claimed)) : new Decimal(0);
    const fromClaim = Decimal.min(own, quantity);
    if (part.id === line.partId) claims.set(line.id, own.minus(fromClaim));
    beyond.set(part.id, (beyond.get(part.id) ?? new Decimal(0)).plus(quantity.minus(fromClaim)));
  }
  lines.forEach(({ part }, index) => {
    const asked = beyond.get(part.id) ?? new Decimal(0);
    const free = Decimal.max(available.get(part.id)?.free ?? 0, 0);
    if (asked.isZero() || asked.lessThanOrEqualTo(free)) return;
    const sentence = `${part.code} is promised elsewhere: beyond this batch's own claim only ${free.toFixed()} are free.`;
    throw new AppError('not_enough_stock', sentence, {
      faults: [{ pointer: `/lines/${index}/quantity`, code: 'not_enough', detail: sentence }],
    });
  });
}
