import { describe, expect, it } from '@jest/globals';
import { scanReader } from './scanner';

function type(text: string, pause: number, reader = scanReader()): string | undefined {
  let at = 0;
  for (const key of text) reader({ key, at: (at += pause) });
  return reader({ key: 'Enter', at: at + pause });
}

describe('a scanner', () => {
  it('is told from a hand by its speed', () => {
    expect(type('WR-2648-0093-41', 8)).toBe('WR-2648-0093-41');
    expect(type('WR-2648-0093-41', 120)).toBeUndefined();
  });

  it('is not heard in a few quick letters', () => {
    expect(type('ab', 8)).toBeUndefined();
  });

  it('begins afresh after a pause, so that a letter typed before is not part of the code', () => {
    const reader = scanReader();
    reader({ key: 'x', at: 0 });
    let at = 1000;
    for (const key of 'L-4471') reader({ key, at: (at += 8) });
    expect(reader({ key: 'Enter', at: at + 8 })).toBe('L-4471');
  });

  it('may hold shift for capitals', () => {
    const reader = scanReader();
    let at = 0;
    for (const key of ['Shift', 'L', '-', '4', '4', '7', '1']) reader({ key, at: (at += 8) });
    expect(reader({ key: 'Enter', at: at + 8 })).toBe('L-4471');
  });

  it('must end quickly as well', () => {
    const reader = scanReader();
    let at = 0;
    for (const key of 'L-4471') reader({ key, at: (at += 8) });
    expect(reader({ key: 'Enter', at: at + 900 })).toBeUndefined();
  });
});
