import type { ConstraintTable } from '../platform/errors/constraints.js';

export const peopleConstraints: ConstraintTable = {
  app_user_email_key: {
    code: 'already_exists',
    sentence: 'Somebody with this address has an account already.',
    pointer: '/email',
  },
};
