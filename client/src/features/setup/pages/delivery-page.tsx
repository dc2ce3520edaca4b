import { useQuery } from '@tanstack/react-query';
import { useMemo, type ReactElement } from 'react';
import { sessionQuery } from '../../../api/session';
import { Caution } from '../../../components/caution';
import { Money } from '../../../components/figures';
import { CheckInput } from '../../../components/form/choice-fields';
import { Form } from '../../../components/form/form';
import { MoneyInput, QuantityInput } from '../../../components/form/number-fields';
import { DayInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import type { TableColumn } from '../../../components/ruled-table';
import { Sheet } from '../../../components/sheet';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { currencyDecimals } from '../../../lib/format-money';
import { formatCount } from '../../../lib/format-quantity';
import { formatDay } from '../../../lib/format-time';
import { notify } from '../../../lib/notify';
import { parseMinor } from '../../../lib/parse-number';
import { deliveryRatesQuery, useAddDeliveryRate, useRemoveDeliveryRate, type DeliveryRate } from '../api/shop';
import { CountryInput, useCountryName } from '../components/country-input';
import { Halves } from '../components/halves';
import { RemovableTable } from '../components/removable-table';

function rateColumns(country: (code: string) => string): readonly TableColumn<DeliveryRate>[] {
  return [
    { key: 'country', title: 'To', oneLine: true, draw: (rate) => country(rate.countryCode) },
    { key: 'net', title: 'Net price', right: true, draw: (rate) => <Money value={rate.net} /> },
    { key: 'days', title: 'On the way', oneLine: true, draw: (rate) => formatCount(rate.transitDays, 'day') },
    {
      key: 'lithium',
      title: 'Lithium',
      oneLine: true,
      draw: (rate) => (rate.carriesLithium ? '✓ may go this way' : '✕ may not'),
    },
    { key: 'from', title: 'From', oneLine: true, draw: (rate) => formatDay(rate.validFrom) },
  ];
}

export function Component(): ReactElement {
  const rates = useQuery(deliveryRatesQuery);
  const remove = useRemoveDeliveryRate();
  const country = useCountryName();
  const columns = useMemo(() => rateColumns(country), [country]);
  return (
    <>
      <PageHeading
        title="Delivery"
        lead="Where the shop sends to, what it costs the buyer, and how long a parcel is on its way."
      />
      <Halves>
        <div>
          {rates.isError ? (
            <ErrorState error={rates.error} onRetry={() => void rates.refetch()} what="The delivery prices" />
          ) : null}
          {rates.isPending ? <LoadingState /> : null}
          {rates.data?.length === 0 ? (
            <EmptyState title="The shop sends nowhere yet">
              Enter a price for each country you send to; buyers elsewhere are asked to write.
            </EmptyState>
          ) : null}
          {rates.data && rates.data.length > 0 ? (
            <RemovableTable
              label="Delivery prices"
              columns={columns}
              rows={rates.data}
              rowKey={({ id }) => id}
              named={(rate) => `the delivery price to ${country(rate.countryCode)} from ${formatDay(rate.validFrom)}`}
              consequence="Unless an earlier price is there, nothing can be ordered to that country any more. Orders already placed stay as they are."
              onRemove={({ id }) => remove.mutateAsync(id)}
            />
          ) : null}
        </div>
        <Sheet title="Add a delivery price">
          <DeliveryForm />
        </Sheet>
      </Halves>
    </>
  );
}

function DeliveryForm(): ReactElement {
  const add = useAddDeliveryRate();
  const currency = useQuery(sessionQuery).data?.shop?.currency ?? 'EUR';
  const empty = { countryCode: '', netMinor: '', transitDays: '', carriesLithium: false, validFrom: '' };
  const form = useDraftForm({ name: 'delivery-rate', defaultValues: empty });
  const send = async (values: typeof empty): Promise<void> => {
    const netMinor = parseMinor(values.netMinor, currencyDecimals(currency)) ?? 0;
    await add.mutateAsync({ ...values, netMinor, transitDays: Number(values.transitDays) });
    notify('The delivery price is kept.');
  };
  return (
    <Form form={form} onSubmit={send} after="empty" submitLabel="Add the price">
      <CountryInput name="countryCode" label="To" />
      <MoneyInput name="netMinor" label="Net price" currency={currency} required />
      <QuantityInput name="transitDays" label="On the way" unit="days" places={0} allow="zero" required />
      <CheckInput name="carriesLithium" label="Parcels with lithium cells or batteries may go this way" />
      <Caution>
        <p>
          Carriers differ by country and service. Check their current edition, and ask your carrier before you tick
          this.
        </p>
      </Caution>
      <DayInput name="validFrom" label="First day" required />
    </Form>
  );
}
