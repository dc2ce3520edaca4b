import type { ConstraintTable } from '../platform/errors/constraints.js';

export const journalConstraints: ConstraintTable = {
  period_closed: {
    code: 'rule_broken',
    sentence: 'The books of this month are closed. Ask the accountant to reopen it, or use another day.',
  },
  journal_entry_source_unique: { code: 'wrong_state', sentence: 'This has been posted already.' },
};
