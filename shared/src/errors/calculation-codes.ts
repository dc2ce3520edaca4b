/** Why a calculation refuses its input, subject by subject. Screens turn a code and its details into a sentence. */
export type CalculationCode =
  // any subject
  | 'not_a_number'
  | 'negative_quantity'
  | 'out_of_range'
  // bill
  | 'bill_cycle'
  | 'bill_empty'
  | 'bill_line_invalid'
  | 'bill_line_repeated'
  | 'explosion_too_large';
