import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { countrySpecs, isValidIBAN } from 'ibantools';
import { attempt } from '../errors/arithmetic-error.js';
import { gs1CheckDigit, readShippingContainerNumber, readTradeItemNumber } from './gs1.js';
import { ibanLengths, readIban } from './iban.js';
import { creditorReference, inGroupsOfFour, readCreditorReference } from './iso-11649.js';
import { mod97CheckDigits } from './mod-97-10.js';

const codeOf = (compute: () => unknown) => {
  const result = attempt(compute);
  return result.ok ? undefined : result.fault.code;
};

describe('bar code numbers', () => {
  // GS1 General Specifications: 6291041500213 (how to calculate a check digit) and the SSCC 376104250021234569 (table
  // 7-9); common samples and test vectors of the python-stdnum library (commit 006192e) for the rest.
  it.each([
    ['629104150021', '3'],
    ['400638133393', '1'],
    ['590123412345', '7'],
    ['750103131130', '9'],
    ['978047111709', '4'],
    ['7351353', '7'],
    ['03600029145', '2'],
    ['9841234567890', '8'],
    ['37610425002123456', '9'],
  ])('%s ends with %s', (payload, check) => {
    expect(gs1CheckDigit(payload)).toBe(check);
  });

  it('are kept with 14 digits', () => {
    expect(readTradeItemNumber('4006381-333931')).toBe('04006381333931');
    expect(readTradeItemNumber('73513537')).toBe('00000073513537');
    expect(readShippingContainerNumber('(00) 3 7610425 002123456 9')).toBe('376104250021234569');
    expect(readShippingContainerNumber('00376104250021234569')).toBe('376104250021234569');
    expect(readShippingContainerNumber('003761042500212342')).toBe('003761042500212342');
  });

  it.each([
    ['4006381333932', 'serial_gs1_check_digit'],
    ['400638133393', 'serial_gs1_check_digit'],
    ['40063813339', 'serial_gs1_unreadable'],
    ['', 'serial_gs1_unreadable'],
    ['40063813339３1', 'serial_gs1_unreadable'],
  ])('refuse %p', (typed, code) => {
    expect(codeOf(() => readTradeItemNumber(typed))).toBe(code);
  });

  it('catch each wrong digit, and each swap of neighbours but those that differ by five', () => {
    fc.assert(
      fc.property(fc.stringMatching(/^\d{12}$/), fc.nat(11), fc.nat(9), (payload, place, digit) => {
        const check = gs1CheckDigit(payload);
        const wrong = payload.slice(0, place) + String(digit) + payload.slice(place + 1);
        expect(gs1CheckDigit(wrong) === check).toBe(wrong === payload);
        const [left = '0', right = '0'] = [payload[place], payload[place + 1]];
        if (place === 11) return;
        const swapped = payload.slice(0, place) + right + left + payload.slice(place + 2);
        const blind = left === right || Math.abs(Number(left) - Number(right)) === 5;
        expect(gs1CheckDigit(swapped) === check).toBe(blind);
      }),
    );
  });
});

describe('payment references', () => {
  // Sample of ISO 11649, from memory.
  it('carry the check digits of the sample', () => {
    expect(creditorReference('539007547034')).toBe('RF18539007547034');
    expect(readCreditorReference('rf18 5390 0754 7034')).toEqual({
      text: 'RF18539007547034',
      reference: '539007547034',
    });
    expect(inGroupsOfFour('RF18539007547034')).toBe('RF18 5390 0754 7034');
  });

  it.each([
    ['RF19539007547034', 'serial_reference_check_digits'],
    ['RF18539007547043', 'serial_reference_check_digits'],
    ['RF18', 'serial_reference_unreadable'],
    ['XX18539007547034', 'serial_reference_unreadable'],
    ['RF181234567890123456789012', 'serial_reference_unreadable'],
    ['RF18 INV-1', 'serial_reference_unreadable'],
  ])('refuse %p', (typed, code) => {
    expect(codeOf(() => readCreditorReference(typed))).toBe(code);
  });

  it('read back what was written', () => {
    fc.assert(
      fc.property(fc.stringMatching(/^[0-9A-Z]{1,21}$/), (reference) => {
        expect(readCreditorReference(creditorReference(reference)).reference).toBe(reference);
      }),
    );
    expect(codeOf(() => creditorReference(''))).toBe('serial_reference_unreadable');
    expect(codeOf(() => creditorReference('A/1'))).toBe('serial_reference_unreadable');
  });
});

describe('account numbers', () => {
  // Samples of the IBAN registry as held in the tests of the python-stdnum library; NL91, BE68, PL61, SE45, NO93 and the
  // GB82 WEST sample from memory.
  it.each([
    'GB82WEST12345698765432',
    'GB29NWBK60161331926819',
    'DE89370400440532013000',
    'FR1420041010050500013M02606',
    'NL91ABNA0417164300',
    'AT611904300234573201',
    'BE68539007547034',
    'ES9121000418450200051332',
    'IT60X0542811101000000123456',
    'PL61109010140000071219812874',
    'CH9300762011623852957',
    'SE4550000000058398257466',
    'NO9386011117947',
  ])('%s is right', (text) => {
    expect(readIban(inGroupsOfFour(text).toLowerCase())).toEqual({ text, country: text.slice(0, 2) });
  });

  it.each([
    ['GB82WEST12345698765431', 'serial_iban_check_digits'],
    ['DE89370400440532013001', 'serial_iban_check_digits'],
    ['FR1420041010050500013M02607', 'serial_iban_check_digits'],
    ['DE8937040044053201300', 'serial_iban_length'],
    ['XX431234', 'serial_iban_country'],
    ['', 'serial_iban_unreadable'],
    ['DE', 'serial_iban_unreadable'],
    ['DE89-3704', 'serial_iban_unreadable'],
  ])('%p is not', (typed, code) => {
    expect(codeOf(() => readIban(typed))).toBe(code);
  });

  // Truth from the independent npm library ibantools 4.5.4, which packs the registry.
  it('have the lengths of the registry', () => {
    // Åland and the French territories are listed for themselves, but their numbers begin with FI and FR.
    const under = ['AX', 'GF', 'GP', 'MF', 'MQ', 'NC', 'PF', 'PM', 'RE', 'TF', 'WF', 'YT'];
    const registered = Object.entries(countrySpecs).filter(
      ([code, { IBANRegistry }]) => IBANRegistry && !under.includes(code),
    );
    expect(registered.length).toBeGreaterThan(80);
    for (const [country, { chars }] of registered)
      expect([country, ibanLengths.get(country)]).toEqual([country, chars]);
    // Joined lately; the package has their lengths but not yet their registration.
    const lately = [...ibanLengths.keys()].filter((country) => !registered.some(([code]) => code === country));
    expect(lately.sort()).toEqual(['BI', 'DJ', 'FK']);
  });

  it('agree with the independent library on any German number', () => {
    fc.assert(
      fc.property(fc.stringMatching(/^\d{18}$/), fc.stringMatching(/^\d{2}$/), (account, guess) => {
        const text = `DE${mod97CheckDigits(`${account}DE`)}${account}`;
        expect(readIban(text).text).toBe(text);
        expect(isValidIBAN(text)).toBe(true);
        const guessed = `DE${guess}${account}`;
        expect(codeOf(() => readIban(guessed)) === undefined).toBe(isValidIBAN(guessed));
      }),
    );
  });
});
