import { Injectable } from '@nestjs/common';
import { Decimal } from '@emberlot/shared/measure/decimal';
import { DocumentsService } from '../journal/documents.service.js';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Transactions } from '../platform/database/transactions.js';
import { inputRefused } from '../platform/validation/validation-pipe.js';
import type { TransferInputDto } from './move-stock.dto.js';
import { StockLedgerService } from './stock-ledger.service.js';
import { fault, quantitiesOf, StockLines, tooLittle, type ResolvedLine } from './stock-lines.service.js';
import type { StockBin } from './stock-lookup.repository.js';

/** Things change their bin and nothing else: no value moves. */
@Injectable()
export class TransferStockService {
  constructor(
    private readonly transactions: Transactions,
    private readonly audit: Audit,
    private readonly documents: DocumentsService,
    private readonly ledger: StockLedgerService,
    private readonly stockLines: StockLines,
  ) {}

  /** @returns the number of the transfer */
  async transfer(input: TransferInputDto, person: SignedInUser): Promise<string> {
    const staying = input.lines.flatMap(({ bin, toBin }, index) =>
      bin === toBin ? [fault(`/lines/${index}/toBin`, 'It lies in this bin already.')] : [],
    );
    if (staying.length > 0) throw inputRefused(staying);
    return this.transactions.run(async (trx) => {
      const lines = await this.stockLines.resolve(trx, input.lines);
      const destinations = await this.stockLines.bins(
        trx,
        input.lines.map(({ toBin }, index) => ({ code: toBin, pointer: `/lines/${index}/toBin` })),
      );
      const quantities = quantitiesOf(
        input.lines,
        lines.map(({ part }) => part),
      );
      const balanceOf = await this.stockLines.balances(trx, lines.map(placeOf));
      refuseShortages(lines, quantities, balanceOf);
      const document = await this.documents.record(trx, {
        kind: 'transfer',
        recordedBy: person.id,
        note: input.note ?? undefined,
      });
      await this.ledger.post(
        trx,
        document,
        lines.map((line, index) => ({
          direction: 'within' as const,
          reason: 'transfer' as const,
          partId: line.part.id,
          ...placeOf(line),
          toBinId: (destinations[index] as StockBin).id,
          quantity: quantities[index] as Decimal,
        })),
      );
      await this.audit.record(trx, {
        actor: person,
        action: 'stock.transferred',
        subjectKind: 'document',
        subjectId: document.id,
        subjectCode: document.number,
        after: { lines: input.lines },
      });
      return document.number;
    });
  }
}

export function placeOf(line: ResolvedLine): { lotId: number; binId: number } {
  return { lotId: line.lot.id, binId: line.bin.id };
}

/** Lines that take from the same place take from what the ones before them leave. */
export function refuseShortages(
  lines: readonly ResolvedLine[],
  quantities: readonly Decimal[],
  balanceOf: (place: { lotId: number; binId: number }) => Decimal,
): void {
  const taken = new Map<string, Decimal>();
  lines.forEach((line, index) => {
    const key = `${line.lot.id}/${line.bin.id}`;
    const asked = (taken.get(key) ?? new Decimal(0)).plus(quantities[index] ?? 0);
    const held = balanceOf(placeOf(line));
    if (asked.greaterThan(held)) throw tooLittle(line, held, asked, index);
    taken.set(key, asked);
  });
}
