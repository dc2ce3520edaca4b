import { describe, expect, it } from '@jest/globals';
import { contrastRatio } from './contrast';
import { darkTokens, lightTokens, type Tokens } from './tokens';

const grounds = ['canvas', 'sheet', 'boardSoft', 'copperSoft', 'tapeSoft', 'hotSoft', 'coolSoft', 'soundSoft'] as const;
const plain = ['canvas', 'sheet'] as const;

/** Ink against every ground it is written on. W3C WCAG 2.2 (2023), 1.4.3 Contrast (Minimum): at least 4.5 : 1. */
const written: [keyof Tokens, readonly (keyof Tokens)[]][] = [
  ['ink', grounds],
  ['inkSoft', grounds],
  ['board', grounds],
  ['copper', ['canvas', 'sheet', 'copperSoft']],
  ['tape', grounds],
  ['hot', grounds],
  ['cool', grounds],
  ['sound', grounds],
  ['onBoard', ['board']],
  ['onCopper', ['copper']],
  ['onTape', ['tape']],
  ['onHot', ['hot']],
  ['onCool', ['cool']],
  ['onSound', ['sound']],
];

/** Borders, focus rings and marks. W3C WCAG 2.2 (2023), 1.4.11 Non-text Contrast: at least 3 : 1. */
const drawn: [keyof Tokens, readonly (keyof Tokens)[]][] = [
  ['edge', grounds],
  ['board', grounds],
  ['tape', [...plain, 'tapeSoft']],
  ['hot', [...plain, 'hotSoft']],
  ['sound', [...plain, 'soundSoft']],
  ['cool', [...plain, 'coolSoft']],
  ['copper', [...plain, 'copperSoft']],
];

const pairs = (list: typeof written) => list.flatMap(([ink, on]) => on.map((ground) => [ink, ground] as const));

describe.each([
  ['light', lightTokens],
  ['dark', darkTokens],
])('the %s colours', (_, tokens) => {
  it.each(pairs(written))('let %s be read on %s', (ink, ground) => {
    expect(contrastRatio(tokens[ink], tokens[ground])).toBeGreaterThanOrEqual(4.5);
  });

  it.each(pairs(drawn))('let a border or mark in %s be seen on %s', (ink, ground) => {
    expect(contrastRatio(tokens[ink], tokens[ground])).toBeGreaterThanOrEqual(3);
  });
});

describe('the contrast ratio', () => {
  // W3C, WCAG 2.2 (2023), definition of "contrast ratio": ranges from 1:1 to 21:1, black on white being the largest.
  it('is 21 for black on white and 1 for a colour on itself', () => {
    expect(contrastRatio('#000000', '#FFFFFF')).toBeCloseTo(21, 10);
    expect(contrastRatio('#0E5B47', '#0E5B47')).toBe(1);
  });

  // W3C, Understanding WCAG 2.2, 1.4.3 (technique G18): #767676 is the lightest grey that passes on white (4.54).
  it('finds the lightest grey that passes on white', () => {
    expect(contrastRatio('#767676', '#FFFFFF')).toBeGreaterThanOrEqual(4.5);
    expect(contrastRatio('#777777', '#FFFFFF')).toBeLessThan(4.5);
  });
});
