export const batchAddress = (number: string): string => `/bench/batches/${encodeURIComponent(number)}`;

export const pickingAddress = (number: string): string => `${batchAddress(number)}/picking`;

/** The full screen at the bench, with one unit in front. */
export const buildAddress = (number: string, serial?: string): string =>
  `${batchAddress(number)}/build${serial ? `?unit=${encodeURIComponent(serial)}` : ''}`;

export const unitAddress = (serial: string): string => `/bench/units/${encodeURIComponent(serial)}`;

export const faultAddress = (number: string): string => `/bench/faults/${encodeURIComponent(number)}`;
