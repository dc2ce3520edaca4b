import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { ChoiceInput } from '../../../components/form/choice-fields';
import { countriesQuery } from '../api/shop';

export function CountryInput({ name, label }: { name: string; label: string }): ReactElement {
  const countries = useQuery(countriesQuery);
  const choices = (countries.data ?? []).map((country) => ({ value: country.code, label: country.name }));
  return (
    <ChoiceInput
      name={name}
      label={label}
      choices={choices}
      hint={countries.isError ? 'The countries can’t be loaded just now. Load the page again.' : undefined}
      width={320}
      required
    />
  );
}

/** A country by its name; by its code while the names are on their way. */
export function useCountryName(): (code: string) => string {
  const countries = useQuery(countriesQuery).data ?? [];
  return (code) => countries.find((country) => country.code === code)?.name ?? code;
}
