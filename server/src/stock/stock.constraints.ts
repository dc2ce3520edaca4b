import type { ConstraintTable } from '../platform/errors/constraints.js';

export const stockConstraints: ConstraintTable = {
  stock_balance_not_negative: {
    code: 'not_enough_stock',
    sentence: 'There is not that much in this bin any more. Look again at what lies there.',
  },
  cost_pool_quantity_not_negative: {
    code: 'not_enough_stock',
    sentence: 'There is not that much on the shelf any more. Look again at what lies there.',
  },
  stock_move_lot_of_part: { code: 'rule_broken', sentence: 'This lot is of another part.' },
  stock_move_reversed_once: { code: 'wrong_state', sentence: 'This has been reversed already.' },
  document_reversed_once: { code: 'wrong_state', sentence: 'This document has been reversed already.' },
  lot_code_unique: { code: 'already_exists', sentence: 'Another lot has this code already.' },
  bin_code_unique: {
    code: 'already_exists',
    sentence: 'Another bin has this code already. Choose another, or open that bin.',
    pointer: '/code',
  },
  reservation_one_per_unit: { code: 'wrong_state', sentence: 'This unit is promised to somebody already.' },
};
