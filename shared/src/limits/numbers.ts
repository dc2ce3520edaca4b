/** The largest identifier that a JavaScript number still holds exactly; PostgreSQL's `bigint` reaches further. */
export const largestId = Number.MAX_SAFE_INTEGER;

/** The largest amount of money, in minor units, that any field takes: a thousand million of the major unit. */
export const largestMinorAmount = 100_000_000_000;

/** Digits that a quantity may have before and after its decimal point. */
export const quantityDigits = { whole: 12, fraction: 6 } as const;

/** A quantity as it travels: a decimal string without exponent, leading zeros or a bare point. */
export const quantityPattern = /^-?(?:0|[1-9]\d{0,11})(?:\.\d{1,6})?$/;

/** A calendar day as it travels. */
export const dayPattern = /^\d{4}-(?:0[1-9]|1[0-2])-(?:0[1-9]|[12]\d|3[01])$/;
