import type { ConstraintTable } from '../platform/errors/constraints.js';

export const buildsConstraints: ConstraintTable = {
  unit_is_sound: {
    code: 'rule_broken',
    sentence: 'This unit has no valid pass. Measure it, or see to its fault first.',
  },
  unit_serial_unique: {
    code: 'unexpected',
    sentence: 'A serial number was about to be given twice; nothing was changed.',
  },
  batch_days_in_order: {
    code: 'invalid_input',
    sentence: 'It cannot start after the day it is due.',
    pointer: '/startOn',
  },
  batch_issue_lot_of_part: { code: 'rule_broken', sentence: 'This lot is of another part.' },
};
