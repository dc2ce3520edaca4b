import { textLimit } from '@emberlot/shared/limits/text';
import { Text } from '../platform/validation/fields.js';

export class SettleReviewInput {
  /** What was found and done. */
  @Text({ max: textLimit.line, lines: true })
  resolution: string;
}
