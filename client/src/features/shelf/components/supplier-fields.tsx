import { codePattern } from '@emberlot/shared/limits/codes';
import { textLimit } from '@emberlot/shared/limits/text';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { ChoiceInput } from '../../../components/form/choice-fields';
import { QuantityInput } from '../../../components/form/number-fields';
import { TextInput } from '../../../components/form/text-fields';
import { countriesQuery, type Supplier, type SupplierInput } from '../api/suppliers';

/** A supplier as its form holds it: every field a text, empty for none. */
export interface SupplierValues {
  code: string;
  name: string;
  email: string;
  phone: string;
  countryCode: string;
  currency: string;
  leadTimeDays: string;
  note: string;
}

export function supplierValues(supplier: Supplier): SupplierValues {
  return {
    code: supplier.code,
    name: supplier.name,
    email: supplier.email ?? '',
    phone: supplier.phone ?? '',
    countryCode: supplier.countryCode ?? '',
    currency: supplier.currency,
    leadTimeDays:
      supplier.leadTimeDays === null || supplier.leadTimeDays === undefined ? '' : String(supplier.leadTimeDays),
    note: supplier.note ?? '',
  };
}

const orNone = (value: string): string | null => (value.trim() === '' ? null : value.trim());

export function supplierInput(values: SupplierValues): SupplierInput {
  return {
    code: values.code.trim(),
    name: values.name,
    email: orNone(values.email),
    phone: orNone(values.phone),
    countryCode: orNone(values.countryCode),
    currency: values.currency.trim().toUpperCase(),
    leadTimeDays: values.leadTimeDays.trim() === '' ? null : Number(values.leadTimeDays),
    note: orNone(values.note),
  };
}

export function SupplierFields(): ReactElement {
  const countries = useQuery(countriesQuery).data?.items ?? [];
  return (
    <>
      <TextInput
        name="code"
        label="Code"
        longest={24}
        code
        required
        width={280}
        rules={{
          validate: (typed: unknown) =>
            codePattern.supplier.test(String(typed).trim().toUpperCase()) ||
            'Use letters, digits and hyphens, beginning with a letter or digit.',
        }}
      />
      <TextInput name="name" label="Name" longest={textLimit.name} required />
      <TextInput name="email" label="E-mail address" type="email" longest={textLimit.email} />
      <TextInput name="phone" label="Telephone" type="tel" longest={textLimit.code} width={280} />
      <ChoiceInput
        name="countryCode"
        label="Country"
        choices={countries.map(({ code, name }) => ({ value: code, label: name }))}
        none="not said"
        width={320}
      />
      <TextInput
        name="currency"
        label="Bills in"
        longest={3}
        code
        required
        hint="Three letters, such as EUR."
        width={160}
      />
      <QuantityInput name="leadTimeDays" label="Lead time" unit="days" places={0} allow="zero" />
      <TextInput name="note" label="Note" longest={textLimit.note} rows={3} />
    </>
  );
}
