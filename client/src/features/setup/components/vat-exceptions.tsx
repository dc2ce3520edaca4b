import { textLimit } from '@emberlot/shared/limits/text';
import { useQuery } from '@tanstack/react-query';
import { useMemo, type ReactElement } from 'react';
import { Form } from '../../../components/form/form';
import { TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import type { TableColumn } from '../../../components/ruled-table';
import { Sheet } from '../../../components/sheet';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { notify } from '../../../lib/notify';
import { useAddVatException, useRemoveVatException, vatExceptionsQuery, type VatException } from '../api/shop';
import { CountryInput, useCountryName } from './country-input';
import { Halves } from './halves';
import { RemovableTable } from './removable-table';

function exceptionColumns(country: (code: string) => string): readonly TableColumn<VatException>[] {
  return [
    { key: 'country', title: 'Country', oneLine: true, draw: (place) => country(place.countryCode) },
    { key: 'prefix', title: 'Postcodes beginning with', oneLine: true, draw: (place) => place.postcodePrefix },
    { key: 'sentence', title: 'The buyer is told', draw: (place) => place.sentence },
  ];
}

/** Places inside a country to which its rate does not apply: islands, free ports. */
export function VatExceptions(): ReactElement {
  const places = useQuery(vatExceptionsQuery);
  const remove = useRemoveVatException();
  const country = useCountryName();
  const columns = useMemo(() => exceptionColumns(country), [country]);
  return (
    <Halves>
      <div>
        {places.isError ? (
          <ErrorState error={places.error} onRetry={() => void places.refetch()} what="The exceptions" />
        ) : null}
        {places.isPending ? <LoadingState lines={3} /> : null}
        {places.data?.length === 0 ? (
          <EmptyState title="No exceptions">Every address of a country takes the country’s rate.</EmptyState>
        ) : null}
        {places.data && places.data.length > 0 ? (
          <RemovableTable
            label="Places with rules of their own"
            columns={columns}
            rows={places.data}
            rowKey={({ countryCode, postcodePrefix }) => `${countryCode} ${postcodePrefix}`}
            named={(place) => `the exception for ${place.postcodePrefix} in ${country(place.countryCode)}`}
            consequence="Addresses there take the country’s own rate from now on."
            onRemove={({ countryCode, postcodePrefix }) =>
              remove.mutateAsync({ country: countryCode, prefix: postcodePrefix })
            }
          />
        ) : null}
      </div>
      <Sheet title="Add a place with rules of its own">
        <ExceptionForm />
      </Sheet>
    </Halves>
  );
}

function ExceptionForm(): ReactElement {
  const add = useAddVatException();
  const form = useDraftForm<VatException>({
    name: 'vat-exception',
    defaultValues: { countryCode: '', postcodePrefix: '', sentence: '' },
  });
  const send = async (values: VatException): Promise<void> => {
    await add.mutateAsync({ ...values, postcodePrefix: values.postcodePrefix.toUpperCase() });
    notify('The exception is kept.');
  };
  return (
    <Form
      form={form}
      onSubmit={send}
      after="empty"
      submitLabel="Add the place"
      label="Add a place with rules of its own"
    >
      <CountryInput name="countryCode" label="Country" />
      <TextInput name="postcodePrefix" label="Postcodes beginning with" code longest={10} width={200} required />
      <TextInput name="sentence" label="The buyer is told" longest={textLimit.line} required />
    </Form>
  );
}
