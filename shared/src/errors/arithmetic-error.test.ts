import { describe, expect, it } from '@jest/globals';
import { ArithmeticError, attempt, faultSentence } from './arithmetic-error.js';
import { arithmeticFaults } from './arithmetic-faults.js';

describe('the faults of the arithmetic', () => {
  it('fills the details into the sentence', () => {
    const error = new ArithmeticError('money_mixed_currencies', { left: 'EUR', right: 'SEK' });
    expect(error.code).toBe('money_mixed_currencies');
    expect(error.message).toBe('Amounts in EUR and SEK cannot be added.');
    expect(error.details).toEqual({ left: 'EUR', right: 'SEK' });
  });

  it('leaves a name without a value standing', () => {
    expect(faultSentence('money_unreadable')).toBe('The amount {text} cannot be read as money.');
  });

  it('says each fault in one sentence and begins each code with a subject', () => {
    const subjects =
      /^(money|measure|bill|plan|costing|serial|judge|capture|statistics|cells|design|transport|kit)_[a-z0-9_]+$/;
    for (const [code, sentence] of Object.entries(arithmeticFaults)) {
      expect(code).toMatch(subjects);
      expect(sentence).toMatch(/^[A-Z{].*\.$/);
      expect(sentence).not.toContain('!');
    }
  });

  it('hands a fault back as a value and lets any other error through', () => {
    expect(attempt(() => 3)).toEqual({ ok: true, value: 3 });
    const failed = attempt(() => {
      throw new ArithmeticError('money_no_weight');
    });
    expect(failed.ok ? undefined : failed.fault.code).toBe('money_no_weight');
    expect(() =>
      attempt(() => {
        throw new RangeError('ours');
      }),
    ).toThrow(RangeError);
  });
});
