import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { useNavigate } from 'react-router-dom';
import { useIdempotencyKey } from '../../../api/idempotency';
import { sessionQuery } from '../../../api/session';
import { Form } from '../../../components/form/form';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import { notify } from '../../../lib/notify';
import { useAddSupplier } from '../api/suppliers';
import { SupplierFields, supplierInput, type SupplierValues } from '../components/supplier-fields';

export function Component(): ReactElement {
  const add = useAddSupplier();
  const { keyFor, done } = useIdempotencyKey();
  const navigate = useNavigate();
  const currency = useQuery(sessionQuery).data?.shop?.currency ?? '';
  const form = useDraftForm<SupplierValues>({
    name: 'supplier',
    defaultValues: { code: '', name: '', email: '', phone: '', countryCode: '', currency, leadTimeDays: '', note: '' },
  });
  const send = async (values: SupplierValues): Promise<void> => {
    const body = supplierInput(values);
    const supplier = await add.mutateAsync({ body, key: keyFor(body) });
    done();
    notify(`${supplier.name} is on record.`);
    await navigate(`/shelf/suppliers/${encodeURIComponent(supplier.code)}`);
  };
  return (
    <>
      <PageHeading title="Add a supplier" lead="Somebody the shop buys from." />
      <Form
        form={form}
        onSubmit={send}
        onCancel={() => void navigate('/shelf/suppliers')}
        submitLabel="Add the supplier"
      >
        <SupplierFields />
      </Form>
    </>
  );
}
