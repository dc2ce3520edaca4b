const words = [
  'no',
  'one',
  'two',
  'three',
  'four',
  'five',
  'six',
  'seven',
  'eight',
  'nine',
  'ten',
  'eleven',
  'twelve',
] as const;

/** Numbers up to twelve as words, as sentences want them; digits beyond. */
export function numberWord(count: number): string {
  return words[count] ?? String(count);
}

export function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
