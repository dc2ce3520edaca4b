import type { ConstraintTable } from '../platform/errors/constraints.js';

export const billsConstraints: ConstraintTable = {
  bill_revision_one_draft: {
    code: 'already_exists',
    sentence: 'There is a draft of this bill already. Go on with that one.',
  },
  bill_revision_number_unique: {
    code: 'changed_meanwhile',
    sentence: 'Somebody else began a revision of this bill just now. Look at that one first.',
  },
  bill_revision_one_released: {
    code: 'changed_meanwhile',
    sentence: 'Somebody else released a revision of this bill just now. Look at that one first.',
  },
  bill_revision_frozen: {
    code: 'wrong_state',
    sentence: 'A released revision cannot change. Make a draft from it.',
  },
  bill_contains_itself: { code: 'rule_broken', sentence: 'A bill may not contain itself, at any depth.' },
  contents_line_not_itself: { code: 'rule_broken', sentence: 'A kit cannot be packed into itself.' },
};
