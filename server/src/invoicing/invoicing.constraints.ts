import type { ConstraintTable } from '../platform/errors/constraints.js';

export const invoicingConstraints: ConstraintTable = {
  invoice_not_overcredited: { code: 'wrong_state', sentence: 'This invoice has been credited already.' },
};
