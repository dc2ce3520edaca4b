import { textLimit } from '@emberlot/shared/limits/text';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Form } from '../../../components/form/form';
import { DayInput, TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import { Sheet } from '../../../components/sheet';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import type { TableColumn } from '../../../components/ruled-table';
import { formatDay, formatPromise } from '../../../lib/format-time';
import { notify } from '../../../lib/notify';
import { closedDaysQuery, useCloseDay, useOpenDay, type ClosedDay } from '../api/shop';
import { RemovableTable } from '../components/removable-table';
import { Halves } from '../components/halves';

const columns: readonly TableColumn<ClosedDay>[] = [
  {
    key: 'day',
    title: 'Day',
    oneLine: true,
    draw: ({ day }) => `${formatPromise(day).split(' ')[0]} ${formatDay(day)}`,
  },
  { key: 'name', title: 'Why', draw: ({ name }) => name },
];

export function Component(): ReactElement {
  const days = useQuery(closedDaysQuery);
  const open = useOpenDay();
  return (
    <>
      <PageHeading title="Calendar" lead="Days on which the shop is closed. Promises and lead times step over them." />
      <Halves>
        <div>
          {days.isError ? (
            <ErrorState error={days.error} onRetry={() => void days.refetch()} what="The closed days" />
          ) : null}
          {days.isPending ? <LoadingState /> : null}
          {days.data?.length === 0 ? (
            <EmptyState title="No closed days yet">
              Enter the public holidays and your own before you promise days to buyers.
            </EmptyState>
          ) : null}
          {days.data && days.data.length > 0 ? (
            <RemovableTable
              label="Closed days"
              columns={columns}
              rows={days.data}
              rowKey={({ day }) => day}
              named={({ day }) => formatDay(day)}
              consequence="The shop works on that day again. Promises already made stay as they are."
              onRemove={({ day }) => open.mutateAsync(day)}
            />
          ) : null}
        </div>
        <Sheet title="Close a day">
          <CloseDayForm />
        </Sheet>
      </Halves>
    </>
  );
}

function CloseDayForm(): ReactElement {
  const close = useCloseDay();
  const form = useDraftForm<ClosedDay>({ name: 'closed-day', defaultValues: { day: '', name: '' } });
  const send = async (values: ClosedDay): Promise<void> => {
    await close.mutateAsync(values);
    notify(`The shop is closed on ${formatDay(values.day)}.`);
  };
  return (
    <Form form={form} onSubmit={send} after="empty" submitLabel="Close it">
      <DayInput name="day" label="Day" required />
      <TextInput name="name" label="Why" hint="A public holiday, a break." longest={textLimit.name} required />
    </Form>
  );
}
