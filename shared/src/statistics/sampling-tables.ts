/** Sample size code letters in order; I and O are left out. */
export const codeLetters = ['A', 'B', 'C', 'D', 'E', 'F', 'G', 'H', 'J', 'K', 'L', 'M', 'N', 'P', 'Q', 'R'] as const;
export type CodeLetter = (typeof codeLetters)[number];

/** Sample size of each code letter in single sampling, normal inspection. ISO 2859-1:1999, Table 2-A. */
export const sampleSizes: readonly number[] = [2, 3, 5, 8, 13, 20, 32, 50, 80, 125, 200, 315, 500, 800, 1250, 2000];

/** Inspection levels: four special ones for small samples, three general ones; II unless told otherwise. */
export const inspectionLevels = ['S-1', 'S-2', 'S-3', 'S-4', 'I', 'II', 'III'] as const;
export type InspectionLevel = (typeof inspectionLevels)[number];

/** Upper end of each band of lot sizes with one code letter per level, in their order. ISO 2859-1:1999, Table 1. */
export const lotBands: readonly (readonly [upTo: number, letters: string])[] = [
  [8, 'AAAAAAB'],
  [15, 'AAAAABC'],
  [25, 'AABBBCD'],
  [50, 'ABBCCDE'],
  [90, 'BBCCCEF'],
  [150, 'BBCDDFG'],
  [280, 'BCDEEGH'],
  [500, 'BCDEFHJ'],
  [1200, 'CCEFGJK'],
  [3200, 'CDEGHKL'],
  [10_000, 'CDFGJLM'],
  [35_000, 'CDFHKMN'],
  [150_000, 'DEGJLNP'],
  [500_000, 'DEGJMPQ'],
  [Number.POSITIVE_INFINITY, 'DEHKNQR'],
];

/** Acceptance quality limits in percent nonconforming. ISO 2859-1:1999, Table 2-A, columns up to 10. */
export const acceptanceQualityLimits = [
  0.01, 0.015, 0.025, 0.04, 0.065, 0.1, 0.15, 0.25, 0.4, 0.65, 1, 1.5, 2.5, 4, 6.5, 10,
] as const;
export type AcceptanceQualityLimit = (typeof acceptanceQualityLimits)[number];

/**
 * Down a column of Table 2-A the acceptance numbers stand in this order, one per code letter, with one arrow up and one
 * down between 0 and 1; each column begins one letter earlier than the one before it.
 */
export const acceptanceSequence: readonly (number | 'up' | 'down')[] = [0, 'up', 'down', 1, 2, 3, 5, 7, 10, 14, 21];

/** Position of the letter with acceptance number 0 in the column of 0.010 percent: Q. */
export const firstColumnZero = 14;
