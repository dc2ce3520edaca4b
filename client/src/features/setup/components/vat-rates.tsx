import { textLimit } from '@emberlot/shared/limits/text';
import { useQuery } from '@tanstack/react-query';
import { useMemo, type ReactElement } from 'react';
import { Reading } from '../../../components/figures';
import { Form } from '../../../components/form/form';
import { QuantityInput } from '../../../components/form/number-fields';
import { DayInput, TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import type { TableColumn } from '../../../components/ruled-table';
import { Sheet } from '../../../components/sheet';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { formatDay } from '../../../lib/format-time';
import { notify } from '../../../lib/notify';
import { useAddVatRate, useRemoveVatRate, vatRatesQuery, type VatRate } from '../api/shop';
import { CountryInput, useCountryName } from './country-input';
import { Halves } from './halves';
import { RemovableTable } from './removable-table';

function rateColumns(country: (code: string) => string): readonly TableColumn<VatRate>[] {
  return [
    { key: 'country', title: 'Country', oneLine: true, draw: (rate) => country(rate.countryCode) },
    { key: 'rate', title: 'Rate', right: true, draw: (rate) => <Reading value={rate.rate} unit="%" /> },
    { key: 'from', title: 'From', oneLine: true, draw: (rate) => formatDay(rate.validFrom) },
    {
      key: 'until',
      title: 'Until',
      oneLine: true,
      draw: (rate) => (rate.validUntil ? formatDay(rate.validUntil) : 'further notice'),
    },
    { key: 'source', title: 'Read from', draw: (rate) => rate.source },
  ];
}

export function VatRates(): ReactElement {
  const rates = useQuery(vatRatesQuery);
  const remove = useRemoveVatRate();
  const country = useCountryName();
  const columns = useMemo(() => rateColumns(country), [country]);
  return (
    <Halves>
      <div>
        {rates.isError ? (
          <ErrorState error={rates.error} onRetry={() => void rates.refetch()} what="The rates" />
        ) : null}
        {rates.isPending ? <LoadingState /> : null}
        {rates.data?.length === 0 ? (
          <EmptyState title="No rates yet">
            Enter the rate of your own country first; without it nothing can be sold.
          </EmptyState>
        ) : null}
        {rates.data && rates.data.length > 0 ? (
          <RemovableTable
            label="VAT rates"
            columns={columns}
            rows={rates.data}
            rowKey={({ id }) => id}
            named={(rate) =>
              `the rate of ${rate.rate} % for ${country(rate.countryCode)} from ${formatDay(rate.validFrom)}`
            }
            consequence="Orders whose tax point falls into its time can’t be paid until another rate covers them. Invoices already issued stay as they are."
            onRemove={({ id }) => remove.mutateAsync(id)}
          />
        ) : null}
      </div>
      <Sheet title="Add a rate">
        <RateForm />
      </Sheet>
    </Halves>
  );
}

function RateForm(): ReactElement {
  const add = useAddVatRate();
  const empty = { countryCode: '', rate: '', validFrom: '', source: '' };
  const form = useDraftForm({ name: 'vat-rate', defaultValues: empty });
  const send = async (values: typeof empty): Promise<void> => {
    await add.mutateAsync(values);
    notify('The rate is kept.');
  };
  return (
    <Form form={form} onSubmit={send} after="empty" submitLabel="Add the rate">
      <CountryInput name="countryCode" label="Country" />
      <QuantityInput name="rate" label="Rate" unit="%" places={4} allow="zero" required />
      <DayInput name="validFrom" label="First day" required />
      <TextInput
        name="source"
        label="Read from"
        hint="Where you read it, and when."
        longest={textLimit.line}
        required
      />
    </Form>
  );
}
