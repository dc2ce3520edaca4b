/** How closely a part is followed, in the words of lists and forms. */
export const tracedWords: Readonly<Record<string, string>> = {
  count: 'by count',
  delivery: 'by delivery',
  single: 'one by one',
};

export const tracedChoices = [
  { value: 'count', label: 'By count', hint: 'How many there are, and nothing else: screws, resistors.' },
  { value: 'delivery', label: 'By delivery', hint: 'Each delivery is a lot with its own history: cells, wire, flux.' },
  { value: 'single', label: 'One by one', hint: 'Each piece has a serial number: finished tools.' },
] as const;

export const lotStatusWords: Readonly<Record<string, string>> = {
  held: 'held',
  released: 'released',
  rejected: 'rejected',
};

export const reasonWords: Readonly<Record<string, string>> = {
  opening: 'opening stock',
  receipt: 'received',
  transfer: 'changed its bin',
  found: 'found',
  lost: 'lost',
  damaged: 'damaged',
  counted: 'counted',
  issue: 'picked for a batch',
  issue_return: 'back from a batch',
  completion: 'finished',
  scrap: 'scrapped',
  dispatch: 'sent to a buyer',
  return: 'returned',
  late_cost: 'late cost',
  write_down: 'written down',
  reversal: 'taken back',
};

export const adjustmentChoices = [
  { value: 'counted', label: 'Counted', hint: 'Enter how much lies there; the record follows.' },
  { value: 'found', label: 'Found', hint: 'More lies there than is on record.' },
  { value: 'lost', label: 'Lost', hint: 'Less lies there than is on record.' },
  { value: 'damaged', label: 'Damaged', hint: 'It lies there but is of no use, and is thrown away.' },
] as const;
