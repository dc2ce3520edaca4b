import { describe, expect, it } from '@jest/globals';
import { Mod97_10 as Mod9710 } from '@konfirm/iso7064';
import fc from 'fast-check';
import { hasMod97CheckDigits, mod97CheckDigits, remainderBy97 } from './mod-97-10.js';

describe('MOD 97-10 of ISO/IEC 7064', () => {
  // 794 → 44 is the example of ISO/IEC 7064:2003 (from memory); the others are test vectors of the python-stdnum library
  // (commit 006192e). 5367 must give 02, not 99.
  it.each([
    ['794', '44'],
    ['99991234567890121414', '90'],
    ['4354111611551114', '31'],
    ['22181321402534321446701611', '35'],
    ['5367', '02'],
  ])('%s ends with %s', (payload, check) => {
    expect(mod97CheckDigits(payload)).toBe(check);
    expect(hasMod97CheckDigits(payload + check)).toBe(true);
  });

  it('refuses check digits that leave the right remainder but are never issued', () => {
    expect(remainderBy97('536799')).toBe(1);
    expect(hasMod97CheckDigits('536799')).toBe(false);
  });

  // Truth from the independent npm library @konfirm/iso7064 2.1.3, which writes 00 and 01 where we write 97 and 98.
  it('agrees with an independent library on digits', () => {
    fc.assert(
      fc.property(fc.stringMatching(/^\d{1,30}$/), (payload) => {
        const check = mod97CheckDigits(payload);
        expect(Number(check) % 97).toBe(Number(Mod9710.checksum(payload)) % 97);
      }),
    );
  });

  it('takes letters as two digits', () => {
    fc.assert(
      fc.property(fc.stringMatching(/^[0-9A-Z]{1,20}$/), (text) => {
        const digits = Array.from(text)
          .map((character) => Number.parseInt(character, 36))
          .join('');
        expect(BigInt(remainderBy97(text))).toBe(BigInt(digits) % 97n);
      }),
    );
  });

  it.each(['', '7', '44', 'a44', '79 44', '79é44'])('refuses %p', (text) => {
    expect(hasMod97CheckDigits(text)).toBe(false);
  });
});
