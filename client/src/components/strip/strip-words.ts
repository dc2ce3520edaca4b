/** What became of a unit so far; `open` has no verdict yet. */
export type StripVerdict = 'open' | 'passed' | 'failed' | 'rework' | 'scrapped';

export interface StripUnit {
  serial: string;
  stepsDone: number;
  stepsTotal: number;
  verdict: StripVerdict;
}

export const verdictGlyph: Record<StripVerdict, string> = {
  open: '',
  passed: '✓',
  failed: '✕',
  rework: '↻',
  scrapped: '–',
};

const verdictWords: Record<Exclude<StripVerdict, 'open'>, string> = {
  passed: 'passed',
  failed: 'failed',
  rework: 'in rework',
  scrapped: 'scrapped',
};

/** One cell in words: `HR-2649-0141-07, 3 of 5 steps done`. */
export function cellSentence({ serial, stepsDone, stepsTotal, verdict }: StripUnit): string {
  const steps = stepsTotal === 0 ? '' : `, ${stepsDone} of ${stepsTotal} steps done`;
  if (verdict !== 'open') return `${serial}, ${verdictWords[verdict]}${verdict === 'rework' ? steps : ''}`;
  return stepsDone === 0 ? `${serial}, not started` : `${serial}${steps}`;
}

/** The whole strip in words: `Batch B-117: 8 units, 3 passed, 1 failed, 1 in rework, 2 under way, 1 not started`. */
export function stripSentence(label: string, units: readonly StripUnit[]): string {
  const count = (verdict: StripVerdict): number => units.filter((unit) => unit.verdict === verdict).length;
  const idle = units.filter((unit) => unit.verdict === 'open' && unit.stepsDone === 0).length;
  const facts: [number, string][] = [
    [count('passed'), verdictWords.passed],
    [count('failed'), verdictWords.failed],
    [count('rework'), verdictWords.rework],
    [count('scrapped'), verdictWords.scrapped],
    [count('open') - idle, 'under way'],
    [idle, 'not started'],
  ];
  const said = facts.filter(([number]) => number > 0).map(([number, words]) => `${number} ${words}`);
  const size = `${units.length} ${units.length === 1 ? 'unit' : 'units'}`;
  return `${label}: ${[size, ...said].join(', ')}`;
}
