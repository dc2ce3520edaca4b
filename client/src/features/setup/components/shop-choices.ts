import type { Choice } from '../../../components/form/choice-fields';

/** ISO weekdays, Monday first; 1 January 2024 was one. */
export const weekdayChoices: readonly Choice[] = Array.from({ length: 7 }, (_, place) => ({
  value: String(place + 1),
  label: new Intl.DateTimeFormat('en-IE', { weekday: 'long', timeZone: 'UTC' }).format(
    new Date(Date.UTC(2024, 0, place + 1, 12)),
  ),
}));

const names = new Intl.DisplayNames('en', { type: 'currency' });

export const currencyChoices: readonly Choice[] = Intl.supportedValuesOf('currency')
  .map((code) => ({ value: code, label: `${code}, ${names.of(code) ?? code}` }))
  .toSorted((one, other) => one.label.localeCompare(other.label));
