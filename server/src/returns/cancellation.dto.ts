import { CodeOf } from '../platform/validation/codes.js';
import { Text } from '../platform/validation/fields.js';

export class CancelOrderInput {
  /** The order's number. */
  @CodeOf('document')
  order: string;

  /** Stands in the credit note and in the buyer's mail. */
  @Text({ max: 500, lines: true })
  reason: string;
}

export class CancellationDto {
  order: string;
  /** The credit note, if the order was paid. */
  creditNote: string | null;
}
