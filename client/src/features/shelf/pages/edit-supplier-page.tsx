import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { useNavigate, useParams } from 'react-router-dom';
import { Form } from '../../../components/form/form';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import { Tag } from '../../../components/tag/tag';
import { notify } from '../../../lib/notify';
import { supplierQuery, useEditSupplier, type Supplier } from '../api/suppliers';
import { Loaded } from '../components/page-body';
import { SupplierFields, supplierInput, supplierValues, type SupplierValues } from '../components/supplier-fields';

export function Component(): ReactElement {
  const { code = '' } = useParams();
  const query = useQuery({ ...supplierQuery(code), staleTime: 0 });
  return (
    <Loaded query={query} what="The supplier">
      {(supplier) => <EditSupplier key={`${supplier.code}/${supplier.version}`} supplier={supplier} />}
    </Loaded>
  );
}

function EditSupplier({ supplier }: { supplier: Supplier }): ReactElement {
  const edit = useEditSupplier(supplier.code);
  const navigate = useNavigate();
  const form = useDraftForm<SupplierValues>({
    name: `supplier:${supplier.code}`,
    defaultValues: supplierValues(supplier),
  });
  const address = (code: string): string => `/shelf/suppliers/${encodeURIComponent(code)}`;
  const send = async (values: SupplierValues): Promise<void> => {
    const after = await edit.mutateAsync({ ...supplierInput(values), version: supplier.version });
    notify(`${after.name} is kept as you wrote it.`);
    await navigate(address(after.code));
  };
  return (
    <>
      <PageHeading title={`Edit ${supplier.name}`} tags={<Tag kind="supplier" code={supplier.code} size="big" />} />
      <Form
        form={form}
        onSubmit={send}
        onCancel={() => void navigate(address(supplier.code))}
        submitLabel="Keep these changes"
      >
        <SupplierFields />
      </Form>
    </>
  );
}
