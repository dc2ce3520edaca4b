import type { BillValues } from './bill-values';

export interface Difference {
  /** `Line 30`, `Step 2`, `Time to 350 °C`. */
  what: string;
  field: string;
  yours: string;
  theirs: string;
}

const fieldWords: Readonly<Record<string, string>> = {
  part: 'part',
  quantityPer: 'for one',
  scrapPercent: 'scrap',
  marks: 'marks',
  note: 'note',
  alternates: 'may be replaced by',
  title: 'title',
  instruction: 'instruction',
  minutes: 'minutes',
  caution: 'caution',
  kind: 'kind',
  unit: 'unit',
  lowerLimit: 'lower limit',
  target: 'aim',
  upperLimit: 'upper limit',
  digits: 'decimals',
  condition: 'taken at',
};

type Rows = readonly (readonly [what: string, row: Readonly<Record<string, string>>])[];

/** What two states of one draft do not agree on, field by field; a whole row that only one has is one difference. */
export function differencesOf(yours: BillValues, theirs: BillValues): Difference[] {
  return [
    ...rowDifferences([['The draft', { note: yours.note }]], [['The draft', { note: theirs.note }]]),
    ...rowDifferences(lineRows(yours), lineRows(theirs)),
    ...rowDifferences(stepRows(yours), stepRows(theirs)),
    ...rowDifferences(planRows(yours), planRows(theirs)),
  ];
}

function lineRows({ lines }: BillValues): Rows {
  return lines.map(({ position, ...line }) => [`Line ${position}`, line]);
}

function stepRows({ steps }: BillValues): Rows {
  return steps.map((step, index) => [`Step ${index + 1}`, { ...step }]);
}

function planRows({ testPlan }: BillValues): Rows {
  return testPlan.map(({ name, ...entry }) => [name || 'Unnamed', entry]);
}

function rowDifferences(yours: Rows, theirs: Rows): Difference[] {
  const others = new Map(theirs);
  const own = new Map(yours);
  const changed = [...own].flatMap(([what, row]) => {
    const other = others.get(what);
    if (!other) return [{ what, field: '', yours: summary(row), theirs: 'is not there' }];
    return Object.entries(row).flatMap(([field, value]) => {
      const their = other[field] ?? '';
      return value === their
        ? []
        : [{ what, field: fieldWords[field] ?? field, yours: value || '–', theirs: their || '–' }];
    });
  });
  const only = [...others].flatMap(([what, row]) =>
    own.has(what) ? [] : [{ what, field: '', yours: 'is not there', theirs: summary(row) }],
  );
  return [...changed, ...only];
}

function summary(row: Readonly<Record<string, string>>): string {
  return Object.values(row)
    .filter((value) => value !== '')
    .slice(0, 3)
    .join(', ');
}
