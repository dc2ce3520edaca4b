/** How much one bill takes: entries, and characters of its texts. */
export const billLimit = {
  lines: 500,
  alternates: 12,
  steps: 200,
  characteristics: 200,
  contents: 500,
  marks: 400,
  title: 120,
  condition: 200,
  unit: 20,
  caution: 400,
  bag: 24,
  /** The largest position of a line. */
  position: 99_999,
  /** Decimals of a scrap percentage, and of the minutes of a step. */
  scrapDecimals: 4,
  minuteDecimals: 2,
  minutes: 100_000,
  /** Decimals that a reading of a characteristic may be given with. */
  digits: 9,
} as const;
