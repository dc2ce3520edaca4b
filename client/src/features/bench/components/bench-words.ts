import type { BatchItem, UnitItem } from '../api/bench';

export const batchStatusWords: Record<BatchItem['status'], string> = {
  planned: 'planned',
  picking: 'picking',
  in_build: 'in build',
  done: 'done',
  withdrawn: 'withdrawn',
};

export const unitStateWords: Record<UnitItem['state'], string> = {
  under_way: 'under way',
  on_shelf: 'on the shelf',
  gone: 'left the shop',
  scrapped: 'scrapped',
};

/** `1.9 to 2.6 A`, `at least 10 MΩ`, `yes`. */
export function allowedWords(limits: {
  lowerLimit: string | null;
  upperLimit: string | null;
  unit: string | null;
}): string {
  const unit = limits.unit ? `\u00a0${limits.unit}` : '';
  if (limits.lowerLimit === null && limits.upperLimit === null) return 'yes';
  if (limits.lowerLimit === null) return `at most ${limits.upperLimit}${unit}`;
  if (limits.upperLimit === null) return `at least ${limits.lowerLimit}${unit}`;
  return `${limits.lowerLimit} to ${limits.upperLimit}${unit}`;
}

/** `2.27 A`, `yes`. */
export function readingWords(reading: { reading: string | null; answer: boolean | null; unit: string | null }): string {
  if (reading.reading === null) return reading.answer ? 'yes' : 'no';
  return reading.unit ? `${reading.reading}\u00a0${reading.unit}` : reading.reading;
}
