/** Faults of `kit`: code → sentence. */
export const kitFaults = {
  kit_empty: 'A kit without contents cannot be weighed.',
  kit_pieces: 'Of {part} a kit holds a whole number of pieces, not {pieces}.',
  kit_weight: 'A piece of {part} must weigh more than nothing ({grams} g).',
  kit_spread: 'The spread of {part} cannot be negative ({spread} g).',
  kit_scale: 'The uncertainty of the scale must be more than zero ({uncertainty} g).',
  kit_share: 'A share for {what} lies above 0 and below 1, not at {share}.',
  kit_reading: 'The weight {grams} is not a number of grams.',
} as const;
