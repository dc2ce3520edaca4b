import type { ConstraintTable } from '../platform/errors/constraints.js';

export const returnsConstraints: ConstraintTable = {
  order_cancelled_once: { code: 'wrong_state', sentence: 'This order is cancelled already.' },
  refund_within_payment: { code: 'rule_broken', sentence: 'More would go back than was paid.' },
};
