import type { ConstraintTable } from '../platform/errors/constraints.js';

export const shippingConstraints: ConstraintTable = {
  packed_unit_is_sound: {
    code: 'rule_broken',
    sentence: 'This unit has no valid pass: its last test failed, or something was done since. It cannot be packed.',
  },
  packed_item_unit_once: { code: 'rule_broken', sentence: 'This unit lies in a parcel already.' },
  shipment_one_open_per_order: { code: 'wrong_state', sentence: 'Somebody has just opened a parcel for this order.' },
};
