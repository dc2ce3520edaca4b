import { Injectable } from '@nestjs/common';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError, notFound } from '../platform/errors/app-error.js';

/** A person looked at a payment that does not fit its order, and says what was done about it. */
@Injectable()
export class PaymentReviewsService {
  constructor(
    private readonly clock: Clock,
    private readonly transactions: Transactions,
    private readonly audit: Audit,
  ) {}

  /** @throws AppError `not_found`, `wrong_state` when it is settled already */
  async settle(id: number, resolution: string, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      const review = await trx
        .selectFrom('payment_review')
        .selectAll()
        .where('id', '=', id)
        .forUpdate()
        .executeTakeFirst();
      if (!review) throw notFound('payment to look at');
      if (review.settled_at !== null) throw new AppError('wrong_state', 'Somebody has settled this already.');
      await trx
        .updateTable('payment_review')
        .set({ settled_at: this.clock.now(), settled_by: person.id, resolution })
        .where('id', '=', id)
        .execute();
      await this.audit.record(trx, {
        actor: person,
        action: 'payment_review.settled',
        subjectKind: 'payment_review',
        subjectId: id,
        before: { what: review.what },
        after: { resolution },
      });
    });
  }
}
