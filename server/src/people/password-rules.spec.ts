import { describe, expect, it } from '@jest/globals';
import { AppError } from '../platform/errors/app-error.js';
import { refuseWeakPassword } from './password-rules.js';

const person = { name: 'Nora Fernhollow', email: 'nora.bench@fernhollow.example' };

function faultOf(password: string): string | undefined {
  try {
    refuseWeakPassword(password, person, '/password');
    return undefined;
  } catch (error) {
    return error instanceof AppError ? error.faults[0]?.code : 'not a refusal';
  }
}

describe('a new password', () => {
  it.each([
    ['1234567', 'password_short'],
    ['🔥🔥🔥🔥🔥🔥🔥', 'password_short'],
    ['12345678', 'password_common'],
    ['PASSWORD', 'password_common'],
    ['iloveyou1', 'password_common'],
    ['zzzzzzzzzzzz', 'password_common'],
    ['Emberlot2027', 'password_own_words'],
    ['fernhollow99', 'password_own_words'],
    ['nora.bench@fernhollow.example', 'password_own_words'],
  ])('is refused when it is %s', (password, fault) => {
    expect(faultOf(password)).toBe(fault);
  });

  it.each([
    ['twenty lower-case letters', 'qzvkwmrtlpxhgbnfdsjc'],
    ['a sentence that names the product', 'emberlot keeps the irons warm'],
    ['sixty-four characters', 'k9 '.repeat(21).padEnd(64, '~')],
    ['eight characters nobody uses', 'vT7#qzLw'],
    ['letters of other scripts', 'паяльник зимой горячий'],
  ])('is taken when it is %s', (_what, password) => {
    expect(faultOf(password)).toBeUndefined();
  });
});
